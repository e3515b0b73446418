import { describe, expect, it } from 'vitest';
import type { Bed, BedCheck, BedGas, BedStay } from '../../contract/board.ts';
import { DEFAULT_POLICY } from '../../policy/policy.ts';
import { type TileView, tileView } from './tile-view.ts';

const NOW = Date.parse('2026-03-05T11:20:00Z');
const ago = (minutes: number) => new Date(NOW - minutes * 60_000).toISOString();
const stamp = (minutes: number) => ({
  observationId: 'o',
  observedAt: ago(minutes),
  recordedAt: ago(minutes),
  recordedByInitials: 'AO',
  changedSinceAt: null,
});

const aCheck = (minutes: number, given: Partial<BedCheck> = {}): BedCheck => ({
  ...stamp(minutes),
  mode: 'ac-vc',
  settings: { vtSetMl: 420, rateSetPerMin: 18, peepCmH2O: 10, fio2Percent: 45 },
  readings: { vtExhaledMl: 420, rateTotalPerMin: 18, peakCmH2O: 29, plateauCmH2O: 24 },
  limits: {},
  interface: null,
  passive: true,
  derived: {
    vtPerKgMl: 6.1,
    drivingPressureCmH2O: 14,
    staticComplianceMlCmH2O: 30,
    mechanicalPowerJMin: 14,
    minuteVolumeLMin: 7.6,
    roxIndex: null,
    rsbiPerMinL: null,
  },
  ...given,
});

const aGas = (minutes: number, given: Partial<BedGas> = {}): BedGas => ({
  ...stamp(minutes),
  site: 'arterial',
  values: { ph: 7.3, pco2MmHg: 44, po2MmHg: 78 },
  pfMmHg: 173.3,
  ventilatoryRatio: null,
  minuteVolumeAtDrawLMin: null,
  ...given,
});

const aStay = (given: Partial<BedStay> = {}): BedStay => ({
  stayId: 's',
  version: 1,
  admittedAt: ago(9000),
  predictedBodyWeightKg: 68.9,
  difficultAirway: false,
  precautions: null,
  careLimits: null,
  patient: {
    hospitalNumber: 'H1',
    familyName: 'Invented',
    givenName: 'Person',
    bornOn: '1961-03-04',
    sex: 'male',
    heightCm: 173,
  },
  orders: { checkEveryMinutes: null, gasEveryMinutes: null },
  support: { id: 'ac-vc', shortName: 'AC/VC', sinceAt: ago(3000) },
  proneSinceAt: null,
  away: null,
  trial: null,
  lastTrial: null,
  screen: null,
  check: aCheck(72),
  device: {
    observationId: 'o',
    placedAt: ago(4000),
    kind: 'oral-tube',
    sizeMm: 8,
    depthCm: 23,
    depthMark: 'lip',
    cuffed: true,
    subglotticPort: null,
  },
  airway: { ...stamp(220), depthCm: 23, cuffCmH2O: 26, cuffMethod: null, position: null, secured: true },
  gas: aGas(125),
  flags: [],
  ladder: DEFAULT_POLICY.freshness,
  plateauLimitCmH2O: 30,
  withdrawn: { check: null, airway: null, gas: null },
  ...given,
});

const aBed = (stay: BedStay | null, given: Partial<Bed> = {}): Bed => ({
  bedId: 'b',
  unitId: 'u',
  label: '03',
  row: 1,
  column: 3,
  isOpen: true,
  revision: 1,
  stay,
  assignments: [],
  ventilator: null,
  ...given,
});

const view = (stay: BedStay | null, given: Partial<Bed> = {}, now = NOW): TileView =>
  tileView({ bed: aBed(stay, given), reader: { now, timeZone: 'UTC' } });

function ofStay(given: Partial<BedStay> = {}) {
  const { content } = view(aStay(given));
  if (content.kind !== 'stay') throw new Error('the bed has a stay');
  return content;
}

const texts = (body: ReturnType<typeof ofStay>['gas']['body']) =>
  'rows' in body
    ? body.rows.flat().map(({ value, label }) => `${value} ${label}`)
    : [body.title, body.detail];

describe('the tile of a bed', () => {
  it('shows every group with its age', () => {
    const { mode, check, airway, gas } = ofStay();
    expect(mode).toBe('AC/VC');
    expect([check.age, airway.age, gas.age]).toEqual(['1h12', '3h40', '2h05']);
    expect(texts(airway.body)).toEqual(['8.0 mm oral', '23 cm lip', '26 cuff']);
    expect(texts(gas.body)).toEqual(['7.30 pH', '44 PCO2', '78 PO2', '173 P/F']);
  });

  it('is named for those who listen, with the state of its check', () => {
    expect(view(aStay({ check: aCheck(275) })).name).toBe('Bed 03, AC/VC, check overdue 4 hours 35 minutes');
    expect(view(null).name).toBe('Bed 03, empty');
    expect(view(null, { isOpen: false }).name).toBe('Bed 03, closed');
  });

  it('never holds who the patient is', () => {
    expect(JSON.stringify(view(aStay()))).not.toMatch(/Invented|Person|H1|1961/);
  });

  it('reads the same until a shown minute or a state changes', () => {
    const at = (ms: number) => JSON.stringify(view(aStay(), {}, NOW + ms));
    expect(at(59_000)).toBe(at(0));
    expect(at(60_000)).not.toBe(at(0));
  });
});

