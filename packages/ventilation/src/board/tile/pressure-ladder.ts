import type { BedCheck } from '../../contract/board.ts';
import { supportEntry } from '../../support/catalogue.ts';
import { notPassiveWords, wasPassive } from '../passive-breath.ts';

/** What is drawn on the scale of 0 to 40 cmH2O beside the settings. */
export type PressureLadder = {
  low: number;
  /** Plateau where one was read of a passive breath; else the pressure that is set; null where neither is known. */
  high: number | null;
  /** Whether `high` is such a plateau, so that the block's height is the driving pressure. */
  measured: boolean;
  peak: number | null;
  /** The unit's plateau limit; null where no plateau can be meant (a mask). */
  limit: number | null;
  words: string;
};

type CheckToDraw = Pick<BedCheck, 'mode' | 'settings' | 'readings' | 'passive'>;

/** The pressures of one check, or null where the support has no such pressures. */
export function pressureLadder({
  check,
  plateauLimitCmH2O,
}: {
  check: CheckToDraw;
  plateauLimitCmH2O: number;
}): PressureLadder | null {
  const { mode, settings, readings } = check;
  const { kind } = supportEntry(mode);
  const low = settings.peepCmH2O ?? settings.pLowCmH2O ?? settings.epapCmH2O ?? settings.cpapCmH2O;
  if ((kind !== 'invasive' && kind !== 'mask') || low === undefined) return null;
  const plateau = readings.plateauCmH2O ?? null;
  const measured = plateau !== null && wasPassive(check);
  const drawn = {
    low,
    high: measured ? plateau : setPressure(check, low),
    measured,
    peak: readings.peakCmH2O ?? null,
    limit: kind === 'invasive' ? plateauLimitCmH2O : null,
  };
  const asEntered = plateau === null || measured ? null : `plateau ${plateau}, ${notPassiveWords(check)}`;
  return { ...drawn, words: inWords(drawn, asEntered) };
}

/** How high the mode itself pushes. A volume mode does not say. */
function setPressure({ mode, settings }: CheckToDraw, low: number): number | null {
  const { pInspCmH2O, psCmH2O, pHighCmH2O, ipapCmH2O } = settings;
  if (pHighCmH2O !== undefined) return pHighCmH2O;
  if (ipapCmH2O !== undefined) return ipapCmH2O;
  if (pInspCmH2O !== undefined) return low + pInspCmH2O;
  return mode === 'psv' && psCmH2O !== undefined ? low + psCmH2O : null;
}

function inWords(
  { low, high, measured, peak, limit }: Omit<PressureLadder, 'words'>,
  asEntered: string | null,
): string {
  const parts = [
    `lowest pressure ${low}`,
    high === null ? null : `${measured ? 'plateau' : 'set pressure'} ${high}`,
    asEntered,
    peak === null ? null : `peak ${peak}`,
    limit === null ? null : `plateau limit ${limit}`,
  ];
  return `${parts.filter((part) => part !== null).join(', ')} cmH2O`;
}
