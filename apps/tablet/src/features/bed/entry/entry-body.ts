import type { EntryPlan } from './entry-plan.ts';
import type { JudgedEntry } from './judge-entry.ts';

export type EntryBody =
  | { state: 'ready'; body: Record<string, unknown> }
  | { state: 'refused'; errors: readonly { key: string; message: string }[] };

/**
 * The request's body, held against the server's own schema before it is sent, so that a form and the
 * contract can never part unnoticed.
 */
export function entryBody({
  plan,
  judged,
  observedAt,
}: {
  plan: EntryPlan;
  judged: JudgedEntry;
  observedAt: number;
}): EntryBody {
  const { note } = judged.values;
  const confirmedUnusual = keptKeys(judged);
  const body = {
    ...(plan.timeLabel === null ? {} : { observedAt: new Date(observedAt).toISOString() }),
    ...plan.bodyOf(judged.values),
    ...(confirmedUnusual.length > 0 ? { confirmedUnusual } : {}),
    ...(typeof note === 'string' ? { note } : {}),
  };
  const checked = plan.schema.safeParse(body);
  if (checked.success) return { state: 'ready', body };
  return {
    state: 'refused',
    errors: checked.error.issues.map(({ path, message }) => ({ key: keyOfPath(path.join('.')), message })),
  };
}

export function keptKeys({ rows }: JudgedEntry): string[] {
  return rows.filter(({ isKept }) => isKept).map(({ row }) => row.key);
}

/** `settings.peepCmH2O` and `/settings/peepCmH2O` both belong to the row `peepCmH2O`. */
export function keyOfPath(path: string): string {
  return path.split(/[./]/).at(-1) ?? path;
}

/** Picks what a part of the body takes from all the values. */
export function pick(
  values: Readonly<Record<string, unknown>>,
  keys: readonly string[],
): Record<string, unknown> {
  return Object.fromEntries(keys.filter((key) => values[key] !== undefined).map((key) => [key, values[key]]));
}

/** A yes-or-no row as the contract says it; a row that was left says nothing. */
export function flagOf(values: Readonly<Record<string, unknown>>, key: string): Record<string, boolean> {
  return values[key] === 'yes' ? { [key]: true } : values[key] === 'no' ? { [key]: false } : {};
}
