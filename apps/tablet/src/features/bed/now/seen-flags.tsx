import type { Flag } from '@windrow/ventilation/contract/board';
import { formatMoment } from '@windrow/ventilation/format/clock';
import { WhyFlag } from './why-flag.tsx';

/** What somebody has acknowledged: still true, said quietly, with who, when and why. */
export function SeenFlags({
  flags,
  now,
  timeZone,
}: {
  flags: readonly Flag[];
  now: number;
  timeZone: string;
}) {
  const seen = flags.flatMap((flag) =>
    flag.acknowledged ? [{ flag, acknowledged: flag.acknowledged }] : [],
  );
  if (seen.length === 0) return null;
  return (
    <div className="mt-2 border-line border-t-2 pt-2">
      <h3 className="font-bold">Acknowledged</h3>
      <p className="text-ink-muted text-sm">Not shown on the wall. Each comes back when its values change.</p>
      <ul className="flex flex-col divide-y-2 divide-line">
        {seen.map(({ flag, acknowledged }) => (
          <li key={flag.id} className="flex flex-col items-start gap-1 py-2">
            <p className="rounded-md border-2 border-line-strong px-2 py-0.5 font-bold text-ink-muted leading-snug">
              {flag.short}
            </p>
            <p>{flag.sentence}</p>
            <p className="wrap-break-word w-full">
              <span className="text-ink-muted">
                {acknowledged.by}, {formatMoment(acknowledged.at, now, timeZone)}:
              </span>{' '}
              {acknowledged.note}
            </p>
            <WhyFlag flag={flag} />
          </li>
        ))}
      </ul>
    </div>
  );
}
