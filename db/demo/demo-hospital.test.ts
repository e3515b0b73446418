import { gasConsistency } from '@windrow/ventilation/acid-base/gas-consistency';
import { shownBed } from '@windrow/ventilation/board/shown-bed';
import { NewVentilator } from '@windrow/ventilation/contract/fleet';
import { Gas, RECORDED_KINDS } from '@windrow/ventilation/contract/observations';
import { NewBed, NewPerson, NewUnit } from '@windrow/ventilation/contract/setup';
import { StayDetails } from '@windrow/ventilation/contract/stays';
import { type Act, may } from '@windrow/ventilation/permissions/permissions';
import { SUPPORT_IDS, supportEntry } from '@windrow/ventilation/support/catalogue';
import { describe, expect, it } from 'vitest';
import { demoBoard } from './demo-board.ts';
import { demoHospital } from './demo-hospital.ts';
import type { DemoStay } from './demo-types.ts';
import { supportNow } from './support-now.ts';

const NOW = '2026-12-01T13:40:00Z';
const hospital = demoHospital({ now: NOW });
const present = hospital.stays.filter((stay) => stay.leftMinutesAgo === null);
const board = demoBoard({ hospital, now: NOW });
const shown = board.map((bed) => shownBed({ bed, now: NOW }));
const placeOf = ({ unitKey, bedLabel }: { unitKey: string; bedLabel: string }) => `${unitKey} ${bedLabel}`;

function bedAt(unitKey: string, label: string) {
  const found = shown.find(({ bed }) => bed.unitId === unitKey && bed.label === label);
  if (!found) throw new RangeError(`no bed ${label} in ${unitKey}`);
  return found;
}

function onVentilator(stay: DemoStay): boolean {
  const support = supportNow(stay);
  return support !== null && ['invasive', 'mask'].includes(supportEntry(support.id).kind);
}

describe('the demo hospital', () => {
  it('is the same each time at the same moment, and has the same record at any other', () => {
    expect(demoHospital({ now: NOW })).toEqual(hospital);
    const later = demoHospital({ now: '2027-03-14T02:05:00Z' });
    expect(later.stays.map(({ key, admittedMinutesAgo }) => [key, admittedMinutesAgo])).toEqual(
      hospital.stays.map(({ key, admittedMinutesAgo }) => [key, admittedMinutesAgo]),
    );
    expect(later.stays.map(({ facts }) => facts.map(({ by: _by, ...fact }) => fact))).toEqual(
      hospital.stays.map(({ facts }) => facts.map(({ by: _by, ...fact }) => fact)),
    );
  });

  it('has three units of 16, 8 and 24 beds, all acceptable to the set-up', () => {
    expect(hospital.units.map(({ name, beds }) => [name, beds.length])).toEqual([
      ['Harbour ICU', 16],
      ['Lantern ICU', 8],
      ['Orchard ICU', 24],
    ]);
    for (const { name, timeZone, beds } of hospital.units) {
      expect(NewUnit.safeParse({ name, timeZone }).success).toBe(true);
      expect(new Set(beds.map(({ row, column }) => `${row}/${column}`)).size).toBe(beds.length);
      for (const { isOpen: _isOpen, ...bed } of beds) expect(NewBed.safeParse(bed).success).toBe(true);
    }
  });

  it('has the sign-ins that the start prints, and initials that are unique in a unit', () => {
    const people = hospital.people.map(({ username, displayName, initials }) =>
      NewPerson.safeParse({ username, displayName, initials, password: 'twelve letters', grants: [] }),
    );
    expect(people.every(({ success }) => success)).toBe(true);
    const usernames = hospital.people.map(({ username }) => username);
    expect(usernames).toEqual(
      expect.arrayContaining([
        'therapist',
        'therapist2',
        'charge',
        'supervisor',
        'clinician',
        'biomed',
        'admin',
        'display',
      ]),
    );
    expect(new Set(usernames).size).toBe(usernames.length);
    expect(new Set(hospital.people.map(({ initials }) => initials)).size).toBe(usernames.length);
  });
});

