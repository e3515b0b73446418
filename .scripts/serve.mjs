// `npm run serve`: for production. Same as `npm start`, and no demonstration unless it is asked for.
process.env.WINDROW_DEMO ??= '0';
await import('./start.mjs');
