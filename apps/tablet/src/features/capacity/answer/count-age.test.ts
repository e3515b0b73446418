import { describe, expect, it } from 'vitest';
import { countState } from './count-age.ts';

describe('countState', () => {
  it('ages as every value does, from the very boundary', () => {
    const serverTime = '2026-03-05T12:00:00.000Z';
    const at = (ms: number) => countState({ serverTime }, Date.parse(serverTime) + ms);
    expect([at(-500), at(49_999), at(50_000), at(299_999), at(300_000)]).toEqual([
      'current',
      'current',
      'old',
      'old',
      'withdrawn',
    ]);
  });
});