describe('its stays', () => {
  it('are some forty present and a dozen ended', () => {
    expect(present).toHaveLength(41);
    expect(hospital.stays).toHaveLength(53);
  });

  it('have details that the admission accepts, with a hospital number each', () => {
    for (const { details } of hospital.stays) expect(StayDetails.safeParse(details).error).toBeUndefined();
    const numbers = hospital.stays.map(({ details }) => details.patient.hospitalNumber);
    expect(new Set(numbers).size).toBe(numbers.length);
  });

  it('never share a bed: each ended before the next began, and none lies in a closed bed', () => {
    const open = hospital.units.flatMap(({ key, beds }) =>
      beds.filter(({ isOpen }) => isOpen).map(({ label }) => placeOf({ unitKey: key, bedLabel: label })),
    );
    for (const stay of hospital.stays) {
      expect(open).toContain(placeOf(stay));
      const left = stay.leftMinutesAgo ?? 0;
      expect(stay.admittedMinutesAgo).toBeGreaterThan(left);
      const others = hospital.stays.filter((other) => other !== stay && placeOf(other) === placeOf(stay));
      for (const other of others) {
        const apart =
          other.admittedMinutesAgo < left || stay.admittedMinutesAgo < (other.leftMinutesAgo ?? 0);
        expect(apart, `${stay.key} and ${other.key}`).toBe(true);
      }
    }
  });

  it('end with an outcome, and only then', () => {
    for (const { leftMinutesAgo, outcome } of hospital.stays)
      expect(outcome === null).toBe(leftMinutesAgo === null);
  });

  it('tell of every entry of the support catalogue', () => {
    const told = new Set(present.flatMap((stay) => supportNow(stay)?.id ?? []));
    expect(SUPPORT_IDS.filter((id) => !told.has(id))).toEqual([]);
  });
});

describe('its facts', () => {
  const facts = hospital.stays.flatMap((stay) => stay.facts.map((fact) => ({ stay, fact })));

  it('are accepted by the schema of their route', () => {
    for (const { stay, fact } of facts) {
      const parsed = RECORDED_KINDS[fact.kind].schema.safeParse({ observedAt: NOW, ...fact.body });
      expect(
        parsed.error,
        `${stay.key} ${fact.kind} ${fact.minutesAgo} ${JSON.stringify(fact.body)}`,
      ).toBeUndefined();
    }
  });

  it('lie within their stay, oldest first, and are recorded after they were observed', () => {
    for (const { admittedMinutesAgo, leftMinutesAgo, facts: record } of hospital.stays) {
      const ages = record.map(({ minutesAgo }) => minutesAgo);
      expect(ages).toEqual([...ages].sort((one, other) => other - one));
      for (const { minutesAgo, recordedMinutesAgo } of record) {
        expect(Number.isInteger(minutesAgo) && Number.isInteger(recordedMinutesAgo)).toBe(true);
        expect(minutesAgo).toBeLessThan(admittedMinutesAgo);
        expect(recordedMinutesAgo).toBeLessThanOrEqual(minutesAgo);
        expect(recordedMinutesAgo).toBeGreaterThanOrEqual(leftMinutesAgo ?? 0);
      }
    }
  });

  it('are written by people who may record in that unit', () => {
    const grants = new Map(
      hospital.people.map(({ username, grants: held }) => [
        username,
        held.map(({ role, unitKey }) => ({ role, unitId: unitKey })),
      ]),
    );
    const act: Act = 'record';
    for (const { stay, fact } of facts) {
      expect(may(grants.get(fact.by) ?? [], act, stay.unitKey), `${fact.by} in ${stay.unitKey}`).toBe(true);
    }
  });

  it('hold gases that fit themselves, but for the one that was mistyped', () => {
    const odd = facts.flatMap(({ stay, fact }) => {
      if (fact.kind !== 'gas') return [];
      const { ph, pco2MmHg, bicarbonateMmolL = Number.NaN } = Gas.parse({ observedAt: NOW, ...fact.body });
      return gasConsistency({ ph, paco2MmHg: pco2MmHg, bicarbonateMmolL }).consistent ? [] : [stay.key];
    });
    expect(odd).toEqual(['orchard-19']);
  });

  it('tell a coherent course: no airway check without a tube, and each trial, transport and turn in its order', () => {
    for (const { key, facts: record } of hospital.stays) {
      let tube = false;
      let away = false;
      let trial = false;
      for (const { kind, body } of record) {
        if (kind === 'airway') tube = body.event === 'placed';
        if (kind === 'airway-check') expect(tube, key).toBe(true);
        if (body.kind === 'left-for-transport') away = !away;
        if (body.kind === 'back-from-transport') {
          expect(away, key).toBe(true);
          away = false;
        }
        if (body.kind === 'trial-started') trial = true;
        if (body.kind === 'trial-passed' || body.kind === 'trial-failed') {
          expect(trial, key).toBe(true);
          trial = false;
        }
        const mode = kind === 'check' && SUPPORT_IDS.find((id) => id === body.mode);
        if (mode && supportEntry(mode).kind === 'invasive') expect(tube, `${key} ${mode}`).toBe(true);
      }
    }
  });
});

