import { describe, expect, it } from 'vitest';
import { entryBody, keyOfPath } from './entry-body.ts';
import { type EntryDraft, isUntouched, reduceEntry } from './entry-draft.ts';
import { type Before, NOTHING_BEFORE, type NumberRow } from './entry-field.ts';
import { judgeEntry, obstaclesOf } from './judge-entry.ts';
import { airwayCheckPlan } from './plans/airway-check-plan.ts';
import { checkPlan } from './plans/check-plan.ts';
import { gasPlan } from './plans/gas-plan.ts';
import { happeningPlan } from './plans/happening-plan.ts';
import { standingMode } from './plans/standing-mode.ts';
import { repeatableRows } from './repeatable-rows.ts';
import { leavesBoardInWords, progressInWords, reviewOf } from './review.ts';

const LAST: Record<string, Before> = {
  mode: { state: 'shown', value: 'ac-vc', ageMinutes: 275 },
  vtSetMl: { state: 'shown', value: 430, ageMinutes: 275 },
  rateSetPerMin: { state: 'shown', value: 18, ageMinutes: 275 },
  peepCmH2O: { state: 'shown', value: 8, ageMinutes: 275 },
  fio2Percent: { state: 'shown', value: 50, ageMinutes: 275 },
};
const earlier = (key: string) => LAST[key] ?? NOTHING_BEFORE;
const observedAt = Date.parse('2026-03-05T11:20:00Z');

function draftOf(values: Record<string, string>, kept: Record<string, string> = {}): EntryDraft {
  return {
    values,
    kept,
    left: [],
    active: null,
    typing: null,
    time: null,
    mayStand: false,
    startedFrom: null,
  };
}

const VALID = { mode: 'ac-vc', vtSetMl: '430', rateSetPerMin: '18', peepCmH2O: '10', fio2Percent: '0.45' };

function judgedCheck(
  values: Record<string, string>,
  { kept = {}, weightKg = 73.2 }: { kept?: Record<string, string>; weightKg?: number | null } = {},
) {
  const plan = checkPlan({ mode: values.mode ?? '', earlier });
  return { plan, judged: judgeEntry({ plan, draft: draftOf(values, kept), weightKg }) };
}

function rowOf(key: string): NumberRow {
  const row = checkPlan({ mode: 'ac-vc', earlier })
    .sections.flatMap(({ rows }) => rows)
    .find((one) => one.key === key);
  if (row?.kind !== 'number') throw new Error(`${key} is no number`);
  return row;
}

