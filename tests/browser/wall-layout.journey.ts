import type { Page } from '@playwright/test';
import { expect, expectAccessible, signIn, test, WALL, type Windrow } from './windrow.ts';

const SIZES = [WALL, { width: 3840, height: 2160 }];
const UNITS = { 8: 'Lantern ICU', 16: 'Harbour ICU', 24: 'Orchard ICU' };

async function openWall(page: Page, windrow: Windrow, unit: string, theme: 'night' | 'day'): Promise<void> {
  await signIn(page, windrow, 'display', `/wall?theme=${theme}`);
  await page.getByRole('button', { name: new RegExp(unit) }).click();
  await expect(page.getByRole('article').first()).toBeVisible();
  await page.evaluate(() => document.fonts.ready);
}

/** Text that leaves its tile, is cut by its own box, or ends in an ellipsis. */
function cutTexts(page: Page): Promise<string[]> {
  return page.evaluate(() => {
    const cut: string[] = [];
    for (const tile of document.querySelectorAll('article')) {
      const frame = tile.getBoundingClientRect();
      const walker = document.createTreeWalker(tile, NodeFilter.SHOW_TEXT);
      for (let node = walker.nextNode(); node; node = walker.nextNode()) {
        const element = node.parentElement;
        if (!element || !node.textContent?.trim()) continue;
        const range = document.createRange();
        range.selectNodeContents(node);
        const box = range.getBoundingClientRect();
        // Words for listeners alone are a pixel wide on purpose.
        if (element.closest('.sr-only') || box.width <= 1) continue;
        // A line's box is higher than its letters; what matters is that no letter leaves the tile.
        const slack = Number.parseFloat(getComputedStyle(element).fontSize) * 0.25;
        const leaves =
          box.left < frame.left ||
          box.right > frame.right ||
          box.top + slack < frame.top ||
          box.bottom - slack > frame.bottom;
        if (leaves || getComputedStyle(element).textOverflow === 'ellipsis')
          cut.push(`${tile.getAttribute('aria-label')}: ${node.textContent}`);
      }
    }
    return cut;
  });
}

for (const [beds, unit] of Object.entries(UNITS)) {
  for (const theme of ['night', 'day'] as const) {
    test(`the wall of ${beds} beds (${theme}) cuts no value at 1080p and 4K, and pages nothing`, async ({
      windrow,
      open,
    }) => {
      for (const size of SIZES) {
        const wall = await open(windrow, size);
        await openWall(wall, windrow, unit, theme);
        await expect(wall.getByRole('article')).toHaveCount(Number(beds));
        expect(await cutTexts(wall)).toEqual([]);
        expect(
          await wall.evaluate(
            () =>
              document.documentElement.scrollHeight <= innerHeight &&
              document.documentElement.scrollWidth <= innerWidth,
          ),
        ).toBe(true);
      }
    });
  }
}

test('every rung of the ladder can be read as words, and a withdrawn value is gone', async ({
  windrow,
  open,
}) => {
  const wall = await open(windrow, WALL);
  await openWall(wall, windrow, 'Harbour ICU', 'night');
  const tile = (bed: string) => wall.getByRole('article', { name: new RegExp(`^Bed ${bed},`) });
  await expect(tile('01')).toHaveAccessibleName(/check current/);
  await expect(tile('09')).toHaveAccessibleName(/check due/);
  await expect(tile('03')).toHaveAccessibleName(/check overdue/);
  await expect(tile('08')).toContainText('no current check');
  await expect(tile('08')).not.toContainText('PEEP');
  await expect(tile('16')).toContainText('no check yet');
  await expect(wall.getByText(/Not a monitor, not an alarm/)).toBeVisible();
  await expect(wall.getByText('demonstration data')).toBeVisible();
  await expectAccessible(wall);
});

test('a wrong clock in the screen changes no age', async ({ windrow, open }) => {
  const ages: string[] = [];
  for (const hours of [0, -2, 2]) {
    const wall = await open(windrow, WALL);
    await wall.addInitScript((offsetMs) => {
      const real = Date.now.bind(Date);
      Date.now = () => real() + offsetMs;
    }, hours * 3_600_000);
    await openWall(wall, windrow, 'Orchard ICU', 'day');
    ages.push((await wall.getByRole('article', { name: /^Bed 08,/ }).getAttribute('aria-label')) ?? '');
  }
  const minutes = ages.map(
    (age) => Number(/(\d+) hours/.exec(age)?.[1]) * 60 + Number(/(\d+) minutes?$/.exec(age)?.[1] ?? 0),
  );
  for (const age of minutes) expect(Math.abs(age - (minutes[0] ?? 0))).toBeLessThanOrEqual(1);
});
