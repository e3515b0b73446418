import { FlagChip } from '@windrow/ui/controls/flag-chip';
import type { ShownBed } from '@windrow/ventilation/board/shown-bed';
import { presentSupport } from '@windrow/ventilation/board/tile/present-support';
import { tileCells } from '@windrow/ventilation/board/tile-cells';
import type { BedStay } from '@windrow/ventilation/contract/board';
import { formatAge } from '@windrow/ventilation/format/age';
import { formatMoment } from '@windrow/ventilation/format/clock';
import { Link } from 'react-router-dom';
import { GroupAges } from './group-ages.tsx';
import { whatIsDue } from './what-is-due.ts';

type BedRowProps = { shown: ShownBed; stay: BedStay; now: number; timeZone: string; isUnfinished: boolean };

/** One bed of the round. The whole row opens the bed. */
export function BedRow({ shown, stay, now, timeZone, isUnfinished }: BedRowProps) {
  const { bed, assignment } = shown;
  const name = stay.patient ? `${stay.patient.familyName}, ${stay.patient.givenName.charAt(0)}.` : '';
  return (
    <article className="relative grid grid-cols-[auto_minmax(0,1fr)] items-center gap-x-4 gap-y-2 rounded-xl bg-tile p-3 text-ink lg:grid-cols-[4.5rem_14rem_minmax(0,1fr)_auto]">
      <p className="font-bold text-4xl tabular-nums">{bed.label}</p>
      <div className="min-w-0">
        <h3 className="font-bold text-lg leading-snug">
          <Link
            to={`/beds/${bed.unitId}/${bed.bedId}/now`}
            className="text-ink no-underline after:absolute after:inset-0 after:rounded-xl focus-visible:outline-none focus-visible:after:outline-3 focus-visible:after:outline-focus"
          >
            <span className="sr-only">Bed {bed.label}, </span>
            <span className="wrap-break-word">{name}</span>
          </Link>
        </h3>
        <p className="flex flex-wrap items-center gap-x-3 text-ink-muted">
          <span className="font-bold text-ink">{supportInWords({ shown, stay, now })}</span>
          <span>{assignment ? assignment.initials : 'unassigned'}</span>
        </p>
      </div>
      <div className="col-span-2 flex min-w-0 flex-col gap-2 lg:col-span-1">
        <RowValues shown={shown} stay={stay} now={now} timeZone={timeZone} />
        <RowMarks shown={shown} stay={stay} now={now} isUnfinished={isUnfinished} />
        <SeenFlags flags={stay.flags} now={now} timeZone={timeZone} />
      </div>
      <div className="col-span-2 lg:col-span-1">
        <GroupAges shown={shown} stay={stay} />
      </div>
    </article>
  );
}

function RowValues({ shown, stay, now, timeZone }: Pick<BedRowProps, 'shown' | 'stay' | 'now' | 'timeZone'>) {
  const { state, observedAt } = shown.groups.check;
  if (stay.check === null) {
    // That there is none yet is said below, as what is owed.
    if (state === 'never') return null;
    return (
      <p className="rake-dense w-fit rounded-md p-2">
        <span className="rounded-sm bg-tile px-2 py-0.5 font-bold">
          no current check{observedAt && `, last ${formatMoment(observedAt, now, timeZone)}`}
        </span>
      </p>
    );
  }
  const cells = tileCells(stay.check).flat();
  return (
    <div className={state === 'overdue' ? 'rake-wide w-fit rounded-md p-2' : ''}>
      <ul className={`flex w-fit flex-wrap gap-x-4 rounded-sm ${state === 'overdue' ? 'bg-tile px-2' : ''}`}>
        {cells.map(({ key, value, label, words }) => (
          <li key={key} className="whitespace-nowrap">
            <span className="sr-only">{words}</span>
            <span aria-hidden="true">
              <span className="font-bold text-xl tabular-nums">{value}</span>{' '}
              <span className="text-ink-muted text-sm">{label}</span>
            </span>
          </li>
        ))}
      </ul>
    </div>
  );
}

function RowMarks({
  shown,
  stay,
  now,
  isUnfinished,
}: Pick<BedRowProps, 'shown' | 'stay' | 'now' | 'isUnfinished'>) {
  const due = whatIsDue({ shown, now });
  const openFlags = stay.flags.filter(({ acknowledged }) => acknowledged === null);
  const pressing = due.filter(
    ({ group, minutes }, index) => index === 0 || minutes <= 0 || group === 'trial',
  );
  return (
    <ul className="flex flex-wrap items-center gap-x-3 gap-y-2">
      {pressing.map(({ group, words, minutes }) => (
        <li key={group} className={minutes <= 0 ? 'font-bold' : 'text-ink-muted'}>
          {words}
        </li>
      ))}
      {isUnfinished && (
        <li className="rounded-md border-2 border-ink border-dashed px-2 font-bold">
          entry not recorded yet
        </li>
      )}
      {stay.difficultAirway && (
        <li className="rounded-md bg-ink px-2 font-bold text-ground">difficult airway</li>
      )}
      {stay.away && <li className="rounded-md border-2 border-ink px-2 font-bold">away</li>}
      {stay.proneSinceAt && <li className="rounded-md border-2 border-ink px-2 font-bold">prone</li>}
      {stay.trial && (
        <li className="rounded-md border-2 border-ink px-2 font-bold">
          breathing trial {formatAge((now - Date.parse(stay.trial.startedAt)) / 60_000)}
        </li>
      )}
      {openFlags.map(({ id, level, short }) => (
        <li key={id}>
          <FlagChip level={level}>{short}</FlagChip>
        </li>
      ))}
    </ul>
  );
}

/** What somebody has acknowledged, quietly and with their note: it is not owed, and not forgotten. */
function SeenFlags({ flags, now, timeZone }: { flags: BedStay['flags']; now: number; timeZone: string }) {
  const seen = flags.filter(({ acknowledged }) => acknowledged !== null);
  if (seen.length === 0) return null;
  return (
    <ul aria-label="Acknowledged flags" className="flex flex-col text-ink-muted text-sm">
      {seen.map(({ id, short, acknowledged }) => (
        <li key={id} className="wrap-break-word">
          {short}: acknowledged by {acknowledged?.by}{' '}
          {acknowledged && formatMoment(acknowledged.at, now, timeZone)}, {acknowledged?.note}
        </li>
      ))}
    </ul>
  );
}

/** What the patient breathes with is known for as long as the check that said so. */
function supportInWords({ shown, stay, now }: Pick<BedRowProps, 'shown' | 'stay' | 'now'>): string {
  if (stay.support === null) return 'no support recorded';
  return presentSupport({ shown, now })?.shortName ?? 'support not known now';
}
