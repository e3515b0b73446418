import type { SurveillanceMark, SurveillanceRow } from '@windrow/ventilation/contract/surveillance';
import { MARK_WORDS, PARAMETER_WORDS } from './words.ts';

type DayTableProps = {
  caption: string;
  rows: readonly SurveillanceRow[];
  dayName: (day: string) => string;
};

const HEAD = 'px-1 py-2 align-bottom font-bold sm:px-2';

/** Every day with its minima, what it is to the rule, and why. Days in an event's window stand against a bar. */
export function DayTable({ caption, rows, dayName }: DayTableProps) {
  return (
    <table className="-mx-2 mt-2 w-[calc(100%+1rem)] text-left text-sm sm:mx-0 sm:w-full sm:text-base">
      <caption className="sr-only">{caption}</caption>
      <thead>
        <tr className="border-ink border-b-2">
          <th scope="col" className={HEAD}>
            Day
          </th>
          <th scope="col" className={`${HEAD} text-right`}>
            PEEP <span className="block font-normal text-ink-muted text-xs sm:text-sm">cmH2O</span>
          </th>
          <th scope="col" className={`${HEAD} text-right`}>
            FiO2 <span className="block font-normal text-ink-muted text-sm">%</span>
          </th>
          <th scope="col" className={HEAD}>
            By the rule, and why
          </th>
        </tr>
      </thead>
      <tbody>
        {rows.map((row, index) => (
          <DayRow
            key={row.day}
            row={row}
            dayName={dayName}
            isNewEpisode={index > 0 && row.ventilationDay === 1}
          />
        ))}
      </tbody>
    </table>
  );
}

function DayRow({
  row,
  dayName,
  isNewEpisode,
}: {
  row: SurveillanceRow;
  dayName: (day: string) => string;
  /** After a full day off the ventilator. */
  isNewEpisode: boolean;
}) {
  const { day, ventilationDay, minPeep, minFio2Percent, marks, notes, windowOf, period } = row;
  return (
    <tr
      data-day={day}
      className={`align-top ${isNewEpisode ? 'border-line-strong border-t-4' : 'border-line border-t'}`}
    >
      <th
        scope="row"
        className={`border-l-4 px-1 py-2 font-normal sm:border-l-8 sm:px-2 ${windowOf === null ? 'border-l-tile' : 'border-l-block'}`}
      >
        <span className="block whitespace-nowrap font-bold tabular-nums">{dayName(day)}</span>
        {dayName(day) !== `day ${ventilationDay}` && (
          <span className="block whitespace-nowrap text-ink-muted text-sm">
            <span className="sr-only">ventilation </span>day {ventilationDay}
          </span>
        )}
      </th>
      <Minimum value={minPeep} />
      <Minimum value={minFio2Percent} />
      <td className="px-1 py-2 sm:px-2">
        {marks.map((mark) => (
          <p key={`${mark.kind}${mark.parameter}${mark.why}`} className="wrap-break-word">
            <MarkChip mark={mark} /> {mark.why}
          </p>
        ))}
        {period !== null && (
          <p className="text-ink-muted text-sm">
            Day {period.dayOfPeriod} of the event’s 14{windowOf !== null && ', in its window'}
          </p>
        )}
        {period === null && windowOf !== null && (
          <p className="text-ink-muted text-sm">In the event’s window</p>
        )}
        {notes.map((note) => (
          <p key={note} className="text-ink-muted">
            {note}
          </p>
        ))}
      </td>
    </tr>
  );
}

function Minimum({ value }: { value: number | null }) {
  return (
    <td className="px-1 py-2 text-right sm:px-2 font-bold tabular-nums">
      {value ?? (
        <>
          <span aria-hidden="true">–</span>
          <span className="sr-only">none</span>
        </>
      )}
    </td>
  );
}

const CHIP: Readonly<Record<SurveillanceMark['kind'], string>> = {
  onset: 'border-2 border-flag bg-flag text-flag-ink',
  worse: 'border-2 border-flag text-flag-text',
  baseline: 'border-2 border-ink',
  repeat: 'border-2 border-line-strong border-dashed',
  'one-day': 'border-2 border-line-strong border-dashed',
};

function MarkChip({ mark: { kind, parameter } }: { mark: SurveillanceMark }) {
  return (
    <span
      className={`mr-1 inline-flex items-center gap-1.5 rounded-md px-2 leading-snug font-bold ${CHIP[kind]}`}
    >
      {kind === 'onset' && <span aria-hidden="true">▲</span>}
      {PARAMETER_WORDS[parameter]}, {MARK_WORDS[kind]}
    </span>
  );
}
