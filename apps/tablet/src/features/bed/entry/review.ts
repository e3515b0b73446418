import { type EntryRow, type EntryValue, valueInWords } from './entry-field.ts';
import type { EntryPlan } from './entry-plan.ts';
import type { JudgedEntry, JudgedRow } from './judge-entry.ts';

export type ReviewLine = {
  key: string;
  label: string;
  before: string | null;
  now: string;
  isUnusual: boolean;
};

/** What exactly will be recorded, sorted by what the person has done. */
export type Review = {
  changed: readonly ReviewLine[];
  confirmed: readonly ReviewLine[];
  added: readonly ReviewLine[];
  /** Asked for and not given: nothing is recorded for these. */
  leftOut: readonly string[];
  /** Of these, what the last fact had: it leaves the board. */
  leavesBoard: readonly string[];
};

/** @param input.ageMinutes how long ago it was observed: a late entry older than the last changes no board. */
export function reviewOf({
  plan,
  judged: { rows },
  ageMinutes,
}: {
  plan: Pick<EntryPlan, 'onBoard'>;
  judged: JudgedEntry;
  ageMinutes: number;
}): Review {
  const leavesBoard = ({ row, judgement }: JudgedRow) =>
    judgement.state === 'empty' &&
    plan.onBoard?.includes(row.key) === true &&
    row.before.state === 'shown' &&
    row.before.ageMinutes > ageMinutes;
  const of = (change: JudgedRow['change']) => rows.filter((row) => row.change === change).flatMap(lineOf);
  return {
    changed: of('changed'),
    confirmed: of('confirmed'),
    added: of('new'),
    leftOut: rows
      .filter(({ row, judgement }) => judgement.state === 'empty' && row.key !== 'note')
      .map(({ row }) => row.label),
    leavesBoard: rows.filter(leavesBoard).map(({ row }) => row.label),
  };
}

export function leavesBoardInWords(labels: readonly string[]): string {
  return `${labels.join(', ')} ${labels.length === 1 ? 'is' : 'are'} no longer shown on the board after this check.`;
}

function lineOf({ row, judgement, isKept }: JudgedRow): ReviewLine[] {
  if (judgement.state !== 'valid') return [];
  return [
    {
      key: row.key,
      label: row.label,
      before: beforeInWords(row, judgement.value),
      now: valueInWords(row, judgement.value),
      isUnusual: isKept,
    },
  ];
}

function beforeInWords(row: EntryRow, now: EntryValue): string | null {
  return row.before.state === 'shown' && row.before.value !== now
    ? valueInWords(row, row.before.value)
    : null;
}

/** "2 changed · 4 as before · 5 left": how far an entry has come, in one line. */
export function progressInWords({ rows }: JudgedEntry): string {
  const count = (change: JudgedRow['change']) =>
    rows.filter((row) => row.change === change && row.row.key !== 'note').length;
  const parts = [
    [count('changed'), 'changed'],
    [count('confirmed'), 'as before'],
    [count('new'), 'new'],
    [count('empty'), 'left'],
  ] as const;
  return parts
    .filter(([many]) => many > 0)
    .map(([many, word]) => `${many} ${word}`)
    .join(' · ');
}
