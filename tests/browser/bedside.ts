import { expect, type Page } from '@playwright/test';

/** Opens a bed from the round by touch, as a therapist does. */
export async function openBed(page: Page, label: string): Promise<void> {
  await page
    .getByRole('link', { name: new RegExp(`\\b${label}\\b`) })
    .first()
    .tap();
  await expect(page.getByText(`Bed ${label}`, { exact: true })).toBeVisible();
}

export async function openPart(
  page: Page,
  part: 'Now' | 'Check' | 'Airway' | 'Gas' | 'Happening' | 'Readiness' | 'Aids' | 'Record',
): Promise<void> {
  await page
    .getByRole('navigation', { name: /^Bed / })
    .getByRole('link', { name: new RegExp(`^${part}( |$)`) })
    .tap();
}

/** Types a number on the docked keypad, key by key. */
export async function enter(page: Page, field: string, digits: string): Promise<void> {
  await page.getByRole('textbox', { name: new RegExp(`^${field.replace(/[()]/g, '\\$&')}`) }).tap();
  const keypad = page.getByRole('region', { name: `Keypad for ${field}` });
  for (const digit of digits) {
    await keypad.getByRole('button', { name: digit === '.' ? 'point' : digit, exact: true }).tap();
  }
}

/** "As before", which is a deliberate tap for each value. */
export async function asBefore(page: Page, field: string): Promise<void> {
  await page.getByRole('textbox', { name: new RegExp(`^${field.replace(/[()]/g, '\\$&')}`) }).tap();
  await page
    .getByRole('region', { name: `Keypad for ${field}` })
    .getByRole('button', { name: /^as before/ })
    .tap();
}
