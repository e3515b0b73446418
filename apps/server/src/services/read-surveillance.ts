import type { Airway, Check, Happening } from '@windrow/ventilation/contract/observations';
import type { StayDetails } from '@windrow/ventilation/contract/stays';
import type { Surveillance } from '@windrow/ventilation/contract/surveillance';
import {
  type InfectionSignBody,
  type SurveyedFacts,
  staySurveillance,
} from '@windrow/ventilation/surveillance/stay-surveillance';
import type { Knex } from 'knex';
import type { Deps } from '../deps.ts';
import { policyOf } from '../queries/policies.ts';
import { allFacts } from '../queries/stay-facts.ts';
import type { StayRow } from '../queries/stays.ts';
import { unitById } from '../queries/units.ts';

/** A stay's surveillance from all of its facts that hold, in the zone and by the check interval of its unit. */
export async function readSurveillance(
  { db, now }: Pick<Deps, 'db' | 'now'>,
  { stay }: { stay: StayRow },
): Promise<Surveillance> {
  const unit = await unitById(db, stay.unit_id);
  if (!unit) throw new Error(`stay ${stay.id} is in no unit`);
  const { policy } = await policyOf(db, unit.id);
  const details = await allFacts<StayDetails>(db, { stayId: stay.id, kind: 'details' });
  const patient = details.at(-1)?.body.patient;
  if (!patient) throw new Error(`stay ${stay.id} has no details`);
  const { familyName, givenName, hospitalNumber } = patient;
  return {
    stayId: stay.id,
    unitId: unit.id,
    patient: { familyName, givenName, hospitalNumber },
    leftAt: stay.left_at,
    ...staySurveillance({
      facts: await surveyedFacts(db, stay.id),
      timeZone: unit.time_zone,
      chartingIntervalMinutes: Math.min(policy.tasks.check.everyMinutes, LONGEST_INTERVAL_MINUTES),
      admittedAt: stay.admitted_at,
      until: stay.left_at ?? now().toISOString(),
      isPresent: stay.left_at === null,
    }),
  };
}

/** A day: a daily minimum looks no farther. */
const LONGEST_INTERVAL_MINUTES = 1440;

async function surveyedFacts(db: Knex, stayId: string): Promise<SurveyedFacts> {
  return {
    checks: await allFacts<Check>(db, { stayId, kind: 'check' }),
    airways: await allFacts<Airway>(db, { stayId, kind: 'airway' }),
    happenings: await allFacts<Happening>(db, { stayId, kind: 'happening' }),
    signs: await allFacts<InfectionSignBody>(db, { stayId, kind: 'infection-sign' }),
  };
}
