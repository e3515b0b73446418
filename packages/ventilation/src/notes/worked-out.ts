import type * as calculations from '../index.ts';

type Calculations = typeof calculations;
export type CalculationName = keyof Calculations;

/** A value that was worked out: by which calculation, and from which numbers. */
export type WorkedOut = {
  name: CalculationName;
  input: Readonly<Record<string, number | string>>;
};

type Input<Name extends CalculationName> = Parameters<Calculations[Name]>[0];
/** The input as the facts give it: any of it may not have been recorded. */
type Facts<Name extends CalculationName> = {
  readonly [Key in keyof Input<Name>]: Input<Name>[Key] | null | undefined;
};

/** Null where one of the numbers is missing: then this calculation cannot have made the value. */
export function workedOut<Name extends CalculationName>(name: Name, facts: Facts<Name>): WorkedOut | null {
  const input: Record<string, number | string> = {};
  for (const [key, value] of Object.entries(facts)) {
    if (typeof value !== 'number' && typeof value !== 'string') return null;
    input[key] = value;
  }
  return { name, input };
}

/**
 * The address of the method note, opened on these numbers. It goes into histories and logs, so nothing but the
 * calculation's own input may be in it.
 */
export function noteAddress({ name, input }: WorkedOut): string {
  const query = new URLSearchParams(Object.entries(input).map(([key, value]) => [key, String(value)]));
  return `/notes/${name}?${query.toString()}`;
}
