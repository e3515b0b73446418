import { expect, it } from 'vitest';
import { actKeys } from './act-key.ts';

it('keeps its key for the same words and takes another for others', () => {
  const keyOf = actKeys();
  const first = keyOf({ peepCmH2O: 8 });
  expect(keyOf({ peepCmH2O: 8 })).toBe(first);
  expect(keyOf({ peepCmH2O: 10 })).not.toBe(first);
});
