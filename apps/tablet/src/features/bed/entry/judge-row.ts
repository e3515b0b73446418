import { isUnusual } from '@windrow/ventilation/entry/fields';
import { formatNumber, formatWithUnit } from '@windrow/ventilation/format/number';
import type { EntryRow, EntryValue, NumberRow } from './entry-field.ts';
import { interpretNumber } from './interpret-number.ts';

/** How one row stands: nothing in it, refused with the reason, or a value that may be odd enough to ask about. */
export type Judgement =
  | { state: 'empty' }
  | { state: 'refused'; message: string }
  | { state: 'valid'; value: EntryValue; unusual: string | null };

/** Outside these a tidal volume is asked about, where the predicted body weight is known. Ours, an entry limit. */
const USUAL_VT_PER_KG_ML = [3, 10] as const;
const JUDGED_PER_KG: readonly string[] = ['vtSetMl', 'vtExhaledMl', 'vtSpontaneousMl', 'vtReleaseMl'];

export function judgeRow({
  row,
  text,
  weightKg,
}: {
  row: EntryRow;
  text: string;
  weightKg: number | null;
}): Judgement {
  if (text.trim() === '') return { state: 'empty' };
  if (row.kind !== 'number') return { state: 'valid', value: text.trim(), unusual: null };
  if (text === 'off' && row.mayBeOff) return { state: 'valid', value: 'off', unusual: null };
  const meant = interpretNumber({ key: row.key, text, field: row.field });
  if (meant.state !== 'valid') return meant;
  return { ...meant, unusual: unusualInWords({ row, value: meant.value, weightKg }) };
}

function unusualInWords({
  row,
  value,
  weightKg,
}: {
  row: NumberRow;
  value: number;
  weightKg: number | null;
}): string | null {
  const said = formatWithUnit(value, row.field);
  if (JUDGED_PER_KG.includes(row.key) && weightKg !== null) {
    const perKg = value / weightKg;
    if (perKg >= USUAL_VT_PER_KG_ML[0] && perKg <= USUAL_VT_PER_KG_ML[1]) return null;
    return `${row.label} ${said} is ${formatNumber(perKg, { decimals: 1 })} mL/kg, which is unusual.`;
  }
  return isUnusual(row.field, value) ? `${row.label} ${said} is unusual.` : null;
}
