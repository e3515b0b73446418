/** Where the server's clock stood at a moment of this device's two clocks. */
type Anchor = { serverMs: number; steadyMs: number; wallMs: number };

/** An answer that seems older than this was not merely slow: the server's clock was set. */
const JITTER_MS = 2_000;
/** How far back one late message may pull the clock, so that a slow network does not make ages swing. */
const SLEW_MS = 50;

let anchor: Anchor | null = null;
const listeners = new Set<() => void>();

/** Epoch milliseconds by the server's clock. Before the first word of the server it is this device's own. */
export function serverNow(): number {
  return anchor ? anchor.serverMs + elapsedSince(anchor) : Date.now();
}

/**
 * Takes a time that the server has just sent. Messages arrive late, never early: a time ahead of ours is
 * taken at once, one slightly behind pulls us back slowly.
 */
export function noteServerTime(iso: string): void {
  const said = Date.parse(iso);
  if (Number.isNaN(said)) return;
  const steadyMs = performance.now();
  const expected = anchor ? anchor.serverMs + (steadyMs - anchor.steadyMs) : Date.now();
  const behind = expected - said;
  const isLate = anchor !== null && behind > 0 && behind < JITTER_MS;
  const serverMs = isLate ? expected - Math.min(behind, SLEW_MS) : said;
  anchor = { serverMs, steadyMs, wallMs: Date.now() };
  if (Math.abs(behind) >= JITTER_MS) for (const listener of listeners) listener();
}

/** Tells when the clock has jumped, so that screens need not wait for the next second. */
export function onClockJump(listener: () => void): () => void {
  listeners.add(listener);
  return () => listeners.delete(listener);
}

/**
 * Milliseconds since a mark of both clocks. The steady clock cannot be set by anybody but stands still
 * while a device sleeps; the wall clock runs on. The longer of the two never makes old data young.
 */
export function elapsedSince({ steadyMs, wallMs }: Pick<Anchor, 'steadyMs' | 'wallMs'>): number {
  return Math.max(performance.now() - steadyMs, Date.now() - wallMs);
}
