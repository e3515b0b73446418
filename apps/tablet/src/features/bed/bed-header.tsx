import type { ShownBed } from '@windrow/ventilation/board/shown-bed';
import type { BedStay } from '@windrow/ventilation/contract/board';
import { formatDay, formatMoment } from '@windrow/ventilation/format/clock';
import { dayIn } from '@windrow/ventilation/format/zoned-time';
import { weightWorkedOut } from '@windrow/ventilation/notes/gas-worked-out';
import { bodyInWords, nameInWords, weightInWords } from './patient-in-words.ts';
import { WorkedOutLink } from './worked-out-link.tsx';

type BedHeaderProps = { shown: ShownBed; stay: BedStay; now: number; timeZone: string };

/** Bed, name and two identifiers, then what whoever stands here must know before anything else. */
export function BedHeader({ shown, stay, now, timeZone }: BedHeaderProps) {
  const { patient } = stay;
  return (
    <header className="flex flex-wrap items-start gap-x-4 gap-y-1">
      <p className="font-bold text-5xl tabular-nums leading-none">
        <span className="sr-only">Bed </span>
        {shown.bed.label}
      </p>
      <div className="min-w-0 grow basis-72">
        <h1 className="flex flex-wrap items-baseline gap-x-3 text-lg">
          <span className="wrap-break-word font-bold text-xl">
            {patient ? nameInWords(patient) : 'name not shown'}
          </span>
          {patient && (
            <span>
              born {formatDay(patient.bornOn)} · No. {patient.hospitalNumber}
            </span>
          )}
        </h1>
        <p className="text-ink-muted">
          {patient && `${bodyInWords({ patient, today: dayIn(now, timeZone) })}, `}
          {patient && <Weight patient={patient} predictedBodyWeightKg={stay.predictedBodyWeightKg} />}
        </p>
      </div>
      <BedMarks stay={stay} now={now} timeZone={timeZone} />
    </header>
  );
}

function Weight({
  patient,
  predictedBodyWeightKg,
}: { patient: NonNullable<BedStay['patient']> } & Pick<BedStay, 'predictedBodyWeightKg'>) {
  const words = weightInWords(predictedBodyWeightKg);
  const from = predictedBodyWeightKg === null ? null : weightWorkedOut(patient);
  if (from === null) return words;
  return (
    // As high as a finger needs, without pushing the lines apart.
    <span className="relative -my-3 inline-flex h-12 items-center">
      <WorkedOutLink from={from} name={`${words}: how it is worked out`}>
        {words}
      </WorkedOutLink>
    </span>
  );
}

function BedMarks({ stay, now, timeZone }: Omit<BedHeaderProps, 'shown'>) {
  const since = (instant: string) => `since ${formatMoment(instant, now, timeZone)}`;
  const marks = [
    stay.precautions && { key: 'precautions', words: `Precautions: ${stay.precautions}` },
    stay.careLimits && { key: 'limits', words: `Care limits: ${stay.careLimits}` },
    stay.proneSinceAt && { key: 'prone', words: `Prone ${since(stay.proneSinceAt)}` },
    stay.away && {
      key: 'away',
      words: `Away${stay.away.to ? ` to ${stay.away.to}` : ''} ${since(stay.away.sinceAt)}`,
    },
    stay.trial && { key: 'trial', words: `Breathing trial ${since(stay.trial.startedAt)}` },
  ].filter((mark) => mark !== null && mark !== '');
  if (marks.length === 0 && !stay.difficultAirway) return null;
  return (
    <ul aria-label="Marks" className="flex min-w-0 flex-wrap gap-2">
      {stay.difficultAirway && (
        <li className="rounded-md bg-ink px-2.5 py-1 font-bold text-ground">Difficult airway</li>
      )}
      {marks.map(({ key, words }) => (
        <li
          key={key}
          className="wrap-break-word min-w-0 rounded-md border-2 border-ink px-2 py-0.5 font-bold"
        >
          {words}
        </li>
      ))}
    </ul>
  );
}
