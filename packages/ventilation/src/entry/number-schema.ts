import { z } from 'zod';
import { type NumberField, rangeInWords } from './fields.ts';

/**
 * The schema of one entered number: its hard limits, with a message that names the field,
 * what is accepted and what was given, so that the person can mend it at once.
 */
export function numberSchema(field: NumberField) {
  const message = (issue: { input?: unknown }) =>
    `${field.label} must be ${rangeInWords(field)}${given(issue.input)}`;
  const schema = z
    .number({ error: message })
    .min(field.hard[0], { error: message })
    .max(field.hard[1], { error: message });
  return field.multipleOf ? schema.multipleOf(field.multipleOf, { error: message }) : schema;
}

function given(input: unknown): string {
  return input === undefined ? ' (missing)' : `, not ${JSON.stringify(input)}`;
}
