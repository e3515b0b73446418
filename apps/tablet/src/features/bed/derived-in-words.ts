import { notPassiveWords } from '@windrow/ventilation/board/passive-breath';
import type { BedCheck, BedGas, CheckDerived } from '@windrow/ventilation/contract/board';
import { formatNumber } from '@windrow/ventilation/format/number';
import { checkWorkedOut } from '@windrow/ventilation/notes/check-worked-out';
import { gasWorkedOut } from '@windrow/ventilation/notes/gas-worked-out';
import type { WorkedOut } from '@windrow/ventilation/notes/worked-out';
import { type SupportEntry, supportEntry } from '@windrow/ventilation/support/catalogue';

/** A derived quantity on a screen; `value` is null where it cannot be had from what was recorded. */
export type DerivedLine = {
  key: string;
  label: string;
  value: string | null;
  unit: string;
  /** Why there is none, where the values are there and must not be used: "not passive". */
  remark?: string | null;
  /** By which calculation it was made, and from what; null where it was read or is not there. */
  from: WorkedOut | null;
};

const CHECK_LINES = [
  { key: 'vtPerKgMl', label: 'Vt per kg', unit: 'mL/kg', decimals: 1, isOf: hasVolume },
  { key: 'drivingPressureCmH2O', label: 'Driving pressure', unit: 'cmH2O', decimals: 0, isOf: hasPause },
  { key: 'staticComplianceMlCmH2O', label: 'Compliance', unit: 'mL/cmH2O', decimals: 0, isOf: hasPause },
  { key: 'mechanicalPowerJMin', label: 'Mechanical power', unit: 'J/min', decimals: 0, isOf: hasPause },
  { key: 'minuteVolumeLMin', label: 'Minute volume', unit: 'L/min', decimals: 1, isOf: hasVolume },
  { key: 'roxIndex', label: 'ROX', unit: '', decimals: 1, isOf: ({ id }) => id === 'hfnc' },
  {
    key: 'rsbiPerMinL',
    label: 'Rate over Vt',
    unit: '/min/L',
    decimals: 0,
    isOf: ({ sequence, kind }) => sequence === 'CSV' && kind === 'invasive',
  },
] as const satisfies readonly {
  key: keyof CheckDerived;
  label: string;
  unit: string;
  decimals: 0 | 1;
  isOf: (entry: SupportEntry) => boolean;
}[];

function hasVolume({ readings }: SupportEntry): boolean {
  return readings.includes('vtExhaledMl') || readings.includes('vtReleaseMl');
}

function hasPause({ readings }: SupportEntry): boolean {
  return readings.includes('plateauCmH2O');
}

/** What a check implies. What its mode can never give is left out; what only lacks a value has none yet. */
export function checkDerivedLines({
  check,
  predictedBodyWeightKg,
}: {
  check: Pick<BedCheck, 'mode' | 'derived' | 'settings' | 'readings' | 'passive'>;
  predictedBodyWeightKg: number | null;
}): DerivedLine[] {
  const { mode, derived, readings, passive } = check;
  const notPassive = readings.plateauCmH2O === undefined ? null : notPassiveWords({ passive });
  return CHECK_LINES.filter(({ key, isOf }) => derived[key] !== null || isOf(supportEntry(mode))).map(
    ({ key, label, unit, decimals, isOf }) => ({
      key,
      label,
      unit,
      value: shownOrNull(derived[key], decimals),
      remark: isOf === hasPause ? notPassive : null,
      from: checkWorkedOut(key, { check, predictedBodyWeightKg }),
    }),
  );
}

const GAS_LINES = [
  { key: 'pfMmHg', label: 'P/F', unit: 'mmHg', decimals: 0 },
  { key: 'ventilatoryRatio', label: 'Ventilatory ratio', unit: '', decimals: 1 },
] as const;

export function gasDerivedLines({
  gas,
  predictedBodyWeightKg,
}: {
  gas: Pick<BedGas, 'values' | 'pfMmHg' | 'ventilatoryRatio' | 'minuteVolumeAtDrawLMin'>;
  predictedBodyWeightKg: number | null;
}): DerivedLine[] {
  return GAS_LINES.map(({ key, label, unit, decimals }) => ({
    key,
    label,
    unit,
    value: shownOrNull(gas[key], decimals),
    from: gasWorkedOut(key, { gas, predictedBodyWeightKg }),
  }));
}

function shownOrNull(value: number | null, decimals: 0 | 1): string | null {
  return value === null ? null : formatNumber(value, { decimals });
}
