/** One value that an aid was worked out from. */
export type AidInput = {
  label: string;
  words: string;
  /** Null: it does not age, such as a height. */
  observedAt: string | null;
  /** Since when it tells of an earlier state. */
  changedSinceAt: string | null;
};

/** What an aid gives: a result, or what is missing for one. */
export type Aid<Result> = {
  result: Result | null;
  inputs: readonly AidInput[];
  missing: readonly string[];
};

/** How an aid is reckoned and where that is published, said beside every result. */
export type AidRule = { rule: string; source: string };