describe('a check', () => {
  it('asks for what the mode takes, and for nothing else', () => {
    const keys = (mode: string) =>
      checkPlan({ mode, earlier }).sections.flatMap(({ rows }) => rows.map(({ key }) => key));
    expect(keys('hfnc')).toEqual([
      'mode',
      'flowLMin',
      'fio2Percent',
      'rateTotalPerMin',
      'spo2Percent',
      'note',
    ]);
    expect(keys('niv-st')).toContain('interface');
    expect(keys('ac-vc')).toContain('passive');
    expect(keys('psv')).not.toContain('passive');
  });

  it('becomes the body of the contract, with oxygen as a percentage', () => {
    const { plan, judged } = judgedCheck({
      ...VALID,
      plateauCmH2O: '24',
      highPressureCmH2O: 'off',
      passive: 'yes',
      note: ' calm ',
    });
    expect(entryBody({ plan, judged, observedAt })).toEqual({
      state: 'ready',
      body: {
        observedAt: '2026-03-05T11:20:00.000Z',
        mode: 'ac-vc',
        settings: { vtSetMl: 430, rateSetPerMin: 18, peepCmH2O: 10, fio2Percent: 45 },
        readings: { plateauCmH2O: 24 },
        limits: { highPressureCmH2O: 'off' },
        passive: true,
        note: 'calm',
      },
    });
  });

  it('names what is needed and still empty', () => {
    const { judged } = judgedCheck({ mode: 'ac-vc', vtSetMl: '430' });
    expect(obstaclesOf(judged).map(({ message }) => message)).toEqual([
      'Rate set is needed',
      'PEEP is needed',
      'Oxygen (FiO2) is needed',
    ]);
  });

  it('refuses a plateau above the peak at the plateau', () => {
    const { judged } = judgedCheck({ ...VALID, peakCmH2O: '22', plateauCmH2O: '25' });
    expect(obstaclesOf(judged)).toEqual([
      {
        key: 'plateauCmH2O',
        label: 'Plateau',
        message: 'Plateau must be at most the peak pressure, 22 cmH2O, not 25',
      },
    ]);
  });

  it('asks once about an unusual value, and keeps the answer for that value only', () => {
    const unusual = { ...VALID, peepCmH2O: '22' };
    expect(obstaclesOf(judgedCheck(unusual).judged)[0]?.message).toBe(
      'PEEP 22\u00a0cmH2O is unusual. Keep or change it',
    );
    const { plan, judged } = judgedCheck(unusual, { kept: { peepCmH2O: '22' } });
    expect(obstaclesOf(judged)).toEqual([]);
    expect(entryBody({ plan, judged, observedAt })).toMatchObject({
      body: { confirmedUnusual: ['peepCmH2O'] },
    });
    expect(
      obstaclesOf(judgedCheck({ ...VALID, peepCmH2O: '24' }, { kept: { peepCmH2O: '22' } }).judged),
    ).toHaveLength(1);
  });

  it('judges a tidal volume per kg, and not at all without a weight', () => {
    expect(obstaclesOf(judgedCheck({ ...VALID, vtSetMl: '780' }).judged)[0]?.message).toContain('10.7 mL/kg');
    expect(obstaclesOf(judgedCheck({ ...VALID, vtSetMl: '780' }, { weightKg: null }).judged)).toEqual([]);
  });

  it('drops the rows of another mode from the body', () => {
    const { plan, judged } = judgedCheck({ ...VALID, mode: 'psv', psCmH2O: '8' });
    expect(entryBody({ plan, judged, observedAt })).toMatchObject({
      body: { settings: { psCmH2O: 8, peepCmH2O: 10, fio2Percent: 45 } },
    });
    expect(judged.values).not.toHaveProperty('vtSetMl');
  });
});

describe('the review', () => {
  it('tells changed, confirmed and new values apart, and what is left out', () => {
    const { plan, judged } = judgedCheck({ ...VALID, spo2Percent: '95' });
    const review = reviewOf({ plan, judged, ageMinutes: 0 });
    expect(review.changed).toEqual([
      { key: 'peepCmH2O', label: 'PEEP', before: '8\u00a0cmH2O', now: '10\u00a0cmH2O', isUnusual: false },
      { key: 'fio2Percent', label: 'Oxygen (FiO2)', before: '50\u00a0%', now: '45\u00a0%', isUnusual: false },
    ]);
    expect(review.confirmed.map(({ key }) => key)).toEqual(['mode', 'vtSetMl', 'rateSetPerMin']);
    expect(review.added.map(({ now }) => now)).toEqual(['95\u00a0%']);
    expect(review.leftOut).toContain('Plateau');
    expect(review.leftOut).not.toContain('Note');
    expect(progressInWords(judged)).toMatch(/^2 changed · 3 as before · 1 new · \d+ left$/);
  });
});

