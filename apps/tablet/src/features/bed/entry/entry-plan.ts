import type { z } from 'zod';
import type { EntrySection, EntryValues } from './entry-field.ts';

/**
 * What one form asks for, and what becomes of the answers. Check, airway, gas and happening are each one
 * plan, and so are a transfer, the end of a stay and an amendment.
 */
export type EntryPlan = {
  kind:
    | 'check'
    | 'gas'
    | 'airway'
    | 'airway-check'
    | 'happening'
    | 'infection-sign'
    | 'transfer'
    | 'end'
    | 'struck';
  title: string;
  /** "Observed", "Drawn", "Placed": what the time is the time of. Null: the answers hold for no time. */
  timeLabel: string | null;
  sections: readonly EntrySection[];
  /** Faults between rows, such as a plateau above the peak. */
  crossCheck?: (values: EntryValues) => readonly { key: string; message: string }[];
  /** The body without its envelope. */
  bodyOf: (values: EntryValues) => Record<string, unknown>;
  /** The server's own schema of the body, held against it before it is sent. */
  schema: z.ZodType;
  /** Rows whose last value stands on the board, and leaves it with a newer fact that says nothing of them. */
  onBoard?: readonly string[];
  /** Said in the review where the rows alone do not say it: "The device is taken out". */
  statement?: string;
};
