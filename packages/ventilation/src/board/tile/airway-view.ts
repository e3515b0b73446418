import type { BedStay } from '../../contract/board.ts';
import type { AirwayKind, MASK_INTERFACES } from '../../contract/observations.ts';
import { AIRWAY_FIELDS } from '../../entry/fields.ts';
import { formatNumber } from '../../format/number.ts';
import { supportEntry } from '../../support/catalogue.ts';
import type { ShownBed } from '../shown-bed.ts';
import type { TileCell } from '../tile-cells.ts';
import { aged, type GroupView, lastAt, type Reader } from './group-view.ts';

type Device = NonNullable<BedStay['device']>;

const KINDS: Record<string, { label: string; words: string }> = {
  'oral-tube': { label: 'mm oral', words: 'oral tube' },
  'nasal-tube': { label: 'mm nasal', words: 'nasal tube' },
  tracheostomy: { label: 'mm trach', words: 'tracheostomy' },
  'laryngeal-mask': { label: 'laryngeal mask', words: 'laryngeal mask' },
} satisfies Record<AirwayKind, { label: string; words: string }>;

const MASKS: Record<(typeof MASK_INTERFACES)[number], string> = {
  'full-face': 'full-face mask',
  oronasal: 'oronasal mask',
  nasal: 'nasal mask',
  helmet: 'helmet',
};

/** The device in the airway, with depth and cuff while they are known; or the mask, or that there is neither. */
export function airwayView({
  shown,
  stay,
  reader,
}: {
  shown: ShownBed;
  stay: BedStay;
  reader: Reader;
}): GroupView {
  const { device, airway } = stay;
  const group = shown.groups.airway;
  if (!device) {
    const nothing = { state: 'never', age: null, ageWords: '' } as const;
    return { ...nothing, remarks: [], body: { title: withoutDevice(stay), detail: null } };
  }
  const base = { ...aged('airway', group), remarks: [] };
  if (!airway) {
    const size = formatNumber(device.sizeMm, AIRWAY_FIELDS.sizeMm);
    const title = group.state === 'never' ? 'depth and cuff not recorded' : 'no current depth, cuff';
    const last = group.state === 'never' ? '' : `, last ${lastAt(group, reader)}`;
    return { ...base, body: { title, detail: `${size} ${kindOf(device).label}${last}` } };
  }
  return {
    ...base,
    body: { rows: [[sizeCell(device), ...depthCells(device, airway), ...cuffCells(device, airway)]] },
  };
}

/** What the present support reaches the patient through; a mask of an earlier support says nothing. */
function withoutDevice({ check, support }: BedStay): string {
  if (!support) return '';
  const worn = check?.mode === support.id ? check.interface : null;
  switch (supportEntry(support.id).kind) {
    case 'mask':
      return worn ? MASKS[worn] : 'mask not recorded';
    case 'invasive':
      return 'no airway yet';
    case 'high-flow':
      return 'nasal cannula';
    default:
      return '';
  }
}

function kindOf({ kind }: Pick<Device, 'kind'>): { label: string; words: string } {
  return KINDS[kind] ?? { label: `mm ${kind}`, words: kind };
}

function sizeCell(device: Device): TileCell {
  const value = formatNumber(device.sizeMm, AIRWAY_FIELDS.sizeMm);
  const { label, words } = kindOf(device);
  return { key: 'size', value, label, words: `${words} ${value} mm` };
}

function depthCells({ depthMark }: Device, { depthCm }: NonNullable<BedStay['airway']>): TileCell[] {
  if (depthCm === null) return [];
  const value = formatNumber(depthCm, AIRWAY_FIELDS.depthCm);
  const mark = depthMark ?? '';
  return [
    { key: 'depth', value, label: `cm ${mark}`.trim(), words: `${value} cm${mark ? ` at the ${mark}` : ''}` },
  ];
}

function cuffCells({ cuffed }: Device, { cuffCmH2O }: NonNullable<BedStay['airway']>): TileCell[] {
  if (!cuffed) return [{ key: 'cuff', value: '–', label: 'no cuff', words: 'no cuff' }];
  if (cuffCmH2O === null)
    return [{ key: 'cuff', value: '–', label: 'cuff', words: 'cuff pressure not recorded' }];
  const value = formatNumber(cuffCmH2O, AIRWAY_FIELDS.cuffCmH2O);
  return [{ key: 'cuff', value, label: 'cuff', words: `cuff ${value} cmH2O` }];
}
