import type { BedStay } from '@windrow/ventilation/contract/board';
import { AIRWAY_FIELDS } from '@windrow/ventilation/entry/fields';
import { formatNumber, formatWithUnit } from '@windrow/ventilation/format/number';
import { AIRWAY_KIND_WORDS, DEPTH_MARK_WORDS, said } from './entry/words.ts';

/** "Oral tube 7.5, 22 cm at lip, cuffed": the device as it was placed. */
export function deviceInWords(device: NonNullable<BedStay['device']>): string {
  const { kind, sizeMm, depthCm, depthMark, cuffed, subglotticPort } = device;
  return [
    `${said(AIRWAY_KIND_WORDS, kind)} ${formatNumber(sizeMm, AIRWAY_FIELDS.sizeMm)}`,
    depthCm === null
      ? null
      : `${formatWithUnit(depthCm, AIRWAY_FIELDS.depthCm)}${depthMark ? ` at ${said(DEPTH_MARK_WORDS, depthMark).toLowerCase()}` : ''}`,
    cuffed ? 'cuffed' : 'no cuff',
    subglotticPort === true ? 'subglottic port' : null,
  ]
    .filter((part) => part !== null)
    .join(', ');
}