describe('what leaves the board', () => {
  const read: Record<string, Before> = {
    ...LAST,
    peakCmH2O: { state: 'shown', value: 30, ageMinutes: 275 },
    spo2Percent: { state: 'shown', value: 95, ageMinutes: 275 },
    intrinsicPeepCmH2O: { state: 'withdrawn', observedAt: '2026-03-05T02:10:00Z' },
  };
  const leaving = ({
    standing = 'ac-vc',
    ageMinutes = 0,
  }: {
    standing?: string | null;
    ageMinutes?: number;
  } = {}) => {
    const plan = checkPlan({ mode: 'ac-vc', earlier: (key) => read[key] ?? NOTHING_BEFORE, standing });
    const judged = judgeEntry({ plan, draft: draftOf({ ...VALID, spo2Percent: '96' }), weightKg: null });
    return reviewOf({ plan, judged, ageMinutes }).leavesBoard;
  };

  it('is each reading that the last check had and this one leaves out', () => {
    expect(leaving()).toEqual(['Peak pressure']);
  });

  it('is nothing where the last check no longer holds, or is newer than this one', () => {
    expect(leaving({ standing: null })).toEqual([]);
    expect(leaving({ ageMinutes: 300 })).toEqual([]);
  });

  it('is said in one sentence', () => {
    expect(leavesBoardInWords(['Plateau'])).toBe('Plateau is no longer shown on the board after this check.');
    expect(leavesBoardInWords(['Plateau', 'Leak'])).toMatch(/^Plateau, Leak are no longer/);
  });
});

describe('all settings as before', () => {
  const settingsOf = ({
    mode = 'ac-vc',
    standing = 'ac-vc',
  }: {
    mode?: string;
    standing?: string | null;
  } = {}) =>
    checkPlan({ mode, earlier, standing }).sections.find(({ title }) => title === 'Settings') ?? {
      title: '',
      rows: [],
    };
  const keys = (values: Record<string, string>, where = {}) =>
    repeatableRows(settingsOf(where), { values }).map(({ key }) => key);

  it('are those that were recorded and are not given yet', () => {
    expect(keys({})).toEqual(['vtSetMl', 'rateSetPerMin', 'peepCmH2O', 'fio2Percent']);
    expect(keys({ fio2Percent: '55' })).toEqual(['vtSetMl', 'rateSetPerMin', 'peepCmH2O']);
  });

  it('are none in another mode, and none where the last check does not hold', () => {
    expect(keys({}, { mode: 'psv' })).toEqual([]);
    expect(keys({}, { standing: null })).toEqual([]);
  });

  it('are each confirmed, and each can be changed after that', () => {
    const rows = repeatableRows(settingsOf(), { values: {} });
    const repeated = reduceEntry(draftOf({ mode: 'ac-vc' }), { type: 'repeat-all', rows });
    const { judged } = judgedCheck({ ...repeated.values });
    expect(obstaclesOf(judged)).toEqual([]);
    expect(progressInWords(judged)).toMatch(/^5 as before · \d+ left$/);
    const [row] = rows;
    if (!row) throw new Error('no row');
    expect(reduceEntry(repeated, { type: 'press', row, key: 'plus' }).values[row.key]).toBe('440');
  });

  it('hold only for a check of the mode that the patient is on, with no change since', () => {
    const check = { mode: 'ac-vc', changedSinceAt: null } as const;
    expect(standingMode({ check, mode: 'ac-vc' })).toBe('ac-vc');
    expect(standingMode({ check, mode: 'psv' })).toBeNull();
    expect(standingMode({ check: null, mode: 'ac-vc' })).toBeNull();
    expect(
      standingMode({ check: { ...check, changedSinceAt: '2026-03-05T11:00:00Z' }, mode: 'ac-vc' }),
    ).toBeNull();
  });
});

