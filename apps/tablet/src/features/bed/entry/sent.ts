/** A reviewed entry is one act: it keeps its key for as long as nothing in it is changed. */
export type Reviewed = { is: 'review'; observedAt: number; body: Record<string, unknown>; key: string };

/** A reviewed entry that was sent. `isOpen`: a try got no answer, so it may stand in the record. */
export type Sent = Reviewed & { isOpen: boolean };

/** One more try. What is still held from before was never answered. */
export function sending(step: Reviewed, held: Sent | undefined): Sent {
  return { ...step, isOpen: held !== undefined && held.key === step.key };
}

/** These say something of the sender only, before the server has looked whether it knows the act. */
const OF_THE_SENDER: readonly number[] = [401, 403, 429];

/** What a refusal leaves open: a try that broke within the server, or an earlier one that was not answered. */
export function afterRefusal(held: Sent, status: number): Sent | null {
  if (status >= 500) return { ...held, isOpen: true };
  return held.isOpen && OF_THE_SENDER.includes(status) ? held : null;
}

/**
 * How the person gets back to the values. While the outcome is open, only by stopping: other values under
 * a new key could stand in the record beside the first ones.
 */
export function wayBack({ held, wasSent }: { held: Sent | undefined; wasSent: boolean }): 'back' | 'stop' {
  return held !== undefined && (held.isOpen || wasSent) ? 'stop' : 'back';
}