describe('its board, as it opens', () => {
  it.each(['check', 'airway', 'gas'] as const)(
    'shows every rung of the age ladder of the %s on Harbour',
    (group) => {
      const states = new Set(
        shown
          .filter(({ bed }) => bed.unitId === 'harbour' && bed.stay)
          .map(({ groups }) => groups[group].state),
      );
      expect([...states].sort()).toEqual(['current', 'due', 'never', 'overdue', 'withdrawn']);
    },
  );

  it('shows flags of many kinds, of each level and group', () => {
    const flags = shown.flatMap(({ bed }) => bed.stay?.flags ?? []);
    const ids = new Set(flags.map(({ id }) => id));
    expect([...ids]).toEqual(
      expect.arrayContaining([
        'vt-per-kg-high',
        'vt-per-kg-above',
        'plateau-high',
        'driving-pressure-high',
        'mechanical-power-high',
        'intrinsic-peep',
        'fio2-high',
        'pf-low',
        'ph-low',
        'gas-inconsistent',
        'cuff-out-of-band',
        'depth-moved',
        'suction-catheter-small',
        'limit-off-low-vt',
        'limit-off-apnoea',
        'limit-missing-low-vt',
        'limit-passed-high-rate',
        'limits-not-recorded',
        'rate-above-set',
        'expiratory-time-short',
      ]),
    );
    const seen = flags.filter(({ acknowledged }) => acknowledged !== null);
    expect(seen.map(({ id, level }) => [id, level])).toEqual([
      ['pf-low', 'attention'],
      ['suction-catheter-small', 'note'],
    ]);
    const quiet = shown.filter(({ bed }) => bed.stay && bed.stay.flags.length === 0);
    expect(quiet.length).toBeGreaterThan(15);
  });

  it('records of most plateaus that the patient was passive, and shows those of which it is not said', () => {
    const paused = shown.flatMap(({ bed }) =>
      bed.stay?.check?.readings.plateauCmH2O === undefined ? [] : [bed.stay.check],
    );
    const passive = paused.map((check) => check.passive);
    expect(new Set(passive)).toEqual(new Set([true, false, null]));
    expect(passive.filter((is) => is === true).length).toBeGreaterThan(10);
    for (const { passive: is, derived } of paused)
      expect(derived.drivingPressureCmH2O !== null).toBe(is === true);
  });

  it('shows the beds that the demonstration speaks of', () => {
    const withoutHeight = bedAt('orchard', '24').bed.stay;
    expect(withoutHeight?.predictedBodyWeightKg).toBeNull();
    expect(withoutHeight?.check?.derived.vtPerKgMl).toBeNull();
    expect(bedAt('harbour', '02').bed.stay?.gas?.changedSinceAt).not.toBeNull();
    expect(bedAt('harbour', '05').bed.stay?.proneSinceAt).not.toBeNull();
    expect(bedAt('harbour', '12').bed.stay?.difficultAirway).toBe(true);
    expect(bedAt('harbour', '13').bed.stay?.trial).not.toBeNull();
    expect(bedAt('harbour', '14').bed.stay?.support?.id).toBe('room-air');
    expect(bedAt('harbour', '16').bed.stay?.support).toBeNull();
    expect(bedAt('harbour', '04').bed.stay).toBeNull();
    expect(bedAt('lantern', '02').bed.stay?.away?.to).toBe('CT');
    // Extubated since the last check: that check tells of another support.
    expect(bedAt('orchard', '05').bed.stay?.check?.changedSinceAt).not.toBeNull();
    expect(shown.filter(({ bed }) => bed.stay?.away)).toHaveLength(1);
    const names = present.map(({ details }) => `${details.patient.givenName} ${details.patient.familyName}`);
    expect(Math.max(...names.map(({ length }) => length))).toBeGreaterThan(40);
  });
});

