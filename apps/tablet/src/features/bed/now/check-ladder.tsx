import '@windrow/ui/tile/ladder.css';
import { Ladder } from '@windrow/ui/tile/ladder';
import { pressureLadder } from '@windrow/ventilation/board/tile/pressure-ladder';
import type { BedCheck } from '@windrow/ventilation/contract/board';
import type { CSSProperties } from 'react';

/** The wall's own drawing, in the sizes of a page: a unit of it is a pixel here. */
const PAGE_UNIT: CSSProperties & { '--u': string } = { '--u': '1px' };

/** PEEP to plateau on a still scale, the peak and the unit's limit beside it. */
export function CheckLadder({ check, plateauLimitCmH2O }: { check: BedCheck; plateauLimitCmH2O: number }) {
  const ladder = pressureLadder({ check, plateauLimitCmH2O });
  if (ladder === null) return null;
  return (
    <div style={PAGE_UNIT} className="grid h-48 w-16 shrink-0 text-sm">
      <Ladder ladder={ladder} />
    </div>
  );
}
