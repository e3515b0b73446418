import { describe, expect, it } from 'vitest';
import type { CheckDerived } from '../contract/board.ts';
import { SUPPORT_CATALOGUE, SUPPORT_IDS, type SupportId } from '../support/catalogue.ts';
import { type CheckToShow, tileCells } from './tile-cells.ts';

const NOTHING: CheckDerived = {
  vtPerKgMl: null,
  drivingPressureCmH2O: null,
  staticComplianceMlCmH2O: null,
  mechanicalPowerJMin: null,
  minuteVolumeLMin: null,
  roxIndex: null,
  rsbiPerMinL: null,
};

type Given = {
  settings?: CheckToShow['settings'];
  readings?: CheckToShow['readings'];
  derived?: Partial<CheckDerived>;
};

function shown(mode: SupportId, { settings = {}, readings = {}, derived = {} }: Given): string {
  const rows = tileCells({ mode, settings, readings, passive: null, derived: { ...NOTHING, ...derived } });
  return rows.map((row) => row.map(({ value, label }) => `${value} ${label}`).join(' · ')).join(' | ');
}

const VENT = { rateSetPerMin: 16, peepCmH2O: 8, fio2Percent: 50 };
const BREATH = { vtExhaledMl: 450, rateTotalPerMin: 20 };

const EXAMPLES: Record<SupportId, [given: Given, tile: string]> = {
  'ac-vc': [
    { settings: { ...VENT, vtSetMl: 440 }, readings: BREATH, derived: { vtPerKgMl: 6.14 } },
    '6.1 mL/kg · 16/20 set/rate | 8 PEEP · 50 % O2',
  ],
  'ac-pc': [
    { settings: { ...VENT, pInspCmH2O: 17 }, readings: BREATH, derived: { vtPerKgMl: 8.6 } },
    '8.6 mL/kg · 16/20 set/rate | +17 P insp · 8 PEEP · 50 % O2',
  ],
  'ac-vtpc': [
    { settings: { ...VENT, vtSetMl: 440 }, readings: BREATH, derived: { vtPerKgMl: 7 } },
    '7 mL/kg · 16/20 set/rate | 8 PEEP · 50 % O2',
  ],
  'simv-vc': [
    { settings: { ...VENT, vtSetMl: 440, psCmH2O: 10 }, readings: BREATH, derived: { vtPerKgMl: 6.6 } },
    '6.6 mL/kg · 16/20 set/rate | +10 PS · 8 PEEP · 50 % O2',
  ],
  'simv-pc': [
    { settings: { ...VENT, pInspCmH2O: 14, psCmH2O: 10 }, readings: BREATH, derived: { vtPerKgMl: 6.6 } },
    '6.6 mL/kg · 16/20 set/rate | +14 P insp · 8 PEEP · 50 % O2',
  ],
  psv: [
    {
      settings: { psCmH2O: 8, peepCmH2O: 5, fio2Percent: 35 },
      readings: BREATH,
      derived: { vtPerKgMl: 7.4 },
    },
    '7.4 mL/kg · 20 rate | +8 PS · 5 PEEP · 35 % O2',
  ],
  cpap: [
    { settings: { peepCmH2O: 8, fio2Percent: 40 }, readings: BREATH, derived: { vtPerKgMl: 5.5 } },
    '5.5 mL/kg · 20 rate | 8 PEEP · 40 % O2',
  ],
  aprv: [
    {
      settings: { pHighCmH2O: 26, pLowCmH2O: 0, tHighS: 5.5, tLowS: 0.45, fio2Percent: 55 },
      readings: { vtReleaseMl: 480, rateTotalPerMin: 14 },
      derived: { vtPerKgMl: 6.6 },
    },
    '6.6 mL/kg release · 14 rate | 26/0 P hi/lo · 55 % O2',
  ],
  hfov: [
    { settings: { meanPressureCmH2O: 28, amplitudeCmH2O: 70, frequencyHz: 6, fio2Percent: 80 } },
    '28 mean P · 70 ampl. | 6 Hz · 80 % O2',
  ],
  'niv-st': [
    {
      settings: { ipapCmH2O: 16, epapCmH2O: 6, rateSetPerMin: 12, fio2Percent: 40 },
      readings: { rateTotalPerMin: 24, leakLMin: 18 },
    },
    '16/6 IPAP/EPAP · 12/24 set/rate | 18 leak L/min · 40 % O2',
  ],
  'niv-cpap': [
    { settings: { cpapCmH2O: 10, fio2Percent: 45 }, readings: { rateTotalPerMin: 21, leakLMin: 9 } },
    '10 CPAP · 21 rate | 9 leak L/min · 45 % O2',
  ],
  hfnc: [
    {
      settings: { flowLMin: 50, fio2Percent: 60 },
      readings: { rateTotalPerMin: 24, spo2Percent: 94 },
      derived: { roxIndex: 6.527 },
    },
    '50 L/min · 24 rate | 60 % O2 · 6.5 ROX',
  ],
  tpiece: [
    { settings: { fio2Percent: 40 }, readings: { rateTotalPerMin: 22, spo2Percent: 96 } },
    '22 rate · 96 % SpO2 | 40 % O2',
  ],
  'trach-collar': [
    { settings: { fio2Percent: 35, flowLMin: 8 }, readings: { rateTotalPerMin: 18, spo2Percent: 95 } },
    '18 rate · 95 % SpO2 | 35 % O2 · 8 L/min',
  ],
  'low-flow': [
    { settings: { flowLMin: 2.5 }, readings: { rateTotalPerMin: 18, spo2Percent: 95 } },
    '2.5 L/min · 18 rate | 95 % SpO2',
  ],
  'room-air': [{ readings: { rateTotalPerMin: 16, spo2Percent: 97 } }, '16 rate · 97 % SpO2 | '],
};

