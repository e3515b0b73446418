import type { BedStay, CheckDerived, Flag } from '../contract/board.ts';
import { emptyingOf } from '../flags/timing-rules.ts';
import { checkWorkedOut } from './check-worked-out.ts';
import { gasWorkedOut } from './gas-worked-out.ts';
import { type WorkedOut, workedOut } from './worked-out.ts';

/** What a flag rests on that was worked out, by the name that its "Why" gives it. */
export type FlagWorkedOut = { label: string; from: WorkedOut };

type Stay = Pick<BedStay, 'check' | 'gas' | 'device' | 'predictedBodyWeightKg'>;
type Ways = (stay: Stay) => readonly (readonly [label: string, from: WorkedOut | null])[];

const VT_PER_KG: Ways = (stay) => [['Vt per kg', ofCheck('vtPerKgMl', stay)]];

/** Flags that are not here rest on what was read or set alone. */
const WAYS: Readonly<Record<string, Ways>> = {
  'vt-per-kg-high': VT_PER_KG,
  'vt-per-kg-above': VT_PER_KG,
  'driving-pressure-high': (stay) => [['Driving pressure', ofCheck('drivingPressureCmH2O', stay)]],
  'mechanical-power-high': (stay) => [['Mechanical power', ofCheck('mechanicalPowerJMin', stay)]],
  'pf-low': ({ gas, predictedBodyWeightKg }) => [
    ['P/F', gas && gasWorkedOut('pfMmHg', { gas, predictedBodyWeightKg })],
  ],
  'gas-inconsistent': ({ gas }) => [
    [
      'Expected pH',
      workedOut('gasConsistency', {
        ph: gas?.values.ph,
        paco2MmHg: gas?.values.pco2MmHg,
        bicarbonateMmolL: gas?.values.bicarbonateMmolL,
      }),
    ],
  ],
  'expiratory-time-short': (stay) => {
    const made = stay.check && emptyingOf(stay.check)?.madeFrom;
    if (!made) return [];
    return [
      ['Expiratory time', workedOut('breathTiming', made.timing)],
      ['Time constant', workedOut('timeConstant', made.lungs)],
      ['Resistance', workedOut('airwayResistance', made.pressures)],
      ['Compliance', ofCheck('staticComplianceMlCmH2O', stay)],
    ];
  },
};

/** How the values behind a flag were worked out, each with the numbers that made it. */
export function flagWorkedOut({ flag, stay }: { flag: Pick<Flag, 'id'>; stay: Stay }): FlagWorkedOut[] {
  return (WAYS[flag.id]?.(stay) ?? []).flatMap(([label, from]) => (from === null ? [] : [{ label, from }]));
}

function ofCheck(key: keyof CheckDerived, { check, predictedBodyWeightKg }: Stay): WorkedOut | null {
  return check && checkWorkedOut(key, { check, predictedBodyWeightKg });
}
