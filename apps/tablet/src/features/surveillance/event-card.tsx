import { FlagChip } from '@windrow/ui/controls/flag-chip';
import type { InfectionTier, SurveillanceEvent } from '@windrow/ventilation/contract/surveillance';
import { byInWords } from './words.ts';

type EventCardProps = {
  /** A typed list has no second tier. */
  event: SurveillanceEvent & { infection?: InfectionTier };
  dayName: (day: string) => string;
};

/** One event: its onset, window and 14 days, why, and how the second tier stands. */
export function EventCard({ event, dayName }: EventCardProps) {
  const { onset, by, ventilationDay, window, period, isFirm, why, infection } = event;
  return (
    <article className="flex flex-col gap-2 rounded-xl bg-tile px-4 py-3">
      <header className="flex flex-wrap items-center gap-x-3 gap-y-1">
        <FlagChip level="attention">{`VAC by ${byInWords(by)}`}</FlagChip>
        <h2 className="font-bold text-lg">Onset {dayName(onset)}</h2>
        {!isFirm && <span className="rounded-md border-2 border-ink px-2 font-bold">not firm yet</span>}
      </header>
      {!isFirm && <p>The second worse day is not over: its minimum can still fall, and the event with it.</p>}
      <dl className="grid gap-x-6 gap-y-1 sm:grid-cols-3">
        <Fact term="Onset is" words={`ventilation day ${ventilationDay}`} />
        <Fact term="Window" words={`${dayName(window.first)} to ${dayName(window.last)}`} />
        <Fact term="14-day period" words={`${dayName(period.first)} to ${dayName(period.last)}`} />
      </dl>
      <div>
        <h3 className="text-ink-muted text-sm">Why</h3>
        <ul className="list-disc pl-6">
          {why.map((sentence) => (
            <li key={sentence}>{sentence}</li>
          ))}
        </ul>
      </div>
      {infection && <Tier infection={infection} dayName={dayName} />}
    </article>
  );
}

function Tier({ infection, dayName }: { infection: InfectionTier; dayName: (day: string) => string }) {
  const { ivac, signs, qualifyingDays, missing } = infection;
  return (
    <div>
      <h3 className="font-bold">
        {ivac
          ? 'Infection-related (IVAC): met by what was entered'
          : 'Infection-related (IVAC): not met so far'}
      </h3>
      <ul className="list-disc pl-6">
        {signs.map((sign) => (
          <li key={sign}>{sign}</li>
        ))}
        {qualifyingDays.length > 0 && (
          <li>Qualifying antimicrobial days: {qualifyingDays.map(dayName).join(', ')}</li>
        )}
        {missing.map((words) => (
          <li key={words}>
            <span className="font-bold">Missing. </span>
            {words}
          </li>
        ))}
      </ul>
    </div>
  );
}

function Fact({ term, words }: { term: string; words: string }) {
  return (
    <div>
      <dt className="text-ink-muted text-sm">{term}</dt>
      <dd className="font-bold">{words}</dd>
    </div>
  );
}
