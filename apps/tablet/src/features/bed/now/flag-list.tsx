import { FlagChip } from '@windrow/ui/controls/flag-chip';
import type { Flag } from '@windrow/ventilation/contract/board';
import { useRef } from 'react';
import { AcknowledgeFlag } from './acknowledge-flag.tsx';
import { SeenFlags } from './seen-flags.tsx';
import { WhyFlag } from './why-flag.tsx';

type FlagListProps = {
  flags: readonly Flag[];
  stayId: string;
  mayRecord: boolean;
  now: number;
  timeZone: string;
};

/** Every flag in a sentence, with why it is raised; those that somebody has acknowledged below the others. */
export function FlagList({ flags, stayId, mayRecord, now, timeZone }: FlagListProps) {
  const title = useRef<HTMLHeadingElement>(null);
  const open = flags.filter(({ acknowledged }) => acknowledged === null);
  return (
    <section aria-labelledby="flags-title" className="rounded-xl bg-tile px-4 py-3">
      <h2 id="flags-title" ref={title} tabIndex={-1} className="font-bold text-lg">
        Flags
      </h2>
      {flags.length === 0 && (
        <p className="text-ink-muted">
          None from what is current. That is no clearance: look at the patient.
        </p>
      )}
      <ul className="flex flex-col divide-y-2 divide-line">
        {open.map((flag) => (
          <li key={flag.id} className="flex flex-col items-start gap-1 py-2">
            <FlagChip level={flag.level}>{flag.short}</FlagChip>
            <p>{flag.sentence}</p>
            <div className="flex w-full flex-wrap items-start justify-between gap-2">
              <WhyFlag flag={flag} />
              {mayRecord && (
                <AcknowledgeFlag flag={flag} stayId={stayId} onDone={() => title.current?.focus()} />
              )}
            </div>
          </li>
        ))}
      </ul>
      <SeenFlags flags={flags} now={now} timeZone={timeZone} />
    </section>
  );
}
