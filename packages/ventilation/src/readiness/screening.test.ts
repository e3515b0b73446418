import { describe, expect, it } from 'vitest';
import type { BedStay } from '../contract/board.ts';
import { AT, check, EMPTY, gas, PSV } from '../flags/example-stays.ts';
import { SCREEN_ANSWER_KEYS } from './screen-answers.ts';
import { type ScreenedStay, screening } from './screening.ts';

const EVERY_ANSWER = Object.fromEntries(SCREEN_ANSWER_KEYS.map((key) => [key, true]));
const screen = (answers: Record<string, boolean> = EVERY_ANSWER): NonNullable<BedStay['screen']> => ({
  observationId: 's1',
  observedAt: AT,
  recordedByInitials: 'AO',
  answers,
  holdsUntil: '2026-03-06T10:00:00Z',
});

const READINGS = { vtExhaledMl: 600, rateTotalPerMin: 20, spo2Percent: 95 };
const onSupport = (parts: Parameters<typeof check>[0] = {}): Omit<BedStay, 'flags'> => ({
  ...check({ mode: 'psv', settings: PSV, readings: READINGS, ...parts }),
  screen: screen(),
});

const screened = (stay: ScreenedStay) => {
  const result = screening({ stay, phLow: 7.25 });
  if (!result) throw new Error('not screened');
  return result;
};
const item = (stay: ScreenedStay, id: string) => screened(stay).items.find((one) => one.id === id);
const stateOf = (stay: ScreenedStay, id: string) => item(stay, id)?.state;

describe('screening', () => {
  it('is ready when every item is met, and says from which fact', () => {
    const { isReady, items } = screened(onSupport());
    expect(items.map(({ id, state }) => [id, state]).filter(([, state]) => state !== 'met')).toEqual([]);
    expect(isReady).toBe(true);
    expect(item(onSupport(), 'peep')).toMatchObject({
      found: '5\u00a0cmH2O',
      source: { group: 'check', observedAt: AT },
    });
    expect(item(onSupport(), 'cough')).toMatchObject({ found: 'yes', source: { group: 'screen' } });
  });

  it('asks nobody without a tube', () => {
    expect(screening({ stay: EMPTY, phLow: 7.25 })).toBeNull();
    expect(screening({ stay: check({ mode: 'hfnc' }), phLow: 7.25 })).toBeNull();
  });

  it('knows nothing of what only a person can see until somebody screened', () => {
    const stay = { ...onSupport(), screen: null };
    expect(screened(stay).isReady).toBe(false);
    expect(item(stay, 'cough')).toMatchObject({ state: 'not-known', why: 'not screened' });
    expect(item({ ...stay, screen: screen({ coughAdequate: false }) }, 'cough')?.state).toBe('not-met');
    expect(item({ ...stay, screen: screen({ coughAdequate: true }) }, 'mentation')?.why).toBe(
      'not answered in the screen',
    );
  });

  it('knows nothing from a check that is withdrawn or from before a change', () => {
    const before = onSupport({ changedSinceAt: AT });
    expect(item(before, 'peep')).toMatchObject({
      state: 'not-known',
      why: 'the check is from before a change',
    });
    const gone = { ...onSupport(), check: null, withdrawn: { check: AT, airway: null, gas: null } };
    expect(item(gone, 'rate')).toMatchObject({ state: 'not-known', why: 'no current check' });
    expect(screened(gone).isReady).toBe(false);
  });

  it.each([
    ['peep', { settings: { ...PSV, peepCmH2O: 8 } }, { settings: { ...PSV, peepCmH2O: 9 } }],
    [
      'rate',
      { readings: { ...READINGS, rateTotalPerMin: 35 } },
      { readings: { ...READINGS, rateTotalPerMin: 36 } },
    ],
    [
      'volume',
      { readings: { ...READINGS, vtExhaledMl: 501 } },
      { readings: { ...READINGS, vtExhaledMl: 500 } },
    ],
    [
      'rate-over-vt',
      { readings: { ...READINGS, rateTotalPerMin: 21, vtExhaledMl: 200 } },
      { readings: { ...READINGS, rateTotalPerMin: 22, vtExhaledMl: 200 } },
    ],
  ])('judges %s on both sides of its edge', (id, met, notMet) => {
    expect([stateOf(onSupport(met), id), stateOf(onSupport(notMet), id)]).toEqual(['met', 'not-met']);
  });

  it('takes a missing reading for not known, and not for met', () => {
    expect(item(onSupport({ readings: { vtExhaledMl: 600 } }), 'rate')).toMatchObject({
      state: 'not-known',
      why: 'the total rate not in the check',
    });
  });

  it('does not wait for own breaths where the ventilator gives them', () => {
    const stay = onSupport({
      mode: 'ac-vc',
      settings: { vtSetMl: 450, rateSetPerMin: 16, peepCmH2O: 5, fio2Percent: 35 },
    });
    expect(item(stay, 'rate-over-vt')).toMatchObject({ state: 'not-known', isNeeded: false });
    expect(screened(stay).isReady).toBe(true);
  });

  it.each([
    ['SpO2 alone', 95, 40, null, 'met'],
    ['too much oxygen, no P/F', 95, 41, null, 'not-known'],
    ['too much oxygen, P/F 150', 95, 41, 150, 'met'],
    ['too much oxygen, P/F 149', 95, 41, 149, 'not-met'],
    ['an SpO2 of 90', 90, 30, 149, 'not-met'],
    ['no SpO2, P/F below', null, 30, 149, 'not-known'],
  ])('judges oxygenation from %s', (_, spo2Percent, fio2Percent, pf, state) => {
    const stay = onSupport({
      settings: { ...PSV, fio2Percent },
      readings: { vtExhaledMl: 600, rateTotalPerMin: 20, ...(spo2Percent === null ? {} : { spo2Percent }) },
    });
    const drawn = pf === null ? null : gas({ ph: 7.4, po2MmHg: pf, fio2Percent: 100 }).gas;
    expect(stateOf({ ...stay, gas: drawn }, 'oxygenation')).toBe(state);
  });

  it('lets a "no" at the bedside stand against an older gas, and otherwise takes the later of the two', () => {
    const withGas = (ph: number, gasAt: string, answer: boolean) => ({
      ...onSupport(),
      gas: { ...gas({ ph }).gas, observedAt: gasAt } as BedStay['gas'],
      screen: screen({ ...EVERY_ANSWER, noAcidosis: answer }),
    });
    const [before, after] = ['2026-03-05T01:00:00Z', '2026-03-05T12:00:00Z'];
    expect(stateOf(withGas(7.36, before, false), 'acidosis')).toBe('not-met');
    expect(stateOf(withGas(7.1, before, true), 'acidosis')).toBe('met');
    expect(stateOf(withGas(7.1, after, true), 'acidosis')).toBe('not-met');
  });

  it('takes acidosis from the gas, and from whoever screened only where no gas counts', () => {
    const acid = { ...onSupport(), gas: gas({ ph: 7.24 }).gas };
    expect(item(acid, 'acidosis')).toMatchObject({
      state: 'not-met',
      found: 'pH 7.24',
      source: { group: 'gas' },
    });
    const old = { ...onSupport(), gas: gas({ ph: 7.24 }, { changedSinceAt: AT }).gas };
    expect(item(old, 'acidosis')).toMatchObject({ state: 'met', source: { group: 'screen' } });
    const neither = { ...old, screen: null };
    expect(item(neither, 'acidosis')?.why).toBe('the gas is from before a change; not screened');
  });
});
