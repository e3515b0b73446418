/** Nobody stands at a wall to press a button, so it also tries by itself. */
export const RETRY_EVERY_MS = 5_000;
