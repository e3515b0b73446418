import { describe, expect, it } from 'vitest';
import { entryBody, keyOfPath } from './entry-body.ts';
import { type EntryDraft, isUntouched, reduceEntry } from './entry-draft.ts';
import { type Before, NOTHING_BEFORE, type NumberRow } from './entry-field.ts';
import { judgeEntry, obstaclesOf } from './judge-entry.ts';
import { airwayCheckPlan } from './plans/airway-check-plan.ts';
import { checkPlan } from './plans/check-plan.ts';
import { gasPlan } from './plans/gas-plan.ts';
import { happeningPlan } from './plans/happening-plan.ts';
import { progressInWords, reviewOf } from './review.ts';

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
  return { values, kept, left: [], active: null, typing: null, time: null, startedFrom: null };
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
    const { judged } = judgedCheck({ ...VALID, spo2Percent: '95' });
    const review = reviewOf(judged);
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

describe('a draft', () => {
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
