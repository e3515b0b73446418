import { describe, expect, it } from 'vitest';
import { hacorScore } from './hacor-score.ts';
import { murrayScore } from './murray-score.ts';
import { respiratorySofa } from './respiratory-sofa.ts';

const CALM = { heartRatePerMin: 80, ph: 7.4, glasgowComaScale: 15, pfMmHg: 400, ratePerMin: 16 };
const CLEAR = { quadrants: 0, pfMmHg: 400, peepCmH2O: 5, complianceMlCmH2O: 90 };

describe('hacorScore, on both sides of each edge', () => {
  it.each([
    ['heartRatePerMin', [120, 120.5, 121], [0, 1, 1]],
    ['ph', [7.35, 7.349, 7.34, 7.3, 7.299, 7.29, 7.25, 7.249, 7.24], [0, 2, 2, 2, 3, 3, 3, 4, 4]],
    ['glasgowComaScale', [15, 14, 13, 12, 11, 10, 3], [0, 2, 2, 5, 5, 10, 10]],
    [
      'pfMmHg',
      [201, 200.5, 200, 176, 175, 151, 150, 126, 125, 101, 100, 60],
      [0, 0, 2, 2, 3, 3, 4, 4, 5, 5, 6, 6],
    ],
    ['ratePerMin', [30, 31, 35, 36, 40, 41, 45, 46], [0, 1, 1, 2, 2, 3, 3, 4]],
  ])('%s of %o scores %o', (key, values, points) => {
    expect(values.map((value) => hacorScore({ ...CALM, [key]: value }))).toEqual(points);
  });
});

describe('murrayScore, on both sides of each edge', () => {
  it.each([
    ['quadrants', [0, 1, 2, 3, 4], [0, 1, 2, 3, 4]],
    ['pfMmHg', [300, 299.9, 225, 224.9, 175, 174.9, 100, 99.9], [0, 1, 1, 2, 2, 3, 3, 4]],
    ['peepCmH2O', [0, 5, 6, 8, 9, 11, 12, 14, 15, 24], [0, 0, 1, 1, 2, 2, 3, 3, 4, 4]],
    ['complianceMlCmH2O', [80, 79, 60, 59, 40, 39, 20, 19], [0, 1, 1, 2, 2, 3, 3, 4]],
  ])('%s of %o scores %o in its part', (key, values, points) => {
    expect(values.map((value) => murrayScore({ ...CLEAR, [key]: value }) * 4)).toEqual(points);
  });

  it('is the mean of three parts when compliance is missing', () => {
    const { complianceMlCmH2O: _, ...withoutCompliance } = { ...CLEAR, quadrants: 3 };

    expect(murrayScore(withoutCompliance)).toBe(1);
    expect(murrayScore({ ...withoutCompliance, complianceMlCmH2O: null })).toBe(1);
    expect(murrayScore({ ...CLEAR, quadrants: 3 })).toBe(0.75);
  });
});

describe('respiratorySofa, on both sides of each edge', () => {
  const values = [400, 399.9, 300, 299.9, 200, 199.9, 100, 99.9];

  it('goes up to 4 with support', () => {
    expect(values.map((pfMmHg) => respiratorySofa({ pfMmHg, supported: true }))).toEqual([
      0, 1, 1, 2, 2, 3, 3, 4,
    ]);
  });

  it('stops at 2 without', () => {
    expect(values.map((pfMmHg) => respiratorySofa({ pfMmHg, supported: false }))).toEqual([
      0, 1, 1, 2, 2, 2, 2, 2,
    ]);
  });
});
