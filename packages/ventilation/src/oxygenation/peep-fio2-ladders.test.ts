import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { LADDER_NAMES, type LadderStep, ladderPosition } from './peep-fio2-ladders.ts';

const LOWEST = { fio2: 0.21, peepCmH2O: 0 };
const at = ({ fio2Percent, peepCmH2O }: LadderStep) => ({ fio2: fio2Percent / 100, peepCmH2O });

/** Every step by walking up from below. */
function walked(ladder: (typeof LADDER_NAMES)[number]): LadderStep[] {
  const steps: LadderStep[] = [];
  for (
    let next = ladderPosition({ ...LOWEST, ladder }).up;
    next;
    next = ladderPosition({ ...at(next), ladder }).up
  )
    steps.push(next);
  return steps;
}

describe.each(LADDER_NAMES)('the %s PEEP ladder', (ladder) => {
  it('is walked up and down through the same steps, each of them on it', () => {
    const up = walked(ladder);
    expect(up.length).toBeGreaterThan(15);
    for (const [index, step] of up.entries()) {
      expect(ladderPosition({ ...at(step), ladder })).toMatchObject({
        onLadder: true,
        down: up[index - 1] ?? null,
        up: up[index + 1] ?? null,
      });
    }
  });

  it('leads back onto itself from any settings, never up in the one and down in the other', () => {
    const steps = walked(ladder);
    fc.assert(
      fc.property(
        fc.integer({ min: 21, max: 100 }),
        fc.integer({ min: 0, max: 40 }),
        (percent, peepCmH2O) => {
          const { up, down } = ladderPosition({ fio2: percent / 100, peepCmH2O, ladder });
          if (up) {
            expect(steps).toContainEqual(up);
            expect(up.fio2Percent >= percent && up.peepCmH2O >= peepCmH2O).toBe(true);
          }
          if (down) expect(down.fio2Percent <= percent && down.peepCmH2O <= peepCmH2O).toBe(true);
          expect(up).not.toEqual({ fio2Percent: percent, peepCmH2O });
        },
      ),
    );
  });
});

describe('ladderPosition', () => {
  it('names the steps on both sides of settings between two of them', () => {
    expect(ladderPosition({ fio2: 0.45, peepCmH2O: 8, ladder: 'lower' })).toEqual({
      onLadder: false,
      peepRangeCmH2O: null,
      up: { fio2Percent: 50, peepCmH2O: 8 },
      down: { fio2Percent: 40, peepCmH2O: 8 },
    });
  });

  it('has no step past its ends', () => {
    expect(ladderPosition({ fio2: 1, peepCmH2O: 24, ladder: 'lower' }).up).toBeNull();
    expect(ladderPosition({ fio2: 0.3, peepCmH2O: 5, ladder: 'higher' }).down).toBeNull();
  });
});
