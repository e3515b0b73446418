import { amendState } from '@windrow/client/writes/amend-state';
import { buttonClass } from '@windrow/ui/controls/button';
import type { RecordEntry } from '@windrow/ventilation/contract/observations';
import type { Session } from '@windrow/ventilation/contract/session';
import { formatMoment } from '@windrow/ventilation/format/clock';
import { may } from '@windrow/ventilation/permissions/permissions';
import { Link } from 'react-router-dom';
import { mayBeAmended } from './amended-from.ts';
import { entryInWords, KIND_WORDS } from './entry-in-words.ts';

type RecordItemProps = {
  entry: RecordEntry;
  stayId: string;
  /** What amends it; 'not-read' where that lies on a page that was not read. Null: it counts. */
  amendment: RecordEntry | 'not-read' | null;
  session: Session;
  unitId: string;
  amendPath: string;
  now: number;
  timeZone: string;
};

/** Later than this an entry was made from memory or paper, and both times are said. */
const LATE_AFTER_MS = 15 * 60_000;

/** One entry. What was amended is struck through and stays readable, with who amended it, when and why. */
export function RecordItem({
  entry,
  stayId,
  amendment,
  session,
  unitId,
  amendPath,
  now,
  timeZone,
}: RecordItemProps) {
  const isStrike = entry.amends?.as === 'struck';
  const act = entry.recordedBy.personId === session.person.personId ? 'amend-own' : 'amend-other';
  const canAmend = mayBeAmended(entry) && may(session.grants, act, unitId);
  return (
    <article className="flex flex-col gap-1 rounded-xl bg-tile px-4 py-3">
      <header className="flex flex-wrap items-baseline gap-x-3">
        <h2 className="font-bold text-lg">
          {isStrike ? `${KIND_WORDS[entry.kind]} struck` : KIND_WORDS[entry.kind]}
        </h2>
        <EntryTimes entry={entry} now={now} timeZone={timeZone} />
        {canAmend && (
          <Link
            to={amendPath}
            state={amendState({ stayId, entry })}
            className={`${buttonClass('quiet')} ml-auto`}
            aria-label={`Amend: ${KIND_WORDS[entry.kind]} of ${formatMoment(entry.observedAt, now, timeZone)}`}
          >
            Amend
          </Link>
        )}
      </header>
      {entry.amends && (
        <p className="font-bold">
          {isStrike ? 'Entered in error' : 'Corrects an earlier entry'}: {entry.amends.reason}
        </p>
      )}
      <EntryLines entry={entry} isAmended={amendment !== null} />
      {amendment !== null && <p className="font-bold">{amendmentInWords({ amendment, now, timeZone })}</p>}
    </article>
  );
}

function EntryTimes({ entry, now, timeZone }: Pick<RecordItemProps, 'entry' | 'now' | 'timeZone'>) {
  const isLate = Date.parse(entry.recordedAt) - Date.parse(entry.observedAt) > LATE_AFTER_MS;
  const source = entry.source === 'hand' ? '' : `, by ${entry.source}`;
  return (
    <p className="text-ink-muted">
      <span className="font-bold text-ink tabular-nums">{formatMoment(entry.observedAt, now, timeZone)}</span>
      {isLate && <> · recorded {formatMoment(entry.recordedAt, now, timeZone)}</>} ·{' '}
      {entry.recordedBy.displayName}
      {source}
    </p>
  );
}

function EntryLines({ entry, isAmended }: { entry: RecordEntry; isAmended: boolean }) {
  const lines = entryInWords(entry).map(({ label, text }) => (
    <p key={`${label}${text}`} className="wrap-break-word">
      {label && <span className="text-ink-muted">{label}: </span>}
      {text}
    </p>
  ));
  if (!isAmended) return <div>{lines}</div>;
  return (
    <del className="text-ink-muted decoration-2">
      <span className="sr-only">Amended, no longer counts: </span>
      {lines}
    </del>
  );
}

function amendmentInWords({
  amendment,
  now,
  timeZone,
}: {
  amendment: RecordEntry | 'not-read';
  now: number;
  timeZone: string;
}): string {
  if (amendment === 'not-read') return 'Amended since.';
  const did = amendment.amends?.as === 'struck' ? 'Struck' : 'Corrected';
  return `${did} ${formatMoment(amendment.recordedAt, now, timeZone)} by ${amendment.recordedBy.displayName}: ${amendment.amends?.reason ?? ''}`;
}
