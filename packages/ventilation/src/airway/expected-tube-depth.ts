import { requireNumbers } from '../units/require-number.ts';

/**
 * Depth at which an oral tube usually lies in an adult of this height, at the teeth. A starting point only; the
 * film and the exam decide.
 *
 * @title Expected tube depth
 * @formula `heightCm ÷ 7 − 2.5`.
 * @valid for oral tubes in adults.
 *
 * @param input.heightCm height, cm (100 to 250).
 * @returns cm.
 * @throws RangeError on missing, non-finite or impossible input.
 *
 * @source common practice, read in a secondary page.
 */
export function expectedTubeDepth({ heightCm }: { heightCm: number }): number {
  requireNumbers({ heightCm });
  return heightCm / 7 - 2.5;
}
