import { predictedBodyWeight } from '@windrow/ventilation/physiology/predicted-body-weight';
import type { SupportId } from '@windrow/ventilation/support/catalogue';
import { alarmLimits } from './alarm-limits.ts';
import { gasValues } from './blood.ts';
import { breathedOxygenPercent, readingsOf, type Settings, setVolume } from './breath.ts';
import type { DemoFact } from './demo-types.ts';
import { lungAt } from './lung-at.ts';
import type { Phase, StayPlan, Tube } from './plan.ts';
import { type Random, randomOf } from './random.ts';
import { airwayCheckTimes, checkTimes, gasTimes, minutes, phaseAt, spanOf } from './times.ts';

type Unsigned = Omit<DemoFact, 'by' | 'recordedMinutesAgo'>;

/** Used for the volumes of a patient whose height nobody has measured yet. */
const UNMEASURED_KG = 62;

/** The whole record of a stay, oldest first, from its plan. */
export function recordOf({
  key,
  plan,
  by,
}: {
  key: string;
  plan: StayPlan;
  by: (minutesAgo: number) => string;
}): DemoFact[] {
  const { lastMinutesAgo } = spanOf(plan);
  const delays = randomOf(`${key} delays`);
  return [
    ...tubeFacts(plan),
    ...(plan.happenings ?? []).map(({ minutesAgo, ...body }) => fact('happening', minutesAgo, body)),
    ...checks(plan, randomOf(`${key} checks`)),
    ...airwayChecks(plan, randomOf(`${key} airway`)),
    ...gases(plan, randomOf(`${key} gases`)),
  ]
    .sort((one, other) => other.minutesAgo - one.minutesAgo)
    .map((entry) => {
      // Most facts are kept at the bed; now and then somebody writes one up a little later.
      const delay = delays.next() < 0.08 ? delays.whole(12, 28) : delays.whole(1, 5);
      const recordedMinutesAgo = Math.max(lastMinutesAgo, entry.minutesAgo - delay);
      return {
        ...entry,
        recordedMinutesAgo: Math.min(entry.minutesAgo, recordedMinutesAgo),
        by: by(entry.minutesAgo),
      };
    });
}

function fact(kind: DemoFact['kind'], minutesAgo: number, body: Record<string, unknown>): Unsigned {
  return { kind, minutesAgo, body };
}

function weightOf({ patient: { sex, heightCm } }: StayPlan): number {
  return sex === null || heightCm === null ? UNMEASURED_KG : predictedBodyWeight({ sex, heightCm });
}

function checks(plan: StayPlan, random: Random): Unsigned[] {
  return checkTimes(plan, random).map((minutesAgo, index) => {
    const phase = phaseAt(plan.phases, minutesAgo);
    if (!phase) throw new RangeError(`a check needs a support; ${plan.patient.familyName} has none`);
    return fact('check', minutesAgo, checkBody({ plan, phase, minutesAgo, random, isNewest: index === 0 }));
  });
}

function checkBody({
  plan,
  phase,
  minutesAgo,
  random,
  isNewest,
}: {
  plan: StayPlan;
  phase: Phase;
  minutesAgo: number;
  random: Random;
  isNewest: boolean;
}) {
  const found = isNewest ? plan.found : undefined;
  const weightKg = weightOf(plan);
  const vtSetMl = setVolume(phase, weightKg);
  const settings: Settings = {
    ...(vtSetMl === undefined ? {} : { vtSetMl }),
    ...phase.settings,
    ...found?.settings,
  };
  const lung = lungAt(plan.lung, (minutesAgo - (plan.newest.check ?? 0)) / 60);
  const readings = { ...readingsOf({ phase, settings, lung, weightKg, random }), ...found?.readings };
  const limits =
    found?.limits === 'none'
      ? {}
      : written({ ...alarmLimits({ mode: phase.mode, settings, readings }), ...found?.limits });
  return {
    mode: phase.mode,
    settings,
    readings,
    limits,
    ...(phase.interface ? { interface: phase.interface } : {}),
    ...passiveOf(readings, found),
    ...(found?.note ? { note: found.note } : {}),
  };
}

