import * as ventilation from '@windrow/ventilation';

/**
 * One possible input for each exported calculation, from which the refusal tests derive the impossible ones.
 * `optional` keys may be left out;
 */
export type Example = {
  input: Readonly<Record<string, unknown>>;
  optional?: readonly string[];
  /** Called with one bare number instead of an object. */
  bare?: true;
};

const BREATH = { tidalVolumeMl: 420, ratePerMin: 18 };
const PRESSURES = { peakCmH2O: 30, plateauCmH2O: 24, peepCmH2O: 8 };
const OXYGEN = { fio2: 0.4, pao2MmHg: 80 };
const DAY_LIST = [{ day: '2024-03-01', minPeep: 5, minFio2Percent: 40 }];

export const EXAMPLES = {
  airwayResistance: { input: { peakCmH2O: 30, plateauCmH2O: 24, inspiratoryFlowLMin: 60 } },
  alveolarArterialGradient: {
    input: { ...OXYGEN, paco2MmHg: 40, barometricMmHg: 760, respiratoryQuotient: 0.8, form: 'full' },
    optional: ['barometricMmHg', 'respiratoryQuotient', 'form'],
  },
  alveolarOxygen: {
    input: { fio2: 0.4, paco2MmHg: 40, barometricMmHg: 760, respiratoryQuotient: 0.8, form: 'simplified' },
    optional: ['barometricMmHg', 'respiratoryQuotient', 'form'],
  },
  berlinClass: { input: { pfMmHg: 180, peepCmH2O: 8, barometricMmHg: 700 }, optional: ['barometricMmHg'] },
  bicarbonate: { input: { ph: 7.4, paco2MmHg: 40 } },
  blendedFio2: { input: { airLMin: 10, oxygenLMin: 5 } },
  breathTiming: { input: { ratePerMin: 20, inspiratoryTimeS: 1 } },
  cmH2OFromMmHg: { input: { mmHg: 20 }, bare: true },
  cylinderDuration: {
    input: { cylinder: 'E', pressurePsi: 2000, reservePsi: 200, flowLMin: 10 },
    optional: ['reservePsi'],
  },
  dailyMinimum: {
    input: {
      samples: [{ at: '2024-03-01T10:00:00Z', value: 5 }],
      day: '2024-03-01',
      timeZone: 'Europe/Berlin',
    },
  },
  deadSpaceFraction: { input: { paco2MmHg: 40, mixedExpiredPco2MmHg: 27 } },
  drivingPressure: { input: { plateauCmH2O: 24, totalPeepCmH2O: 10 } },
  dynamicCompliance: { input: { tidalVolumeMl: 420, peakCmH2O: 30, peepCmH2O: 8 } },
  erlangB: { input: { servers: 10, offeredErlangs: 6 } },
  expectedPaco2Winters: { input: { bicarbonateMmolL: 12 } },
  expectedTubeDepth: { input: { heightCm: 170 } },
  freshness: {
    input: {
      kind: 'check',
      observedAt: '2024-03-01T10:00:00+01:00',
      now: '2024-03-01T12:00:00+01:00',
      policy: { check: { dueFrom: 210, overdueFrom: 240, withdrawFrom: 480 } },
    },
  },
  gasConsistency: { input: { ph: 7.4, paco2MmHg: 40, bicarbonateMmolL: 24 } },
  globalArdsClass: {
    input: { pfMmHg: 180, support: 'invasive', peepCmH2O: 8, flowLMin: 40, resourceLimited: false },
    optional: ['peepCmH2O', 'flowLMin', 'resourceLimited'],
  },
  hacorScore: { input: { heartRatePerMin: 100, ph: 7.3, glasgowComaScale: 14, pfMmHg: 160, ratePerMin: 30 } },
  hPaFromCmH2O: { input: { cmH2O: 30 }, bare: true },
  hydrogenIon: { input: { ph: 7.4 } },
  infectionRelated: {
    input: {
      event: { onset: '2024-03-08', kind: 'VAC', by: ['peep'], ventilationDayOne: '2024-03-01' },
      temperatures: [{ day: '2024-03-08', celsius: 38.4 }],
      whiteCells: [{ day: '2024-03-08', perMm3: 13_000 }],
      antimicrobialDays: [{ agent: 'A', days: ['2024-03-08'] }],
    },
  },
  kpaFromMmHg: { input: { mmHg: 40 }, bare: true },
  liquidOxygenGas: { input: { kind: 'litres', amount: 3 } },
  mechanicalPowerPressureControl: { input: { ...BREATH, inspiratoryPressureCmH2O: 14, peepCmH2O: 8 } },
  mechanicalPowerVolumeControl: { input: { ...BREATH, ...PRESSURES } },
  mechanicalPowerWithoutPlateau: {
    input: { minuteVentilationLMin: 8, peakCmH2O: 30, peepCmH2O: 8, inspiratoryFlowLMin: 50 },
  },
  minuteVentilation: { input: BREATH },
  mmHgFromKpa: { input: { kpa: 5.3 }, bare: true },
  murrayScore: {
    input: { quadrants: 2, pfMmHg: 180, peepCmH2O: 10, complianceMlCmH2O: 40 },
    optional: ['complianceMlCmH2O'],
  },
  offeredForBlocking: { input: { servers: 10, blocking: 0.01 } },
  oxygenFlow: { input: { totalFlowLMin: 40, fio2: 0.5 } },
  oxygenSaturationIndex: { input: { meanAirwayPressureCmH2O: 14, fio2: 0.6, spo2Percent: 92 } },
  oxygenationIndex: { input: { ...OXYGEN, meanAirwayPressureCmH2O: 14 } },
  peepFio2Step: { input: { peepCmH2O: 8, fio2: 0.5, ladder: 'lower' } },
  pfRatio: { input: OXYGEN },
  poissonBinomial: { input: { probabilities: [0.2, 0.5] } },
  predictedBodyWeight: { input: { sex: 'male', heightCm: 175 } },
  rapidShallowBreathingIndex: { input: BREATH },
  rateForTargetPaco2: { input: { ratePerMin: 18, paco2MmHg: 55, targetPaco2MmHg: 45 } },
  respiratorySofa: { input: { pfMmHg: 180, supported: true } },
  roxIndex: { input: { spo2Percent: 92, fio2: 0.6, ratePerMin: 28 } },
  serversForBlocking: { input: { offeredErlangs: 6, blocking: 0.01 } },
  sfRatio: { input: { spo2Percent: 92, fio2: 0.6 } },
  staticCompliance: { input: { tidalVolumeMl: 420, plateauCmH2O: 24, totalPeepCmH2O: 10 } },
  suctionCatheterMaxFr: { input: { tubeInternalDiameterMm: 7.5 } },
  tidalVolumePerKg: { input: { tidalVolumeMl: 420, predictedBodyWeightKg: 70 } },
  timeConstant: { input: { complianceMlCmH2O: 40, resistanceCmH2OPerLS: 12 } },
  ventilatorEvents: { input: { days: DAY_LIST } },
  ventilatoryRatio: { input: { minuteVentilationLMin: 9, paco2MmHg: 45, predictedBodyWeightKg: 65 } },
} as const satisfies Record<keyof typeof ventilation, Example>;

export const EXAMPLE_ENTRIES: readonly (readonly [name: keyof typeof ventilation, example: Example])[] =
  Object.entries(EXAMPLES) as [keyof typeof ventilation, Example][];

const CALCULATIONS: Readonly<Record<string, unknown>> = { ...ventilation };

/** Calls an exported calculation with any input, the impossible included. */
export function callWith(name: keyof typeof ventilation, input: Readonly<Record<string, unknown>>): unknown {
  const calculation = CALCULATIONS[name] as (input: unknown) => unknown;
  const example: Example = EXAMPLES[name];
  return calculation(example.bare ? Object.values(input)[0] : input);
}
