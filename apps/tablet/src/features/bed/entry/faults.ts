import { type EntryDraft, TIME_KEY } from './entry-draft.ts';
import type { JudgedTime } from './entry-time.ts';
import type { JudgedEntry } from './judge-entry.ts';

/** A refusal of the server or the schema, for the text that was refused and for no other. */
export type Refusals = Readonly<Record<string, { text: string; message: string }>>;

/**
 * What is said at each row now. A value that cannot be is told once its row was left; what is missing
 * only after the person wanted to record.
 */
export function faultsOf({
  judged,
  draft,
  time,
  refusals,
  wasTried,
}: {
  judged: JudgedEntry;
  draft: EntryDraft;
  time: JudgedTime;
  refusals: Refusals;
  wasTried: boolean;
}): Record<string, string> {
  const faults: Record<string, string> = {};
  if (time.state === 'refused' && (wasTried || draft.left.includes(TIME_KEY)))
    faults[TIME_KEY] = time.message;
  for (const { row, text, judgement } of judged.rows) {
    const refusal = refusals[row.key];
    const isTold = wasTried || (draft.left.includes(row.key) && draft.active !== row.key);
    if (refusal?.text === text) faults[row.key] = refusal.message;
    else if (judgement.state === 'refused' && isTold) faults[row.key] = judgement.message;
    else if (judgement.state === 'empty' && row.needed && wasTried)
      faults[row.key] = `${row.label} is needed`;
  }
  return faults;
}

/** Refusals by row, held to the texts that stand there now; the rest is of the entry as a whole. */
export function refusalsOf({
  errors,
  judged,
}: {
  errors: readonly { key: string; message: string }[];
  judged: JudgedEntry;
}): { refusals: Refusals; others: readonly string[] } {
  const refusals: Record<string, { text: string; message: string }> = {};
  const others: string[] = [];
  for (const { key, message } of errors) {
    const judgedRow = judged.rows.find(({ row }) => row.key === key);
    if (judgedRow) refusals[key] = { text: judgedRow.text, message };
    else others.push(message);
  }
  return { refusals, others };
}