describe('tileCells', () => {
  it.each(SUPPORT_IDS.map((id) => [id, ...EXAMPLES[id]] as const))('shows %s', (id, given, tile) => {
    expect(shown(id, given)).toBe(tile);
  });

  it('shows the volume and the reason when sex or height is not known', () => {
    expect(shown('ac-vc', { settings: { ...VENT, vtSetMl: 2000 }, readings: { rateTotalPerMin: 16 } })).toBe(
      '2000 mL, no height · 16/16 set/rate | 8 PEEP · 50 % O2',
    );
  });

  it('shows a value that the mode wants and nobody recorded as missing, never as zero', () => {
    expect(shown('ac-pc', { settings: { ...VENT, pInspCmH2O: 17 } })).toBe(
      '– mL/kg · 16/– set/rate | +17 P insp · 8 PEEP · 50 % O2',
    );
  });

  it('shows a measured zero as a value', () => {
    expect(
      shown('psv', {
        settings: { psCmH2O: 0, peepCmH2O: 0, fio2Percent: 21 },
        readings: { rateTotalPerMin: 0 },
      }),
    ).toBe('– mL/kg · 0 rate | +0 PS · 0 PEEP · 21 % O2');
  });

  it('says every cell in words, with a unit or as not recorded', () => {
    for (const { id, required } of SUPPORT_CATALOGUE) {
      const settings = Object.fromEntries(required.map((key) => [key, 30]));
      for (const cell of tileCells({
        mode: id,
        settings,
        readings: {},
        passive: null,
        derived: NOTHING,
      }).flat()) {
        expect(cell.words).toMatch(/not recorded|cmH2O|%|mL|Hz|L\/min|per minute/);
      }
    }
  });

  it('uses a key once in a tile', () => {
    for (const id of SUPPORT_IDS) {
      const [given] = EXAMPLES[id];
      const cells = tileCells({
        mode: id,
        settings: given.settings ?? {},
        readings: given.readings ?? {},
        passive: null,
        derived: { ...NOTHING, ...given.derived },
      }).flat();
      expect(new Set(cells.map(({ key }) => key)).size).toBe(cells.length);
    }
  });
});
