import { ageInWords, formatAge } from '@windrow/ventilation/format/age';
import { formatMoment } from '@windrow/ventilation/format/clock';
import { type EntryRow, valueAlone } from './entry-field.ts';

/** What was recorded last, and how old it is. Once withdrawn only when: an old number invites copying. */
export function RowBefore({ row, now, timeZone }: { row: EntryRow; now: number; timeZone: string }) {
  const { before } = row;
  if (before.state === 'none') return null;
  if (before.state === 'withdrawn')
    return (
      <span className="text-ink-muted text-sm">last {formatMoment(before.observedAt, now, timeZone)}</span>
    );
  return (
    <span className="text-ink-muted">
      <span className="sr-only">last </span>
      <span className="text-lg tabular-nums">{shortValue(row, before.value)}</span>{' '}
      <span aria-hidden="true" className="text-sm">
        {formatAge(before.ageMinutes)}
      </span>
      <span className="sr-only">, {ageInWords(before.ageMinutes)} ago</span>
    </span>
  );
}

/** A long option is said by its short name, before the dot. */
function shortValue(row: EntryRow, value: number | string): string {
  return valueAlone(row, value).split(' · ')[0] ?? '';
}
