import type { NumberField } from '../entry/fields.ts';

/**
 * A value as it is shown: rounded to its field's precision, no trailing zeros beyond it
 * (PEEP 5, Vt 6.1), but with them where they carry meaning (pH 7.40, tube 8.0), always a leading zero.
 *
 * @source trailing-zero rule and its exception for laboratory values and tube sizes: ISMP and Joint Commission "do not use" lists.
 */
export function formatNumber(
  value: number,
  { decimals, keepsZeros }: Pick<NumberField, 'decimals' | 'keepsZeros'>,
): string {
  const fixed = (Object.is(value, -0) ? 0 : value).toFixed(decimals);
  const plain = keepsZeros || decimals === 0 ? fixed : fixed.replace(/\.?0+$/, '');
  return /^-0(\.0*)?$/.test(plain) ? plain.slice(1) : plain.replace('-', '\u2212');
}

/** A value with its unit, a no-break space between ("26 cmH2O"); a value without a unit stands alone. */
export function formatWithUnit(
  value: number,
  field: Pick<NumberField, 'decimals' | 'keepsZeros' | 'unit'>,
): string {
  return field.unit ? `${formatNumber(value, field)}\u00a0${field.unit}` : formatNumber(value, field);
}
