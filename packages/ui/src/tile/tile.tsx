import type { TileView } from '@windrow/ventilation/board/tile/tile-view';
import { Age } from './age.tsx';
import { BedLabel } from './bed-label.tsx';
import { ChipRow } from './chip-row.tsx';
import { Group, rakeOf } from './group.tsx';
import { Ladder } from './ladder.tsx';
import { Marks, Who } from './spine.tsx';

/** `wide` has a spine at its left for bed and person; `narrow` and taller ones carry them in their head. */
export type TileShape = 'wide' | 'narrow';

/** One bed. It takes words and returns markup; what may be shown at this moment was decided in the view. */
export function Tile({ view: { label, name, content }, shape }: { view: TileView; shape: TileShape }) {
  if (content.kind !== 'stay') {
    return (
      <article className="tile tile-empty" data-shape={shape} aria-label={name}>
        <BedLabel label={label} />
        <p className="tile-nobody">{content.kind}</p>
      </article>
    );
  }
  const { mode, chips, seen, check, airway, gas } = content;
  return (
    <article className="tile" data-shape={shape} aria-label={name}>
      <div className="tile-spine">
        <BedLabel label={label} />
        <Who initials={content.initials} cover={content.cover} />
        <Marks marks={content.marks} />
      </div>
      <div className="tile-head">
        {mode !== null && (
          <strong className="tile-mode" data-long={mode.length > 8}>
            {mode}
          </strong>
        )}
        <ChipRow chips={chips} seen={seen} letters={lettersFor(shape, mode)} />
      </div>
      <Group group="check" view={check} />
      <div className={`tile-ladder ${check.state === 'withdrawn' ? rakeOf(check) : ''}`}>
        {check.ladder && <Ladder ladder={check.ladder} />}
      </div>
      <Age group="check" view={check} />
      <Group group="airway" view={airway} />
      <Age group="airway" view={airway} />
      <Group group="gas" view={gas} />
      <Age group="gas" view={gas} />
    </article>
  );
}

/** How many letters of chips there is room for; tile.css sets the sizes that make it so. */
function lettersFor(shape: TileShape, mode: string | null): number {
  return shape === 'wide' ? 37 - 1.7 * (mode?.length ?? 0) : 25;
}
