/** Entries as a tablet sends them, with overrides: what a test is about stands in the test. */
export function aPatient(over: Record<string, unknown> = {}) {
  return {
    hospitalNumber: `H${Math.random().toString(36).slice(2, 10)}`,
    familyName: 'Varga',
    givenName: 'Ilse',
    bornOn: '1961-03-04',
    sex: 'female',
    heightCm: 165,
    ...over,
  };
}

export function anAdmission(bedId: string, observedAt: string, over: Record<string, unknown> = {}) {
  return {
    bedId,
    observedAt,
    patient: aPatient(),
    difficultAirway: false,
    precautions: null,
    careLimits: null,
    orders: { checkEveryMinutes: null, gasEveryMinutes: null },
    ...over,
  };
}

export function aCheck(
  observedAt: string,
  over: { settings?: object; readings?: object; [key: string]: unknown } = {},
) {
  return {
    observedAt,
    mode: 'ac-vc',
    limits: { highPressureCmH2O: 40 },
    passive: true,
    ...over,
    settings: { vtSetMl: 380, rateSetPerMin: 18, peepCmH2O: 10, fio2Percent: 45, ...over.settings },
    readings: { vtExhaledMl: 375, rateTotalPerMin: 18, peakCmH2O: 28, plateauCmH2O: 24, ...over.readings },
  };
}

export function aGas(observedAt: string, over: Record<string, unknown> = {}) {
  return { observedAt, site: 'arterial', ph: 7.36, pco2MmHg: 44, po2MmHg: 78, fio2Percent: 45, ...over };
}

export function anAirway(observedAt: string, over: Record<string, unknown> = {}) {
  return {
    observedAt,
    event: 'placed',
    kind: 'oral-tube',
    sizeMm: 7.5,
    depthCm: 22,
    depthMark: 'lip',
    cuffed: true,
    ...over,
  };
}
