import type { Capacity } from '@windrow/ventilation/contract/fleet';
import { formatAge } from '@windrow/ventilation/format/age';
import { formatMoment, formatTimeWithSeconds } from '@windrow/ventilation/format/clock';
import { oldestCheck } from '../house/measures.ts';
import { answerFrom } from './answer.ts';
import { countState } from './count-age.ts';

/** The answer to the telephone, with its time. Like every value it ages, and is taken away when it is too old. */
export function AnswerCard({
  capacity,
  now,
  timeZone,
}: {
  capacity: Capacity;
  now: number;
  timeZone: string;
}) {
  const readAt = Date.parse(capacity.serverTime);
  const ageMs = Math.max(0, now - readAt);
  const state = countState(capacity, now);
  if (state === 'withdrawn') return <Withdrawn readAt={readAt} now={now} timeZone={timeZone} />;
  const { sentence, cautions } = answerFrom(capacity);
  const isOld = state === 'old';
  return (
    <section aria-labelledby="answer" className={`rounded-xl bg-tile p-5 ${isOld ? 'rake-wide' : ''}`}>
      <div className={isOld ? 'flex flex-col gap-2 rounded-lg bg-tile p-3' : 'flex flex-col gap-2'}>
        <p className="text-ink-muted">Can we take one more ventilated adult?</p>
        <h2 id="answer" className="font-bold text-2xl leading-tight sm:text-3xl">
          {sentence}
        </h2>
        {cautions.map((caution) => (
          <p key={caution} className="border-note border-l-4 pl-3">
            {caution}
          </p>
        ))}
        <p className="text-ink-muted">
          Counted at {formatTimeWithSeconds(readAt, timeZone)}
          {oldestFact({ capacity, now })}.
          {isOld && (
            <strong className="ml-2 rounded bg-ink px-2 text-ground">
              not renewed for {formatAge(ageMs / 60_000)}
            </strong>
          )}
        </p>
      </div>
    </section>
  );
}

function Withdrawn({ readAt, now, timeZone }: { readAt: number; now: number; timeZone: string }) {
  return (
    <section aria-labelledby="answer" className="rake-dense rounded-xl bg-tile p-5">
      <div className="flex flex-col gap-2 rounded-lg bg-tile p-3">
        <h2 id="answer" className="font-bold text-2xl sm:text-3xl">
          No current answer.
        </h2>
        <p>
          The server last counted at {formatMoment(readAt, now, timeZone)},{' '}
          <strong className="rounded bg-ink px-2 text-ground">
            {formatAge((now - readAt) / 60_000)} ago
          </strong>
          . Ask the units.
        </p>
      </div>
    </section>
  );
}

/** The oldest check that the counts rest on. */
function oldestFact({ capacity, now }: { capacity: Capacity; now: number }): string {
  const at = oldestCheck(capacity.units);
  return at === null ? '' : `; oldest check ${formatAge((now - at) / 60_000)}`;
}