describe('a draft', () => {
  it('that was sent and stopped says so until it is recorded, though nothing in it differs', () => {
    const initial = draftOf({ mode: 'ac-vc' });
    const stopped = reduceEntry(initial, { type: 'stopped' });
    expect(stopped.mayStand).toBe(true);
    expect(isUntouched(stopped, initial)).toBe(false);
  });

  it('takes a value over only when asked to', () => {
    const row = rowOf('peepCmH2O');
    const empty = draftOf({});
    expect(empty.values.peepCmH2O).toBeUndefined();
    expect(reduceEntry(empty, { type: 'repeat', row }).values.peepCmH2O).toBe('8');
    expect(reduceEntry(empty, { type: 'press', row, key: 'plus' }).values.peepCmH2O).toBe('9');
  });

  it('begins a new number with the first digit in a field that is come back to', () => {
    const row = rowOf('peepCmH2O');
    const typed = [
      { type: 'focus', key: 'peepCmH2O' },
      { type: 'press', row, key: '1' },
      { type: 'press', row, key: '2' },
      { type: 'focus', key: 'rateSetPerMin' },
      { type: 'focus', key: 'peepCmH2O' },
    ] as const;
    const back = typed.reduce(reduceEntry, draftOf({}));
    expect(back.values.peepCmH2O).toBe('12');
    expect(reduceEntry(back, { type: 'press', row, key: '8' }).values.peepCmH2O).toBe('8');
    expect(reduceEntry(back, { type: 'press', row, key: 'plus' }).values.peepCmH2O).toBe('13');
    expect(reduceEntry(back, { type: 'press', row, key: 'erase' }).values.peepCmH2O).toBe('1');
  });

  it('offers nothing to take over once the value is withdrawn', () => {
    const withdrawn = checkPlan({
      mode: 'cpap',
      earlier: () => ({ state: 'withdrawn', observedAt: '2026-03-05T02:10:00Z' }),
    });
    const repeats = withdrawn.sections
      .flatMap(({ rows }) => rows)
      .filter((row) => row.kind === 'number')
      .map((row) => row.repeat);
    expect(new Set(repeats)).toEqual(new Set([null]));
  });

  it('marks the row that the keypad leaves', () => {
    const first = reduceEntry(draftOf({}), { type: 'focus', key: 'peepCmH2O' });
    expect(reduceEntry(first, { type: 'focus', key: 'fio2Percent' }).left).toEqual(['peepCmH2O']);
  });

  it('is untouched until a text or the time differs', () => {
    const initial = draftOf({ mode: 'ac-vc' });
    expect(isUntouched({ ...initial, left: ['mode'] }, initial)).toBe(true);
    expect(isUntouched(draftOf({ mode: 'psv' }), initial)).toBe(false);
    expect(isUntouched({ ...initial, time: { day: '2026-03-05', digits: '0900' } }, initial)).toBe(false);
  });
});

describe('the other plans', () => {
  it('never offers an old gas as a new one, but offers the oxygen as set', () => {
    const plan = gasPlan({ earlier: () => ({ state: 'shown', value: 60, ageMinutes: 10 }), asSet: earlier });
    const repeats = plan.sections
      .flatMap(({ rows }) => rows)
      .flatMap((row) => (row.kind === 'number' && row.repeat ? [[row.key, row.repeat.label]] : []));
    expect(repeats).toEqual([
      ['fio2Percent', 'as set'],
      ['peepCmH2O', 'as set'],
    ]);
  });

  it('wants the support that follows an extubation, and the reason of a failed trial', () => {
    const needed = (kind: string) =>
      happeningPlan({ kind, earlier: () => NOTHING_BEFORE })
        .sections.flatMap(({ rows }) => rows)
        .filter((row) => row.needed)
        .map(({ key }) => key);
    expect(needed('extubated-planned')).toEqual(['kind', 'toSupport']);
    expect(needed('trial-failed')).toEqual(['kind', 'detail']);
    expect(needed('trial-started')).toEqual(['kind', 'method', 'plannedMinutes']);
    expect(needed('trial-passed')).toEqual(['kind', 'minutes']);
    expect(needed('proned')).toEqual(['kind']);
  });

  it('holds the body against the contract before it is sent', () => {
    const plan = airwayCheckPlan({ earlier: () => NOTHING_BEFORE, cuffed: true, mark: 'lip' });
    const judged = judgeEntry({ plan, draft: draftOf({}), weightKg: null });
    expect(entryBody({ plan, judged, observedAt })).toMatchObject({
      state: 'refused',
      errors: [{ message: expect.stringContaining('at least one') }],
    });
  });

  it('finds the row that a path of the server means', () => {
    expect(['settings.peepCmH2O', '/settings/peepCmH2O', 'ph'].map(keyOfPath)).toEqual([
      'peepCmH2O',
      'peepCmH2O',
      'ph',
    ]);
  });
});
