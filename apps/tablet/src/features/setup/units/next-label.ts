/** The label that follows another: "07" → "08", "L9" → "L10". Without a number at its end there is none. */
export function nextLabel(label: string): string {
  const [, before = '', digits] = /^(.*?)(\d+)$/.exec(label) ?? [];
  if (digits === undefined) return '';
  return `${before}${String(Number(digits) + 1).padStart(digits.length, '0')}`;
}

/** What to offer for the next bed of a unit: after the last label that was given, as people count. */
export function offeredLabel(labels: readonly string[]): string {
  const last = [...labels].sort((a, b) => a.localeCompare(b, 'en', { numeric: true })).at(-1);
  return last === undefined ? '01' : nextLabel(last);
}
