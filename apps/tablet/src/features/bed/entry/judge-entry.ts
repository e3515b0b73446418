import type { EntryDraft } from './entry-draft.ts';
import type { EntryRow, EntryValue, EntryValues } from './entry-field.ts';
import type { EntryPlan } from './entry-plan.ts';
import { type Judgement, judgeRow } from './judge-row.ts';

export type JudgedRow = {
  row: EntryRow;
  text: string;
  judgement: Judgement;
  /** Against the last value: something new, the same said again on purpose, or nothing said. */
  change: 'empty' | 'changed' | 'confirmed' | 'new';
  /** An unusual value that has been asked about and kept. */
  isKept: boolean;
};

export type JudgedEntry = { rows: readonly JudgedRow[]; values: EntryValues };

/** Every row of a plan against what was put in. Whether a fault is told yet is for the screen to decide. */
export function judgeEntry({
  plan,
  draft,
  weightKg,
}: {
  plan: EntryPlan;
  draft: EntryDraft;
  weightKg: number | null;
}): JudgedEntry {
  const rows = plan.sections
    .flatMap((section) => section.rows)
    .map((row) => judged({ row, draft, weightKg }));
  const values = valuesOf(rows);
  const crossed = new Map(plan.crossCheck?.(values).map(({ key, message }) => [key, message]));
  return { values, rows: rows.map((row) => withCrossed(row, crossed.get(row.row.key))) };
}

function judged({
  row,
  draft,
  weightKg,
}: {
  row: EntryRow;
  draft: EntryDraft;
  weightKg: number | null;
}): JudgedRow {
  const text = draft.values[row.key] ?? '';
  const judgement = judgeRow({ row, text, weightKg });
  const isKept =
    judgement.state === 'valid' &&
    judgement.unusual !== null &&
    (draft.kept[row.key] === text || isRepeat(row, judgement.value));
  return { row, text, judgement, change: changeOf(row, judgement), isKept };
}

/** Saying an unusual value again on purpose is the answer to the question that was asked the first time. */
function isRepeat(row: EntryRow, value: EntryValue): boolean {
  return row.kind === 'number' && row.repeat?.value === value;
}

function changeOf({ before }: EntryRow, judgement: Judgement): JudgedRow['change'] {
  if (judgement.state !== 'valid') return 'empty';
  if (before.state !== 'shown') return 'new';
  return before.value === judgement.value ? 'confirmed' : 'changed';
}

function valuesOf(rows: readonly JudgedRow[]): EntryValues {
  const values: Record<string, EntryValue> = {};
  for (const { row, judgement } of rows) if (judgement.state === 'valid') values[row.key] = judgement.value;
  return values;
}

function withCrossed(judgedRow: JudgedRow, message: string | undefined): JudgedRow {
  return message === undefined ? judgedRow : { ...judgedRow, judgement: { state: 'refused', message } };
}

export type Obstacle = { key: string; label: string; message: string };

/** What stands between this entry and the record, in the order of the form. */
export function obstaclesOf({ rows }: JudgedEntry): readonly Obstacle[] {
  return rows.flatMap(({ row, judgement, isKept }) => {
    const { key, label } = row;
    if (judgement.state === 'refused') return [{ key, label, message: judgement.message }];
    if (judgement.state === 'empty') return row.needed ? [{ key, label, message: `${label} is needed` }] : [];
    return judgement.unusual !== null && !isKept
      ? [{ key, label, message: `${judgement.unusual} Keep or change it` }]
      : [];
  });
}
