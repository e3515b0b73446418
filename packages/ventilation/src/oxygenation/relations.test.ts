import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { alveolarArterialGradient } from './alveolar-arterial-gradient.ts';
import { alveolarOxygen } from './alveolar-oxygen.ts';
import { oxygenSaturationIndex } from './oxygen-saturation-index.ts';
import { oxygenationIndex } from './oxygenation-index.ts';
import { peepFio2Step } from './peep-fio2-step.ts';
import { pfRatio } from './pf-ratio.ts';
import { roxIndex } from './rox-index.ts';
import { sfRatio } from './sf-ratio.ts';

const between = (min: number, max: number) => fc.double({ min, max, noNaN: true });
const fio2s = between(0.21, 1);

describe('oxygenation', () => {
  it('index is a hundred times mean pressure over P/F', () => {
    fc.assert(
      fc.property(between(1, 60), fio2s, between(30, 600), (meanAirwayPressureCmH2O, fio2, pao2MmHg) => {
        const index = oxygenationIndex({ meanAirwayPressureCmH2O, fio2, pao2MmHg });
        expect(index).toBeCloseTo((100 * meanAirwayPressureCmH2O) / pfRatio({ pao2MmHg, fio2 }), 8);
      }),
    );
  });

  it('saturation index is a hundred times mean pressure over S/F, and ROX is S/F over rate', () => {
    fc.assert(
      fc.property(between(20, 97), fio2s, between(1, 60), (spo2Percent, fio2, other) => {
        const ratio = Number(sfRatio({ spo2Percent, fio2 }));
        const index = oxygenSaturationIndex({ meanAirwayPressureCmH2O: other, fio2, spo2Percent });
        expect(index).toBeCloseTo((100 * other) / ratio, 8);
        expect(roxIndex({ spo2Percent, fio2, ratePerMin: other })).toBeCloseTo(ratio / other, 8);
      }),
    );
  });

  it('ratio by saturation ends at 97 %', () => {
    expect(sfRatio({ spo2Percent: 97, fio2: 0.5 })).toBe(194);
    expect(sfRatio({ spo2Percent: 97.001, fio2: 0.5 })).toBeNull();
  });
});

describe('alveolarOxygen', () => {
  it('is the same in both forms when as much CO2 is made as oxygen used', () => {
    fc.assert(
      fc.property(fio2s, between(10, 90), (fio2, paco2MmHg) => {
        const input = { fio2, paco2MmHg, respiratoryQuotient: 1 };
        expect(alveolarOxygen({ ...input, form: 'full' })).toBeCloseTo(
          alveolarOxygen({ ...input, form: 'simplified' }),
          8,
        );
      }),
    );
  });

  it('costs exactly the CO2 on pure oxygen in the full form, which is the form unless told', () => {
    expect(alveolarOxygen({ fio2: 1, paco2MmHg: 40 })).toBeCloseTo(760 - 47 - 40, 10);
    expect(alveolarOxygen({ fio2: 0.4, paco2MmHg: 40 })).toBeCloseTo(239.2, 10);
  });

  it('grows with oxygen and air pressure, and falls with CO2; the gradient is what the artery lacks of it', () => {
    fc.assert(
      fc.property(
        between(0.21, 0.9),
        between(10, 80),
        between(600, 760),
        (fio2, paco2MmHg, barometricMmHg) => {
          const input = { fio2, paco2MmHg, barometricMmHg };
          const base = alveolarOxygen(input);
          expect(alveolarOxygen({ ...input, fio2: fio2 + 0.05 })).toBeGreaterThan(base);
          expect(alveolarOxygen({ ...input, barometricMmHg: barometricMmHg + 10 })).toBeGreaterThan(base);
          expect(alveolarOxygen({ ...input, paco2MmHg: paco2MmHg + 5 })).toBeLessThan(base);
          expect(alveolarArterialGradient({ ...input, pao2MmHg: 60 })).toBe(base - 60);
        },
      ),
    );
  });
});

describe('peepFio2Step', () => {
  it('knows a step however its fraction was computed, and nothing between steps', () => {
    expect(peepFio2Step({ fio2: 0.1 + 0.2, peepCmH2O: 5, ladder: 'lower' })).toEqual({
      onLadder: true,
      peepRange: [5, 5],
    });
    expect(peepFio2Step({ fio2: 0.35, peepCmH2O: 5, ladder: 'lower' })).toEqual({
      onLadder: false,
      peepRange: null,
    });
  });

  it('does not lend its ladder out to be changed', () => {
    peepFio2Step({ fio2: 0.4, peepCmH2O: 5, ladder: 'lower' }).peepRange?.fill(99);

    expect(peepFio2Step({ fio2: 0.4, peepCmH2O: 5, ladder: 'lower' }).peepRange).toEqual([5, 8]);
  });
});
