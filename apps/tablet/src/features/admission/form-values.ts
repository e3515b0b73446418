/** What stands in an input, as the contract wants it. An empty input is nothing, never zero. */
export function textOrNull(text: unknown): string | null {
  return typeof text === 'string' && text.trim() !== '' ? text : null;
}

export function numberOrNull(text: unknown): number | null {
  if (typeof text === 'number') return text;
  return typeof text === 'string' && text.trim() !== '' ? Number(text) : null;
}

/** Eight digits with the dashes of a day put in as they are typed: `1961-03-04`. */
export function dayFromTyping(text: string): string {
  const digits = text.replace(/\D/g, '').slice(0, 8);
  return [digits.slice(0, 4), digits.slice(4, 6), digits.slice(6, 8)].filter((part) => part !== '').join('-');
}

/** Four digits with the colon of a clock: `09:40`. */
export function clockFromTyping(text: string): string {
  const digits = text.replace(/\D/g, '').slice(0, 4);
  return digits.length > 2 ? `${digits.slice(0, 2)}:${digits.slice(2)}` : digits;
}

/** The intervals that can be ordered, in minutes, with how they are said. Another one that stands is kept. */
export function intervalOptions(present: number | null): { value: string; label: string }[] {
  const minutes = [30, 60, 120, 180, 240, 360, 480, 720, 1440];
  const all =
    present === null || minutes.includes(present) ? minutes : [...minutes, present].sort((a, b) => a - b);
  return all.map((many) => ({
    value: String(many),
    label: many % 60 === 0 ? `every ${many / 60} h` : `every ${many} min`,
  }));
}
