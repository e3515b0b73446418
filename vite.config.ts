import { resolve } from 'node:path';
import tailwindcss from '@tailwindcss/vite';
import react from '@vitejs/plugin-react';
import type { Plugin, UserConfig } from 'vite';
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

/** The server, bundled with our own packages, so that production needs no TypeScript. */
const serverBuild = {
  outDir: 'apps/server/dist/server',
  emptyOutDir: true,
  target: 'node20',
  sourcemap: true,
  rolldownOptions: {
    input: { main: 'apps/server/src/main.ts', 'rebuild-board': 'apps/server/src/rebuild-board.ts' },
  },
} satisfies UserConfig['build'];

/** Both apps in one build, each with its page. */
const appsBuild = {
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
} satisfies UserConfig['build'];

export default defineConfig(
  ({ isSsrBuild }): UserConfig => ({
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
    build: isSsrBuild ? serverBuild : appsBuild,
    test: {
      include: ['{apps,packages,db}/**/*.test.{ts,tsx}', 'tests/{published,api,faults}/**/*.test.ts'],
      exclude: [...configDefaults.exclude, '**/dist/**'],
      env: { TZ: 'UTC' },
      setupFiles: ['tests/support/console-guard.ts'],
      testTimeout: 30_000,
      hookTimeout: 60_000,
      maxWorkers: 2,
    },
  }),
);