describe('a check that has lain too long', () => {
  it('keeps its values while overdue', () => {
    const { check, mode } = ofStay({ check: aCheck(275) });
    expect(check.state).toBe('overdue');
    expect(texts(check.body)).toContain('6.1 mL/kg');
    expect(mode).toBe('AC/VC');
  });

  it('takes values, ladder and mode away when withdrawn, and says the mode only with its time', () => {
    const { check, mode } = ofStay({ check: aCheck(480) });
    expect(mode).toBeNull();
    expect(check.ladder).toBeNull();
    expect(texts(check.body)).toEqual(['no current check', 'last check 03:20, AC/VC']);
    expect(check.age).toBe('8h00');
  });

  it('says the day where the time alone would mislead', () => {
    expect(texts(ofStay({ check: aCheck(2000) }).check.body)[1]).toBe('last check 04-Mar-2026, AC/VC');
  });

  it('does not say the mode of the last check where the support has changed since', () => {
    const support = { id: 'low-flow', shortName: 'Oxygen', sinceAt: ago(100) } as const;
    const { check, mode } = ofStay({
      check: null,
      support,
      withdrawn: { check: ago(600), airway: null, gas: null },
    });
    expect(texts(check.body)).toEqual(['no current check', 'last check 01:20']);
    expect(mode).toBe('Oxygen');
  });

  it('stops saying what a happening made of the support, once that is as old', () => {
    const support = { id: 'low-flow', shortName: 'Oxygen', sinceAt: ago(500) } as const;
    expect(
      ofStay({ check: null, support, withdrawn: { check: ago(600), airway: null, gas: null } }).mode,
    ).toBeNull();
  });
});

describe('facts of an earlier state', () => {
  it('does not show the settings of a support that the patient has left', () => {
    const support = { id: 'hfnc', shortName: 'HFNC', sinceAt: ago(30) } as const;
    const { check, mode, airway } = ofStay({ support, device: null, airway: null });
    expect(mode).toBe('HFNC');
    expect(texts(check.body)).toEqual(['no check on HFNC yet', 'AC/VC before change 10:50']);
    expect(check.ladder).toBeNull();
    expect(texts(airway.body)[0]).toBe('nasal cannula');
  });

  it('marks a gas that was drawn before a change of settings, and one that is not arterial', () => {
    expect(ofStay({ gas: aGas(125, { changedSinceAt: ago(20) }) }).gas.remarks).toEqual([
      'before change 11:00',
    ]);
    const venous = ofStay({ gas: aGas(125, { site: 'venous', pfMmHg: null }) }).gas;
    expect(venous.remarks).toEqual(['venous']);
    expect(texts(venous.body)).not.toContain('P/F');
  });
});

describe('what is not there', () => {
  it('says that nothing was recorded yet', () => {
    const { check, gas, mode } = ofStay({
      check: null,
      gas: null,
      support: null,
      device: null,
      airway: null,
    });
    expect(mode).toBeNull();
    expect([texts(check.body)[0], texts(gas.body)[0]]).toEqual(['no check yet', 'no gas yet']);
    expect(check.age).toBeNull();
  });

  it('keeps the size of the tube, which does not age, when depth and cuff are withdrawn', () => {
    const { airway } = ofStay({ airway: null, withdrawn: { check: null, airway: ago(1000), gas: null } });
    expect(texts(airway.body)).toEqual(['no current depth, cuff', '8.0 mm oral, last 18:40']);
  });

  it('names the mask, and says when nobody recorded which', () => {
    const support = { id: 'niv-st', shortName: 'Mask S/T', sinceAt: ago(900) } as const;
    const on = (mask: BedCheck['interface']) =>
      texts(
        ofStay({
          support,
          device: null,
          airway: null,
          check: aCheck(10, { mode: 'niv-st', interface: mask }),
        }).airway.body,
      )[0];
    expect([on('full-face'), on(null)]).toEqual(['full-face mask', 'mask not recorded']);
  });
});

describe('people, marks and flags', () => {
  const assignment = (from: number, to: number, initials: string) => ({
    shiftId: 's',
    startsAt: ago(from),
    endsAt: ago(to),
    personId: 'p',
    initials,
    displayName: 'A. O.',
    coverInitials: null,
  });

  it('shows who has the bed in the shift that runs now, and nobody as nobody', () => {
    const { content } = view(aStay(), {
      assignments: [assignment(900, 260, 'MK'), assignment(260, -460, 'AO')],
    });
    expect(content).toMatchObject({ initials: 'AO' });
    expect(ofStay().initials).toBeNull();
  });

  const BY_AO = { by: 'AO', at: ago(5), note: 'known to the team' };
  const flag = (id: string, level: 'note' | 'attention') => ({
    id,
    level,
    short: id,
    sentence: '',
    source: '',
    from: [],
    inputs: [],
    fingerprint: id,
    acknowledged: null,
  });

  it('puts attention before notes', () => {
    const { chips } = ofStay({ flags: [flag('a', 'note'), flag('b', 'attention'), flag('c', 'note')] });
    expect(chips.map(({ id }) => id)).toEqual(['b', 'a', 'c']);
  });

  it('counts what somebody has acknowledged, and shows it as no chip', () => {
    const { chips, seen } = ofStay({
      flags: [flag('a', 'attention'), { ...flag('b', 'attention'), acknowledged: BY_AO }, flag('c', 'note')],
    });
    expect(chips.map(({ id }) => id)).toEqual(['a', 'c']);
    expect(seen).toBe(1);
    expect(JSON.stringify(ofStay({ flags: [{ ...flag('b', 'note'), acknowledged: BY_AO }] }))).not.toContain(
      'known to the team',
    );
  });

  it('marks away, difficult airway and prone', () => {
    const { marks } = ofStay({
      away: { sinceAt: ago(40), to: 'scan' },
      difficultAirway: true,
      proneSinceAt: ago(300),
    });
    expect(marks.map(({ lines }) => lines.join(' '))).toEqual(['away 10:40', 'difficult airway', 'prone']);
  });
});
