import { type NumberField, rangeInWords } from '@windrow/ventilation/entry/fields';

export type Interpreted =
  | { state: 'empty' }
  | { state: 'refused'; message: string }
  | { state: 'valid'; value: number };

/** What a typed text means as a value of this field, or in words why it can be none. */
export function interpretNumber({
  key,
  text,
  field,
}: {
  key: string;
  text: string;
  field: NumberField;
}): Interpreted {
  if (text === '') return { state: 'empty' };
  const number = Number(text);
  if (!/\d$/.test(text) || !Number.isFinite(number)) {
    return { state: 'refused', message: `${field.label}: ${text} is not a whole entry yet` };
  }
  if (key === 'fio2Percent') return interpretOxygen({ text, number, field });
  if (decimalsOf(text) > field.decimals) {
    const precision =
      field.decimals === 0 ? 'whole numbers' : `${field.decimals} decimal${field.decimals === 1 ? '' : 's'}`;
    return { state: 'refused', message: `${field.label} is recorded in ${precision}, not ${text}` };
  }
  return withinHard({ value: number, field });
}

/**
 * Oxygen is understood as a percentage (21 to 100) and as a fraction (0.21 to 1.0), and always kept as a
 * percentage. A bare 1 could be either, or a slip, so it is asked about and never guessed.
 */
function interpretOxygen({
  text,
  number,
  field,
}: {
  text: string;
  number: number;
  field: NumberField;
}): Interpreted {
  if (text === '1') {
    return {
      state: 'refused',
      message: `${field.label}: 1 can be read two ways. For 100 % type 100 or 1.0; as a percentage it is below 21`,
    };
  }
  const isFraction = number < 1 || /^1\.0+$/.test(text);
  if (isFraction) {
    const percent = Math.round(number * 100);
    if (percent >= field.hard[0]) return { state: 'valid', value: percent };
  } else if (decimalsOf(text) > 0 && number >= field.hard[0]) {
    return { state: 'refused', message: `${field.label} is recorded in whole percent, not ${text}` };
  } else if (number >= field.hard[0] && number <= field.hard[1]) {
    return { state: 'valid', value: number };
  }
  return {
    state: 'refused',
    message: `${field.label} must be ${rangeInWords(field)}, or 0.21 to 1.0, not ${text}`,
  };
}

function withinHard({ value, field }: { value: number; field: NumberField }): Interpreted {
  const [low, high] = field.hard;
  const isStep =
    field.multipleOf === undefined || Number.isInteger(Math.round((value / field.multipleOf) * 1e6) / 1e6);
  if (value >= low && value <= high && isStep) return { state: 'valid', value };
  return { state: 'refused', message: `${field.label} must be ${rangeInWords(field)}, not ${value}` };
}

function decimalsOf(text: string): number {
  return text.split('.')[1]?.length ?? 0;
}
