/** How much of the page below and above a row must stay in sight: the docked pad and the bar lie over its foot. */
export const ROW_MARGINS = 'scroll-mt-20 scroll-mb-120 dock-side:scroll-mb-24';

/** The element of a row that takes the focus. */
export function rowId(key: string): string {
  return `row-${key}`;
}

/** Clear of the pad, which may only open with this focus. */
export function showRow(key: string): void {
  document.getElementById(rowId(key))?.scrollIntoView({ block: 'nearest' });
}

export function focusRow(key: string): void {
  const element = document.getElementById(rowId(key));
  const target = element?.matches('fieldset, div')
    ? element.querySelector<HTMLElement>('input:checked, input, select, textarea')
    : element;
  target?.focus();
  element?.scrollIntoView({ block: 'nearest' });
}
