import { bedBoard } from '@windrow/ventilation/board/bed-board';
import { NOTHING_ACKNOWLEDGED, type Stamped, type StayFacts } from '@windrow/ventilation/board/facts';
import type { Bed } from '@windrow/ventilation/contract/board';
import { Airway, AirwayCheck, Check, Gas, Happening } from '@windrow/ventilation/contract/observations';
import { DEFAULT_POLICY } from '@windrow/ventilation/policy/policy';
import type { DemoFact, DemoHospital, DemoStay } from './demo-types.ts';
import { supportNow } from './support-now.ts';

/** The board as a server that was filled from the demo hospital would show it: for tests, and for screens without a server. */
export function demoBoard({ hospital, now }: { hospital: DemoHospital; now: string }): Bed[] {
  return hospital.units.flatMap((unit) =>
    unit.beds.map((bed) => {
      const stay = hospital.stays.find(
        ({ unitKey, bedLabel, leftMinutesAgo }) =>
          unitKey === unit.key && bedLabel === bed.label && leftMinutesAgo === null,
      );
      const rowOf = (facts: StayFacts | null) =>
        bedBoard({
          place: { ...bed, bedId: `${unit.key}-${bed.label}`, unitId: unit.key },
          revision: 1,
          facts,
          policy: DEFAULT_POLICY,
          assignments: [],
          ventilator: null,
        });
      if (!stay) return rowOf(null);
      const facts = factsOf({ stay, hospital, now });
      const row = rowOf(facts);
      return stay.acknowledged ? rowOf({ ...facts, ...acknowledgedIn({ row, stay, hospital, now }) }) : row;
    }),
  );
}

/** Each fact of the demo was recorded before it was acknowledged, so nothing came in since. */
function acknowledgedIn({
  row,
  stay: { key, acknowledged },
  hospital,
  now,
}: {
  row: Bed;
  stay: DemoStay;
  hospital: DemoHospital;
  now: string;
}): Pick<StayFacts, 'acknowledgements' | 'sinceAcknowledged'> {
  const flag = row.stay?.flags.find(({ id }) => id === acknowledged?.flagId);
  if (!acknowledged || !flag) throw new RangeError(`${key} acknowledges a flag that is not raised`);
  const at = new Date(Date.parse(now) - acknowledged.minutesAgo * 60_000).toISOString();
  return {
    ...NOTHING_ACKNOWLEDGED,
    acknowledgements: [
      {
        observationId: `${key}-acknowledgement`,
        observedAt: at,
        recordedAt: at,
        recordedByInitials:
          hospital.people.find(({ username }) => username === acknowledged.by)?.initials ?? '',
        body: { observedAt: at, flagId: flag.id, fingerprint: flag.fingerprint, note: acknowledged.note },
      },
    ],
  };
}

function factsOf({
  stay,
  hospital,
  now,
}: {
  stay: DemoStay;
  hospital: DemoHospital;
  now: string;
}): StayFacts {
  const at = (minutesAgo: number) => new Date(Date.parse(now) - minutesAgo * 60_000).toISOString();
  const initials = new Map(hospital.people.map((person) => [person.username, person.initials]));
  const newestFirst = (kind: DemoFact['kind']) =>
    stay.facts.filter((fact) => fact.kind === kind).toReversed();
  const stamped = <Body>(fact: DemoFact, parse: (body: unknown) => Body): Stamped<Body> => ({
    observationId: `${stay.key}-${fact.kind}-${fact.minutesAgo}`,
    observedAt: at(fact.minutesAgo),
    recordedAt: at(fact.recordedMinutesAgo),
    recordedByInitials: initials.get(fact.by) ?? '',
    body: parse({ observedAt: at(fact.minutesAgo), ...fact.body }),
  });
  const newest = <Body>(kind: DemoFact['kind'], parse: (body: unknown) => Body) => {
    const fact = newestFirst(kind)[0];
    return fact ? stamped(fact, parse) : null;
  };
  const support = supportNow(stay);
  return {
    stayId: stay.key,
    version: 1,
    admittedAt: at(stay.admittedMinutesAgo),
    details: stay.details,
    checks: newestFirst('check').map((fact) => stamped(fact, (body) => Check.parse(body))),
    gas: newest('gas', (body) => Gas.parse(body)),
    airway: newest('airway', (body) => Airway.parse(body)),
    airwayChecks: newestFirst('airway-check').map((fact) => stamped(fact, (body) => AirwayCheck.parse(body))),
    happenings: newestFirst('happening').map((fact) => stamped(fact, (body) => Happening.parse(body))),
    support: support && {
      id: support.id,
      sinceAt: at(support.sinceMinutesAgo),
      observedAt: at(support.sinceMinutesAgo),
    },
    ...NOTHING_ACKNOWLEDGED,
  };
}
