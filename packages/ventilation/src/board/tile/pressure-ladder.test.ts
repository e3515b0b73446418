import { describe, expect, it } from 'vitest';
import type { BedCheck } from '../../contract/board.ts';
import { pressureLadder } from './pressure-ladder.ts';

type Given = Partial<Pick<BedCheck, 'settings' | 'readings' | 'passive'>>;
const ladder = (mode: BedCheck['mode'], { settings = {}, readings = {}, passive = null }: Given) =>
  pressureLadder({ check: { mode, settings, readings, passive }, plateauLimitCmH2O: 30 });

describe('pressureLadder', () => {
  it('runs from PEEP to the plateau that was read', () => {
    const drawn = ladder('ac-vc', {
      settings: { peepCmH2O: 10 },
      readings: { peakCmH2O: 29, plateauCmH2O: 24 },
      passive: true,
    });
    expect(drawn).toEqual({
      low: 10,
      high: 24,
      measured: true,
      peak: 29,
      limit: 30,
      words: 'lowest pressure 10, plateau 24, peak 29, plateau limit 30 cmH2O',
    });
  });

  it.each([
    [false, 'plateau 24, not passive'],
    [null, 'plateau 24, passive? not recorded'],
  ] as const)('draws no plateau where passive is %s, and only says what was entered', (passive, words) => {
    const given = { readings: { plateauCmH2O: 24 }, passive };
    const volume = ladder('ac-vc', { settings: { peepCmH2O: 10 }, ...given });
    expect(volume).toMatchObject({ high: null, measured: false });
    expect(volume?.words).toContain(words);
    const pressure = ladder('ac-pc', { settings: { peepCmH2O: 10, pInspCmH2O: 16 }, ...given });
    expect(pressure).toMatchObject({ high: 26, measured: false });
    expect(pressure?.words).toContain(`set pressure 26, ${words}`);
  });

  it.each([
    ['ac-pc', { peepCmH2O: 8, pInspCmH2O: 17 }, 8, 25],
    ['psv', { peepCmH2O: 5, psCmH2O: 8 }, 5, 13],
    ['aprv', { pHighCmH2O: 26, pLowCmH2O: 0 }, 0, 26],
    ['niv-st', { ipapCmH2O: 16, epapCmH2O: 6 }, 6, 16],
  ] as const)('shows in %s the pressure that is set, as not measured', (mode, settings, low, high) => {
    expect(ladder(mode, { settings })).toMatchObject({ low, high, measured: false });
  });

  it('knows no upper pressure where a volume is set and no plateau was read', () => {
    expect(ladder('ac-vc', { settings: { peepCmH2O: 5, psCmH2O: 10 } })?.high).toBeNull();
    expect(ladder('simv-vc', { settings: { peepCmH2O: 5, psCmH2O: 10 } })?.high).toBeNull();
  });

  it('has no plateau limit for a mask', () => {
    expect(ladder('niv-cpap', { settings: { cpapCmH2O: 10 } })).toMatchObject({
      low: 10,
      high: null,
      limit: null,
    });
  });

  it.each(['hfov', 'hfnc', 'tpiece', 'low-flow', 'room-air'] as const)('is not drawn for %s', (mode) => {
    expect(ladder(mode, { settings: { fio2Percent: 40 } })).toBeNull();
  });
});
