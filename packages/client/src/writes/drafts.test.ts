import { expect, it } from 'vitest';
import { clearAllDrafts, draftStore, hasUnfinished } from './drafts.ts';

it('keeps a draft until it is dropped, and all until the session ends', () => {
  const checks = draftStore<string>();
  const gases = draftStore<string>();
  checks.set('stay/check', '8');
  gases.set('stay/gas', '7.4');
  expect([checks.get('stay/check'), gases.get('stay/check'), hasUnfinished()]).toEqual([
    '8',
    undefined,
    true,
  ]);
  checks.drop('stay/check');
  expect([checks.get('stay/check'), hasUnfinished()]).toEqual([undefined, true]);
  clearAllDrafts();
  expect([gases.get('stay/gas'), hasUnfinished()]).toEqual([undefined, false]);
});
