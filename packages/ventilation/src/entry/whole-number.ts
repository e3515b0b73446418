/** A whole number as typed; nothing typed is no fault. */
export function wholeNumber(
  text: string,
  [low, high]: readonly [number, number],
): { value: number | null; fault: string | null } {
  const typed = text.trim();
  if (typed === '') return { value: null, fault: null };
  const value = /^\d{1,3}$/.test(typed) ? Number(typed) : Number.NaN;
  if (value >= low && value <= high) return { value, fault: null };
  return { value: null, fault: `A whole number from ${low} to ${high}, not ${typed}` };
}
