import { resolve } from 'node:path';
import tailwindcss from '@tailwindcss/vite';
import react from '@vitejs/plugin-react';
import type { Plugin } from 'vite';
import { configDefaults, defineConfig } from 'vitest/config';

const serverPort = Number(process.env.PORT ?? 4310);

/** In development the two apps answer on the addresses that they have in production: `/wall`, and `/` for the rest. */
function appAddresses(): Plugin {
  return {
    name: 'windrow:app-addresses',
    configureServer(server) {
      server.middlewares.use((req, _res, next) => {
        const url = req.url ?? '/';
        const isPage = req.headers.accept?.includes('text/html') && !url.startsWith('/apps/');
        if (isPage)
          req.url = /^\/wall(\/|\?|$)/.test(url) ? '/apps/wall/index.html' : '/apps/tablet/index.html';
        next();
      });
    },
  };
}

export default defineConfig(({ isSsrBuild }) => ({
  appType: 'mpa',
  plugins: isSsrBuild ? [] : [react(), tailwindcss(), appAddresses()],
  publicDir: isSsrBuild ? false : 'packages/ui/public',
  server: {
    host: '127.0.0.1',
    port: serverPort + 1,
    strictPort: true,
    proxy: {
      // The host is passed on as it was asked for, so that the server sees its own pages as such.
      '/api': { target: `http://127.0.0.1:${serverPort}`, changeOrigin: false },
      '/socket.io': { target: `http://127.0.0.1:${serverPort}`, changeOrigin: false, ws: true },
    },
  },
  build: isSsrBuild
    ? {
        outDir: 'apps/server/dist/server',
        emptyOutDir: true,
        target: 'node20',
        sourcemap: true,
        rolldownOptions: {
          input: { main: 'apps/server/src/main.ts', 'rebuild-board': 'apps/server/src/rebuild-board.ts' },
        },
      }
    : {
        outDir: 'apps/server/dist/public',
        emptyOutDir: true,
        manifest: true,
        target: 'es2022',
        rolldownOptions: {
          input: {
            tablet: resolve(import.meta.dirname, 'apps/tablet/index.html'),
            wall: resolve(import.meta.dirname, 'apps/wall/index.html'),
          },
        },
      },
  test: {
    include: ['{apps,packages,db}/**/*.test.{ts,tsx}', 'tests/{published,api,faults}/**/*.test.ts'],
    exclude: [...configDefaults.exclude, '**/dist/**'],
    env: { TZ: 'UTC' },
    setupFiles: ['tests/support/console-guard.ts'],
    testTimeout: 30_000,
    hookTimeout: 60_000,
    maxWorkers: 2,
  },
}));