function written<Limit>(limits: Record<string, Limit | null>): Record<string, Limit> {
  const kept: Record<string, Limit> = {};
  for (const [key, limit] of Object.entries(limits)) if (limit !== null) kept[key] = limit;
  return kept;
}

/** Said wherever a plateau was read; now and then somebody forgets it, or the patient breathes in the pause. */
function passiveOf({ plateauCmH2O }: { plateauCmH2O?: number }, found: StayPlan['found']) {
  if (plateauCmH2O === undefined || found?.passive === 'not recorded') return {};
  return { passive: found?.passive ?? true };
}

function gases(plan: StayPlan, random: Random): Unsigned[] {
  const newest = plan.newest.gas ?? 0;
  return gasTimes(plan, random).map((minutesAgo, index) => {
    const phase = phaseAt(plan.phases, minutesAgo);
    const breathed = phase ? breathedOxygenPercent(phase) : 21;
    // What was breathed belongs to the gas only where it is known: on low flow it is not.
    const fio2Percent = phase?.mode === 'low-flow' ? undefined : breathed;
    const peepCmH2O =
      phase && (phase.settings.peepCmH2O ?? phase.settings.epapCmH2O ?? phase.settings.cpapCmH2O);
    const lung = lungAt(plan.lung, (minutesAgo - newest) / 60);
    return fact('gas', minutesAgo, {
      site: (index === 0 ? plan.newestGasSite : undefined) ?? 'arterial',
      ...gasValues({ lung, fio2Percent: breathed, random, isNewest: index === 0 }),
      ...(fio2Percent === undefined ? {} : { fio2Percent }),
      ...(peepCmH2O === undefined ? {} : { peepCmH2O }),
      ...(index === 0 ? plan.found?.gas : {}),
    });
  });
}

function airwayChecks(plan: StayPlan, random: Random): Unsigned[] {
  return airwayCheckTimes(plan, random).map((minutesAgo, index) => {
    const tube = (plan.tubes ?? []).findLast(({ placedHoursAgo }) => minutes(placedHoursAgo) > minutesAgo);
    return fact('airway-check', minutesAgo, {
      ...(tube?.depthCm === undefined ? {} : { depthCm: tube.depthCm }),
      cuffCmH2O: random.whole(23, 29),
      cuffMethod: 'manometer',
      ...(tube?.kind === 'tracheostomy' ? {} : { position: random.pick(['left', 'centre', 'right']) }),
      secured: true,
      ...(index === 0 ? plan.found?.airway : {}),
    });
  });
}

function tubeFacts(plan: StayPlan): Unsigned[] {
  return (plan.tubes ?? []).flatMap((tube) => {
    const placedAt = minutes(tube.placedHoursAgo);
    const { kind, sizeMm, depthCm, subglotticPort } = tube;
    const placed = {
      event: 'placed',
      kind,
      sizeMm,
      cuffed: true,
      ...(depthCm === undefined ? {} : { depthCm, depthMark: kind === 'nasal-tube' ? 'nostril' : 'lip' }),
      ...(subglotticPort === undefined ? {} : { subglotticPort }),
    };
    return [
      fact('happening', placedAt, { kind: placingOf(tube) }),
      fact('airway', placedAt, placed),
      ...removal(plan, tube),
    ];
  });
}

function placingOf({ kind, again }: Tube): string {
  if (kind === 'tracheostomy') return 'tracheostomy';
  return again ? 'reintubated' : 'intubated';
}

function removal({ phases }: StayPlan, { outHoursAgo, out }: Tube): Unsigned[] {
  if (outHoursAgo === undefined) return [];
  const at = minutes(outHoursAgo);
  const removed = fact('airway', at, { event: 'removed' });
  if (out === 'changed') return [removed];
  const toSupport: SupportId | undefined = phaseAt(phases, at)?.mode;
  return [
    removed,
    fact('happening', at, {
      kind: out === 'unplanned' ? 'extubated-unplanned' : 'extubated-planned',
      toSupport,
    }),
  ];
}
