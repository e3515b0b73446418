import type { EventParameter, SurveillanceDay } from './ventilator-events.ts';

/** PEEP of 0 to 5 counts as 5. @source CDC NHSN, ventilator-associated event protocol. */
const PEEP_FLOOR = 5;

export const RULE = {
  peep: { label: 'PEEP', unit: 'cmH2O', rise: 3, of: (day: SurveillanceDay) => day.minPeep },
  fio2: { label: 'FiO2', unit: '%', rise: 20, of: (day: SurveillanceDay) => day.minFio2Percent },
} as const satisfies Record<EventParameter, unknown>;

type Judged = { parameter: EventParameter; value: number };

/** A minimum as the rule takes it. */
export function countedAs({ parameter, value }: Judged): number {
  return parameter === 'peep' ? Math.max(PEEP_FLOOR, value) : value;
}

/** "PEEP 8 cmH2O", "PEEP 3 cmH2O, which counts as 5". */
export function valueInWords({ parameter, value }: Judged): string {
  const { label, unit } = RULE[parameter];
  const counted = countedAs({ parameter, value });
  const floored = counted === value ? '' : `, which counts as ${plain(counted)}`;
  return `${label} ${plain(value)}\u00a0${unit}${floored}`;
}

/** "PEEP 8 cmH2O is 3 above the first baseline day's 5". */
export function riseInWords({ parameter, value, first }: Judged & { first: number }): string {
  const reference = countedAs({ parameter, value: first });
  const rise = countedAs({ parameter, value }) - reference;
  const points = parameter === 'fio2' ? ' points' : '';
  return `${valueInWords({ parameter, value })} is ${plain(rise)}${points} above the first baseline day’s ${plain(reference)}`;
}

/** At most two decimals, and none that is not needed. */
export function plain(value: number): string {
  return String(Math.round(value * 100) / 100);
}
