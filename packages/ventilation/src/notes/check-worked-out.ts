import { tidalVolumeOf } from '../board/derive-check.ts';
import type { BedCheck, CheckDerived } from '../contract/board.ts';
import { supportEntry } from '../support/catalogue.ts';
import { type WorkedOut, workedOut } from './worked-out.ts';

type Facts = {
  check: Pick<BedCheck, 'mode' | 'settings' | 'readings' | 'passive' | 'derived'>;
  predictedBodyWeightKg: number | null;
};

/** The way of each value, as `deriveCheck` goes it; a test holds the two equal. */
const WAYS: Record<keyof CheckDerived, (facts: Facts) => WorkedOut | null> = {
  vtPerKgMl: ({ check, predictedBodyWeightKg }) =>
    workedOut('tidalVolumePerKg', { tidalVolumeMl: tidalVolumeOf(check), predictedBodyWeightKg }),
  drivingPressureCmH2O: ({ check }) => workedOut('drivingPressure', pauseOf(check)),
  staticComplianceMlCmH2O: ({ check }) =>
    workedOut('staticCompliance', { tidalVolumeMl: tidalVolumeOf(check), ...pauseOf(check) }),
  mechanicalPowerJMin: ({ check }) => power(check),
  minuteVolumeLMin: ({ check: { readings } }) =>
    // As read from the ventilator it was not worked out.
    readings.minuteVolumeLMin === undefined
      ? workedOut('minuteVentilation', {
          ratePerMin: readings.rateTotalPerMin,
          tidalVolumeMl: readings.vtExhaledMl,
        })
      : null,
  roxIndex: ({ check: { settings, readings } }) =>
    workedOut('roxIndex', {
      spo2Percent: readings.spo2Percent,
      fio2: settings.fio2Percent && settings.fio2Percent / 100,
      ratePerMin: readings.rateTotalPerMin,
    }),
  rsbiPerMinL: ({ check: { readings } }) =>
    workedOut('rapidShallowBreathingIndex', {
      ratePerMin: readings.rateTotalPerMin,
      tidalVolumeMl: readings.vtSpontaneousMl ?? readings.vtExhaledMl,
    }),
};

/** Which calculation made a value of a check, and from which numbers; null where there is no value, or it was read. */
export function checkWorkedOut(key: keyof CheckDerived, facts: Facts): WorkedOut | null {
  return facts.check.derived[key] === null ? null : WAYS[key](facts);
}

function pauseOf({ settings, readings }: Facts['check']) {
  return {
    plateauCmH2O: readings.plateauCmH2O,
    totalPeepCmH2O:
      settings.peepCmH2O === undefined ? null : settings.peepCmH2O + (readings.intrinsicPeepCmH2O ?? 0),
  };
}

function power(check: Facts['check']): WorkedOut | null {
  const { peakCmH2O, plateauCmH2O, rateTotalPerMin: ratePerMin } = check.readings;
  const { peepCmH2O, pInspCmH2O } = check.settings;
  const breath = { ratePerMin, tidalVolumeMl: tidalVolumeOf(check), peepCmH2O };
  const { control } = supportEntry(check.mode);
  if (control === 'volume') {
    return workedOut('mechanicalPowerVolumeControl', { ...breath, peakCmH2O, plateauCmH2O });
  }
  const chosenCmH2O = peakCmH2O === undefined || peepCmH2O === undefined ? undefined : peakCmH2O - peepCmH2O;
  return workedOut('mechanicalPowerPressureControl', {
    ...breath,
    inspiratoryPressureCmH2O: control === 'adaptive-pressure' ? chosenCmH2O : pInspCmH2O,
  });
}
