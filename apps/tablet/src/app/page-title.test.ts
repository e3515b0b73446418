import { expect, it } from 'vitest';
import { pageTitle } from './page-title.ts';

it('names the part and the unit, and nobody', () => {
  expect(pageTitle({ pathname: '/beds/u/b/check', unitName: 'Harbour ICU' })).toBe(
    'Bed · Harbour ICU · Windrow',
  );
  expect(pageTitle({ pathname: '/setup', unitName: null })).toBe('Setup · Windrow');
  expect(pageTitle({ pathname: '/', unitName: 'Harbour ICU' })).toBe('Windrow');
});
