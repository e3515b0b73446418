import type { DemoShift, DemoStay } from './demo-types.ts';
import type { StayPlan } from './plan.ts';
import { randomOf } from './random.ts';
import { authorOf } from './shifts.ts';
import { recordOf } from './stay-record.ts';
import { ENDED_PLANS } from './stays/ended.ts';
import { HARBOUR_PLANS } from './stays/harbour.ts';
import { LANTERN_PLANS } from './stays/lantern.ts';
import { ORCHARD_PLANS } from './stays/orchard.ts';
import { minutes } from './times.ts';

/** Every stay of the demo hospital with its record, from the plans. */
export function demoStays({ now, shifts }: { now: string; shifts: readonly DemoShift[] }): DemoStay[] {
  const planned: { unitKey: string; plan: StayPlan }[] = [
    ...HARBOUR_PLANS.map((plan) => ({ unitKey: 'harbour', plan })),
    ...LANTERN_PLANS.map((plan) => ({ unitKey: 'lantern', plan })),
    ...ORCHARD_PLANS.map((plan) => ({ unitKey: 'orchard', plan })),
    ...ENDED_PLANS,
  ];
  return planned.map(({ unitKey, plan }, index) => {
    const key = `${unitKey}-${plan.bed}${plan.left ? `-left-${minutes(plan.left.hoursAgo)}` : ''}`;
    const bedLabel = plan.bed;
    const by = (minutesAgo: number) => authorOf({ unitKey, bedLabel, minutesAgo, shifts });
    return {
      key,
      unitKey,
      bedLabel,
      details: detailsOf({ key, plan, index, now }),
      admittedMinutesAgo: minutes(plan.admittedHoursAgo),
      leftMinutesAgo: plan.left ? minutes(plan.left.hoursAgo) : null,
      outcome: plan.left?.outcome ?? null,
      facts: recordOf({ key, plan, by }),
      acknowledged: plan.acknowledged ? { ...plan.acknowledged, by: by(plan.acknowledged.minutesAgo) } : null,
    };
  });
}

function detailsOf({
  key,
  plan,
  index,
  now,
}: {
  key: string;
  plan: StayPlan;
  index: number;
  now: string;
}): DemoStay['details'] {
  const { familyName, givenName, sex, heightCm, age } = plan.patient;
  const random = randomOf(`${key} born`);
  const year = new Date(now).getUTCFullYear() - age - 1;
  const day = `${two(random.whole(1, 12))}-${two(random.whole(1, 28))}`;
  return {
    // Numbers run on, so that none is given twice.
    patient: {
      hospitalNumber: `SG-${410_233 + index * 37}`,
      familyName,
      givenName,
      bornOn: `${year}-${day}`,
      sex,
      heightCm,
    },
    difficultAirway: plan.difficultAirway ?? false,
    precautions: plan.precautions ?? null,
    careLimits: plan.careLimits ?? null,
    orders: {
      checkEveryMinutes: plan.checkEveryMinutes ?? null,
      gasEveryMinutes: plan.gasEveryMinutes ?? null,
    },
  };
}

function two(value: number): string {
  return String(value).padStart(2, '0');
}
