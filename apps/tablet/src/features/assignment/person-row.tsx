import { useDroppable } from '@dnd-kit/core';
import type { Load } from '@windrow/ventilation/assignment/loads';
import type { ReactNode } from 'react';

/** One person's shift as a length: blocks for beds, a bar as long as their minutes, a mark where the shift's minutes end. */
export function PersonRow({
  load,
  scaleMinutes,
  aside,
  isOver,
  isTarget,
  children,
}: {
  /** With a carried bed counted in, where one hangs over this row. */
  load: Load;
  /** What the whole width stands for; the same in every row. */
  scaleMinutes: number;
  aside: string | null;
  isOver: boolean;
  isTarget: boolean;
  /** The blocks, as list items. */
  children: ReactNode;
}) {
  const { person, minutes, over } = load;
  const { setNodeRef } = useDroppable({ id: person.personId, disabled: !isTarget });
  const share = (part: number) => `${(part / scaleMinutes) * 100}%`;
  return (
    <li
      ref={setNodeRef}
      data-person={person.personId}
      className={`grid grid-cols-1 items-center gap-x-4 gap-y-2 rounded-xl border-2 bg-tile px-4 py-2 @md:grid-cols-[1fr_auto] @4xl:grid-cols-[13rem_1fr_7rem] ${isOver ? 'border-note' : 'border-tile'}`}
    >
      <div className="flex min-w-0 items-center gap-3">
        <span aria-hidden="true" className="rounded-md border-2 border-line px-2 py-1 font-bold">
          {person.initials}
        </span>
        <h2 className="min-w-0 text-base">
          <span className="block hyphens-auto break-words font-bold leading-tight">{person.displayName}</span>
          {aside && <span className="block text-ink-muted text-sm">{aside}</span>}
        </h2>
      </div>
      <Sum load={load} />
      <div className="relative row-start-3 @md:col-span-2 @md:row-start-2 @4xl:col-span-1 @4xl:col-start-2 @4xl:row-start-1">
        <span
          aria-hidden="true"
          className="pointer-events-none absolute -inset-y-1 w-1 -translate-x-1/2 bg-ink"
          style={{ left: share(person.minutesAvailable) }}
        />
        <ul
          aria-label={`Beds of ${person.displayName}`}
          className="relative flex min-h-16 flex-wrap items-stretch"
        >
          {children}
        </ul>
        <div aria-hidden="true" className="relative mt-1 h-3">
          <span className="absolute inset-x-0 top-1 h-1 bg-line" />
          <span className="absolute top-1 left-0 h-1 bg-ink" style={{ width: share(minutes - over) }} />
          <span
            className="absolute top-0 h-3 bg-flag"
            style={{ left: share(person.minutesAvailable), width: share(over) }}
          />
        </div>
      </div>
    </li>
  );
}

function Sum({ load: { minutes, person, over, left } }: { load: Load }) {
  return (
    <p className="flex flex-wrap items-baseline gap-x-2 @md:justify-end @4xl:col-start-3 @4xl:row-start-1 @4xl:flex-col">
      <span className="font-bold text-2xl leading-tight">{Math.round(minutes)}</span>
      <span className="text-ink-muted text-sm">of {person.minutesAvailable} min</span>
      {over > 0 ? (
        <span className="font-bold text-flag-text">
          <span aria-hidden="true">▲ </span>
          {Math.round(over)} over
        </span>
      ) : (
        <span className="text-ink-muted text-sm">{Math.round(left)} left</span>
      )}
    </p>
  );
}

/** A block's place in a row, as wide as its minutes but never too narrow to touch. */
export function BlockSlot({
  minutes,
  scaleMinutes,
  children,
}: {
  minutes: number;
  scaleMinutes: number;
  children?: ReactNode;
}) {
  return (
    <li className="min-w-13 p-0.5" style={{ width: `${(minutes / scaleMinutes) * 100}%` }}>
      {children}
    </li>
  );
}

/** Where a carried bed would come to lie. */
export function Ghost() {
  return <div aria-hidden="true" className="h-full min-h-15 rounded-lg border-2 border-note border-dashed" />;
}
