import type { PressureLadder } from '@windrow/ventilation/board/tile/pressure-ladder';

const TOP_CMH2O = 40;
/** The least distance of two numbers, in percent of the scale's height. */
const APART = 22;

export type LadderMarks = {
  block: { top: number; height: number; isMeasured: boolean } | null;
  base: number;
  peak: number | null;
  limit: number | null;
  numbers: { key: 'peak' | 'high'; value: number; top: number }[];
};

/** Where everything stands on the scale, in percent from its top. What is above 40 is clamped there, with its number. */
export function ladderMarks({ low, high, measured, peak, limit }: PressureLadder): LadderMarks {
  const base = fromTop(low);
  const top = high === null ? null : fromTop(high);
  return {
    base,
    block: top === null || top >= base ? null : { top, height: base - top, isMeasured: measured },
    peak: peak === null ? null : fromTop(peak),
    limit: limit === null ? null : fromTop(limit),
    numbers: numbersOf(high, peak),
  };
}

function fromTop(pressure: number): number {
  return (1 - Math.min(Math.max(pressure, 0), TOP_CMH2O) / TOP_CMH2O) * 100;
}

/** Numbers beside their marks, moved apart where they would touch; the peak stays above. */
function numbersOf(high: number | null, peak: number | null): LadderMarks['numbers'] {
  const highOnly = high !== null && { key: 'high' as const, value: high, top: inside(fromTop(high)) };
  if (peak === null || peak === high) return highOnly ? [highOnly] : [];
  const peakTop = inside(fromTop(peak));
  if (!highOnly) return [{ key: 'peak', value: peak, top: peakTop }];
  const middle = Math.min(Math.max((peakTop + highOnly.top) / 2, APART), 100 - APART);
  const half = Math.max(Math.abs(highOnly.top - peakTop), APART) / 2;
  const isClose = Math.abs(highOnly.top - peakTop) < APART;
  return [
    { key: 'peak', value: peak, top: isClose ? middle - half : peakTop },
    { ...highOnly, top: isClose ? middle + half : highOnly.top },
  ];
}

function inside(top: number): number {
  return Math.min(Math.max(top, APART / 2), 100 - APART / 2);
}