describe('its fleet', () => {
  const inUse = hospital.ventilators.filter(({ state }) => state === 'in-use');

  it('is sixty machines, each acceptable, with an asset number of its own', () => {
    expect(hospital.ventilators).toHaveLength(60);
    expect(new Set(hospital.ventilators.map(({ assetNumber }) => assetNumber)).size).toBe(60);
    for (const { assetNumber, model, class: machineClass } of hospital.ventilators) {
      const parsed = NewVentilator.safeParse({ assetNumber, model, class: machineClass, homeUnitId: null });
      expect(parsed.success).toBe(true);
    }
  });

  it('stands at a bed when in use and only then, one machine a bed', () => {
    for (const { state, bed } of hospital.ventilators) expect(bed !== null).toBe(state === 'in-use');
    const places = inUse.flatMap(({ bed }) => (bed ? [placeOf(bed)] : []));
    expect(new Set(places).size).toBe(places.length);
  });

  it('is at every patient on a ventilator but one', () => {
    const places = new Set(inUse.flatMap(({ bed }) => (bed ? [placeOf(bed)] : [])));
    const ventilated = present.filter(onVentilator);
    expect(ventilated.filter((stay) => !places.has(placeOf(stay))).map(({ key }) => key)).toEqual([
      'orchard-20',
    ]);
    expect(places.size).toBe(ventilated.length - 1);
    for (const stay of ventilated) {
      const machine = inUse.find(({ bed }) => bed && placeOf(bed) === placeOf(stay));
      if (machine) expect(machine.sinceMinutesAgo).toBeLessThanOrEqual(stay.admittedMinutesAgo);
    }
  });

  it('has machines in every state that a unit meets, and of every class', () => {
    const states = new Set(hospital.ventilators.map(({ state }) => state));
    expect([...states].sort()).toEqual(['cleaning', 'held', 'in-use', 'on-loan', 'ready']);
    expect(new Set(hospital.ventilators.map((machine) => machine.class)).size).toBe(4);
  });
});

describe('its shifts', () => {
  it.each([
    '2026-12-01T00:00:00Z',
    '2026-12-01T06:59:00Z',
    '2026-07-01T13:40:00Z',
    '2026-03-29T03:20:00Z',
    '2026-12-01T23:59:00Z',
  ])(
    'run in each unit at %s for hours to come, on the hour, with the next one of Harbour still to be divided',
    (now) => {
      const { shifts, units } = demoHospital({ now });
      for (const { key } of units) {
        const running = shifts.filter(
          ({ unitKey, startsMinutesFromNow: from, endsMinutesFromNow: to }) =>
            unitKey === key && from <= 0 && to > 0,
        );
        expect(running).toHaveLength(1);
        expect(running[0]?.published).toBe(true);
        expect(running[0]?.endsMinutesFromNow).toBeGreaterThan(360);
      }
      const next = shifts.filter(({ startsMinutesFromNow }) => startsMinutesFromNow > 0);
      expect(next).toMatchObject([{ unitKey: 'harbour', published: false, places: [] }]);
      for (const { startsMinutesFromNow } of shifts) {
        expect(new Date(Date.parse(now) + startsMinutesFromNow * 60_000).getUTCMinutes()).toBe(0);
      }
    },
  );

  it('give each bed to one person who is on, and leave one occupied bed of Harbour unassigned', () => {
    for (const { people, places } of hospital.shifts) {
      const on = people.map(({ username }) => username);
      expect(new Set(places.map(({ bedLabel }) => bedLabel)).size).toBe(places.length);
      for (const { username } of places) expect(on).toContain(username);
    }
    const given = new Set(
      hospital.shifts.flatMap(({ unitKey, places }) =>
        places.map(({ bedLabel }) => placeOf({ unitKey, bedLabel })),
      ),
    );
    expect(present.filter((stay) => !given.has(placeOf(stay))).map(({ key }) => key)).toEqual(['harbour-15']);
  });
});
