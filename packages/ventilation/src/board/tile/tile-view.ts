import type { Bed, BedStay } from '../../contract/board.ts';
import { formatTime } from '../../format/clock.ts';
import { type ShownBed, shownBed } from '../shown-bed.ts';
import { airwayView } from './airway-view.ts';
import { type CheckView, checkView } from './check-view.ts';
import { gasView } from './gas-view.ts';
import type { GroupView, Reader } from './group-view.ts';
import { presentSupport } from './present-support.ts';
import { trialChip } from './trial-chip.ts';

/** A word about the patient that must be seen before anything is done at the bed. */
export type TileMark = { key: 'prone' | 'difficult-airway' | 'away'; lines: readonly string[] };

export type TileChip = { id: string; short: string; level: 'note' | 'attention' };

/** All that one tile shows, as words. Equal views look the same, so a tile is drawn anew only when this differs. */
export type TileView = {
  bedId: string;
  label: string;
  /** For those who listen: "Bed 03, AC/PC, check overdue 4 hours 35 minutes". */
  name: string;
  content:
    | { kind: 'empty' | 'closed' }
    | {
        kind: 'stay';
        /** Null: nobody has the bed in this shift. */
        initials: string | null;
        cover: string | null;
        mode: string | null;
        marks: readonly TileMark[];
        /** The flags that nobody has acknowledged. */
        chips: readonly TileChip[];
        /** How many more somebody has, with the values that they rest on. */
        seen: number;
        check: CheckView;
        airway: GroupView;
        gas: GroupView;
      };
};

/**
 * A bed as its tile shows it at one moment. No name of a patient is in it, whoever asks.
 *
 * @param input.reader server time in epoch milliseconds, and the unit's time zone.
 */
export function tileView({ bed, reader }: { bed: Bed; reader: Reader }): TileView {
  const shown = shownBed({ bed, now: reader.now });
  const { stay } = shown.bed;
  const place = { bedId: bed.bedId, label: bed.label };
  if (!stay) {
    const kind = bed.isOpen ? 'empty' : 'closed';
    return { ...place, name: `Bed ${bed.label}, ${kind}`, content: { kind } };
  }
  const mode = presentSupport({ shown, now: reader.now })?.shortName ?? null;
  const check = checkView({ shown, stay, reader });
  return {
    ...place,
    name: nameOf({ label: bed.label, mode, check }),
    content: {
      kind: 'stay',
      initials: shown.assignment?.initials ?? null,
      cover: shown.assignment?.coverInitials ?? null,
      mode,
      marks: marksOf(stay, reader),
      ...flagsOf(shown, reader),
      check,
      airway: airwayView({ shown, stay, reader }),
      gas: gasView({ shown, stay, reader }),
    },
  };
}

function nameOf({ label, mode, check }: { label: string; mode: string | null; check: CheckView }): string {
  return [`Bed ${label}`, mode, check.ageWords].filter((part) => part !== null).join(', ');
}

function marksOf({ proneSinceAt, difficultAirway, away }: BedStay, { timeZone }: Reader): TileMark[] {
  const marks: TileMark[] = [];
  if (away) marks.push({ key: 'away', lines: ['away', formatTime(away.sinceAt, timeZone)] });
  if (difficultAirway) marks.push({ key: 'difficult-airway', lines: ['difficult', 'airway'] });
  if (proneSinceAt !== null) marks.push({ key: 'prone', lines: ['prone'] });
  return marks;
}

/** Attention before notes, of which a running trial is the first; else as the rules have them. What was acknowledged is only counted. */
function flagsOf({ bed }: ShownBed, { now }: Reader): { chips: TileChip[]; seen: number } {
  const flags = bed.stay?.flags ?? [];
  const open = flags.filter(({ acknowledged }) => acknowledged === null);
  const chips = open.map(({ id, short, level }) => ({ id, short, level }));
  const trial = trialChip({ trial: bed.stay?.trial ?? null, now });
  const inOrder = [
    ...chips.filter(({ level }) => level === 'attention'),
    ...(trial ? [trial] : []),
    ...chips.filter(({ level }) => level === 'note'),
  ];
  return { chips: inOrder, seen: flags.length - open.length };
}
