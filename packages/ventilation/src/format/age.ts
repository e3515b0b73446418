/**
 * An age in the board's short form: `0h25`, `3h40`, from 10 h on whole hours `14h`, from 48 h whole days `2d`.
 * Always rounded down, so that an age never looks older than it is; the ladder's state does not depend on it.
 */
export function formatAge(minutes: number): string {
  const whole = Math.max(0, Math.floor(minutes));
  const hours = Math.floor(whole / 60);
  if (hours >= 48) return `${Math.floor(hours / 24)}d`;
  if (hours >= 10) return `${hours}h`;
  return `${hours}h${String(whole % 60).padStart(2, '0')}`;
}

/** The same age in words, for people who listen to the screen: "3 hours 40 minutes". */
export function ageInWords(minutes: number): string {
  const whole = Math.max(0, Math.floor(minutes));
  const days = Math.floor(whole / 1440);
  const hours = Math.floor((whole % 1440) / 60);
  const parts = [
    [days, 'day'],
    [hours, 'hour'],
    [days > 0 ? 0 : whole % 60, 'minute'],
  ] as const;
  const said = parts
    .filter(([count]) => count > 0)
    .map(([count, word]) => `${count} ${word}${count === 1 ? '' : 's'}`);
  return said.join(' ') || 'under a minute';
}
