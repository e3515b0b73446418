import { useDraggable } from '@dnd-kit/core';
import type { ComponentProps } from 'react';
import type { BedWork } from './bed-work.ts';
import { inMinutes } from './words.ts';

const FACE =
  'flex h-full min-h-15 w-full select-none flex-col justify-center overflow-hidden rounded-lg border-2 px-2 text-left text-ink';

/** Who has a bed, in words for those who listen, and the initials of who stands in. */
export type Held = { words: string; cover: string | null };
type BlockProps = { work: BedWork; held: Held; onPress: () => void };

/** A bed that can be carried to another person, or pressed to see what it is made of. */
export function MovableBlock({ work, held, onPress }: BlockProps) {
  const { setNodeRef, attributes, listeners, isDragging } = useDraggable({
    id: work.bedId,
    attributes: { roleDescription: 'movable bed' },
  });
  return (
    <BlockButton
      {...attributes}
      {...listeners}
      ref={setNodeRef}
      work={work}
      held={held}
      isLifted={isDragging}
      onClick={onPress}
      // Firefox presses a button when space is let go, though the key was taken to lift it.
      onKeyUp={(event) => event.key === ' ' && event.preventDefault()}
    />
  );
}

/** The same bed for those who only look: it can be pressed, not moved. */
export function FixedBlock({ work, held, onPress }: BlockProps) {
  return <BlockButton work={work} held={held} isLifted={false} onClick={onPress} />;
}

type BlockButtonProps = ComponentProps<'button'> & { work: BedWork; held: Held; isLifted: boolean };

function BlockButton({ work, held, isLifted, ...rest }: BlockButtonProps) {
  const place = isLifted ? 'border-line border-dashed opacity-60' : 'border-block-soft bg-block-soft';
  return (
    <button
      type="button"
      id={blockId(work.bedId)}
      aria-label={`Bed ${work.label}, ${inMinutes(work.minutes.total)}, ${work.support ?? 'support not recorded'}, ${held.words}`}
      className={`${FACE} ${place} @container touch-manipulation`}
      {...rest}
    >
      <BlockWords work={work} cover={held.cover} />
    </button>
  );
}

/** A bed in the hand, over everything. */
export function CarriedBlock({ work }: { work: BedWork }) {
  return (
    <div className={`${FACE} @container border-note bg-tile`}>
      <BlockWords work={work} cover={null} />
    </div>
  );
}

/** The label always; then as much of the rest as the width allows. The whole is in the button's name. */
function BlockWords({ work, cover }: { work: BedWork; cover: string | null }) {
  return (
    <>
      <span className="flex items-baseline gap-2 whitespace-nowrap">
        <span className="font-bold text-lg leading-tight">{work.label}</span>
        <span className="hidden text-sm @min-[7rem]:inline">{work.support ?? 'not recorded'}</span>
      </span>
      <span className="whitespace-nowrap text-sm leading-tight">
        {Math.round(work.minutes.total)}
        <span className="hidden @min-[3.5rem]:inline"> min</span>
        {cover && <span className="hidden @min-[8rem]:inline"> · cover {cover}</span>}
      </span>
    </>
  );
}

export function blockId(bedId: string): string {
  return `bed-block-${bedId}`;
}
