import { describe, expect, it } from 'vitest';
import { berlinClass } from './berlin-class.ts';
import { globalArdsClass } from './global-ards-class.ts';
import { pfRatio } from './pf-ratio.ts';

const EDGES = [100, 100.1, 200, 200.1, 300, 300.1];
const CLASSES = ['severe', 'moderate', 'moderate', 'mild', 'mild', 'none'];

describe('berlinClass', () => {
  it('belongs to the worse class on each edge', () => {
    expect(EDGES.map((pfMmHg) => berlinClass({ pfMmHg, peepCmH2O: 5 }))).toEqual(CLASSES);
  });

  it('does not grade below a PEEP of 5', () => {
    expect(EDGES.map((pfMmHg) => berlinClass({ pfMmHg, peepCmH2O: 4.9 }))).toEqual(EDGES.map(() => null));
  });

  it('corrects for thin air', () => {
    expect(berlinClass({ pfMmHg: 220, peepCmH2O: 8 })).toBe('mild');
    expect(berlinClass({ pfMmHg: 220, peepCmH2O: 8, barometricMmHg: 640 })).toBe('moderate');
  });

  it('is not moved across an edge by a quotient that misses it', () => {
    const fractions = Array.from({ length: 80 }, (_, at) => (at + 21) / 100);
    for (const [edge, word] of [
      [100, 'severe'],
      [200, 'moderate'],
      [300, 'mild'],
    ] as const) {
      for (const fio2 of fractions) {
        const pfMmHg = pfRatio({ pao2MmHg: Math.max(10, (edge * Math.round(fio2 * 100)) / 100), fio2 });
        expect(berlinClass({ pfMmHg, peepCmH2O: 5 }), `${edge} at ${fio2}`).toBe(word);
      }
    }
    expect(pfRatio({ pao2MmHg: 114, fio2: 0.57 })).toBeGreaterThan(200);
  });
});

describe('globalArdsClass', () => {
  const intubated = { support: 'invasive', peepCmH2O: 5 } as const;

  it('grades the intubated by P/F, and by S/F without a gas', () => {
    expect(EDGES.map((pfMmHg) => globalArdsClass({ ...intubated, pfMmHg }))).toEqual(CLASSES);
    const saturations = [88.8, 88.9, 94, 94.1].map((spo2Percent, at) => ({
      spo2Percent,
      fio2: at < 2 ? 0.6 : 0.4,
    }));
    const classes = ['severe', 'moderate', 'moderate', 'mild'];
    expect(saturations.map((reading) => globalArdsClass({ ...intubated, ...reading }))).toEqual(classes);
  });

  it('lets P/F decide when both are given', () => {
    expect(globalArdsClass({ ...intubated, pfMmHg: 90, spo2Percent: 94, fio2: 0.3 })).toBe('severe');
  });

  it('does not grade by a saturation above 97 %', () => {
    const at = (spo2Percent: number) => globalArdsClass({ ...intubated, spo2Percent, fio2: 0.5 });
    expect([at(97), at(97.1)]).toEqual(['moderate', null]);
  });

  it('does not grade the intubated below a PEEP of 5, and grades when no PEEP is given', () => {
    expect(globalArdsClass({ support: 'invasive', peepCmH2O: 4, pfMmHg: 150 })).toBeNull();
    expect(globalArdsClass({ support: 'invasive', pfMmHg: 150 })).toBe('moderate');
  });

  it('asks for a strong enough support before it judges the not intubated', () => {
    const mask = (peepCmH2O?: number) => globalArdsClass({ support: 'mask', pfMmHg: 150, peepCmH2O });
    const highFlow = (flowLMin?: number) => globalArdsClass({ support: 'high-flow', pfMmHg: 150, flowLMin });

    expect([mask(5), mask(4.9), mask()]).toEqual(['non-intubated', null, null]);
    expect([highFlow(30), highFlow(29.9), highFlow()]).toEqual(['non-intubated', null, null]);
    expect(globalArdsClass({ support: 'mask', pfMmHg: 310, peepCmH2O: 8 })).toBe('none');
    expect(globalArdsClass({ support: 'none', pfMmHg: 150 })).toBeNull();
  });

  it('asks for neither PEEP nor flow where resources are limited', () => {
    const limited = { resourceLimited: true, spo2Percent: 90, fio2: 0.4 };

    expect(globalArdsClass({ support: 'none', ...limited })).toBe('non-intubated');
    expect(globalArdsClass({ support: 'high-flow', flowLMin: 10, ...limited })).toBe('non-intubated');
    expect(globalArdsClass({ support: 'none', ...limited, spo2Percent: 97, fio2: 0.21 })).toBe('none');
    expect(globalArdsClass({ support: 'invasive', peepCmH2O: 0, ...limited })).toBe('moderate');
  });
});
