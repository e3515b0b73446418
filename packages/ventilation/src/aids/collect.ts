import type { NumberField } from '../entry/fields.ts';
import { formatWithUnit } from '../format/number.ts';
import type { AidInput } from './aid.ts';

type Field = Pick<NumberField, 'label' | 'unit' | 'decimals' | 'keepsZeros'>;
type Stamp = { observedAt: string; changedSinceAt: string | null } | null;

/** Gathers what an aid rests on: each value with its name and time, or that it is missing and why. */
export class Collected {
  readonly inputs: AidInput[] = [];
  readonly missing: string[] = [];

  /** A value that the aid cannot do without. */
  need(value: number | null | undefined, field: Field, from: Stamp, why: string): number | null {
    const found = this.use(value, field, from);
    if (found === null) this.lacks(why);
    return found;
  }

  /** A value that the aid is better for, and does without. */
  use(value: number | null | undefined, field: Field, from: Stamp): number | null {
    if (value === null || value === undefined) return null;
    this.inputs.push({
      label: field.label,
      words: formatWithUnit(value, field),
      observedAt: from?.observedAt ?? null,
      changedSinceAt: from?.changedSinceAt ?? null,
    });
    return value;
  }

  lacks(why: string): void {
    if (!this.missing.includes(why)) this.missing.push(why);
  }
}
