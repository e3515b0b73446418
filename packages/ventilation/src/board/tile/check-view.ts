import type { BedCheck, BedStay } from '../../contract/board.ts';
import { formatTime } from '../../format/clock.ts';
import { supportEntry } from '../../support/catalogue.ts';
import type { ShownBed } from '../shown-bed.ts';
import { tileCells } from '../tile-cells.ts';
import { aged, type GroupView, lastAt, type Reader } from './group-view.ts';
import { supportOfLastCheck } from './present-support.ts';
import { type PressureLadder, pressureLadder } from './pressure-ladder.ts';

export type CheckView = GroupView & { ladder: PressureLadder | null };

/** The check of a bed as its tile shows it; `stay` is what is left of it at this time. */
export function checkView({
  shown,
  stay,
  reader,
}: {
  shown: ShownBed;
  stay: BedStay;
  reader: Reader;
}): CheckView {
  const group = shown.groups.check;
  const base = { ...aged('check', group), remarks: [], ladder: null };
  if (group.state === 'never') return { ...base, body: { title: 'no check yet', detail: null } };
  const { check } = stay;
  if (!check) {
    const mode = supportOfLastCheck(shown);
    const detail = `last check ${lastAt(group, reader)}${mode ? `, ${mode}` : ''}`;
    return { ...base, body: { title: 'no current check', detail } };
  }
  if (isOfAnotherState(check, stay)) return { ...base, body: beforeTheChange(check, stay, reader) };
  const ladder = pressureLadder({ check, plateauLimitCmH2O: stay.plateauLimitCmH2O });
  return { ...base, ladder, body: { rows: tileCells(check) } };
}

function isOfAnotherState(check: BedCheck, { support }: BedStay): boolean {
  return check.changedSinceAt !== null || (support !== null && support.id !== check.mode);
}

/** Settings of what the patient no longer breathes with would be read as the present ones. */
function beforeTheChange(check: BedCheck, { support }: BedStay, { timeZone }: Reader) {
  const changed = check.changedSinceAt ?? support?.sinceAt ?? null;
  const when = changed === null ? '' : ` before change ${formatTime(changed, timeZone)}`;
  const title =
    support && support.id !== check.mode ? `no check on ${support.shortName} yet` : 'no check since change';
  return { title, detail: `${supportEntry(check.mode).shortName}${when}` };
}
