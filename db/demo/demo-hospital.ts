import { demoStays } from './demo-stays.ts';
import type { DemoHospital } from './demo-types.ts';
import { DEMO_PEOPLE } from './people.ts';
import { demoShifts } from './shifts.ts';
import { demoUnits } from './units.ts';
import { demoVentilators } from './ventilators.ts';

/**
 * "Saltmarsh General", an invented hospital with invented people and patients. Pure: the same moment gives the
 * same hospital, and all its times are relative to that moment, so that a board filled from it always opens
 * with every state of the age ladder to be seen.
 *
 * @param input.now the moment of filling, ISO 8601 with offset.
 * @param input.timeZone the hospital's zone, by which its shifts begin on the hour.
 */
export function demoHospital({
  now,
  timeZone = 'Europe/London',
}: {
  now: string;
  timeZone?: string;
}): DemoHospital {
  const shifts = demoShifts({ now, timeZone });
  const stays = demoStays({ now, shifts });
  return {
    name: 'Saltmarsh General',
    units: demoUnits(timeZone),
    people: DEMO_PEOPLE,
    stays,
    ventilators: demoVentilators(stays),
    shifts,
  };
}
