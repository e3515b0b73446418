import type { BedGas, BedStay } from '../../contract/board.ts';
import { GAS_FIELDS, type GasKey } from '../../entry/fields.ts';
import { formatNumber, formatWithUnit } from '../../format/number.ts';
import type { ShownBed } from '../shown-bed.ts';
import type { TileCell } from '../tile-cells.ts';
import { aged, beforeChange, type GroupView, lastAt, type Reader } from './group-view.ts';

/** The latest gas, marked where it was drawn from elsewhere than an artery or before a change of settings. */
export function gasView({
  shown,
  stay,
  reader,
}: {
  shown: ShownBed;
  stay: BedStay;
  reader: Reader;
}): GroupView {
  const group = shown.groups.gas;
  const base = { ...aged('gas', group), remarks: [] };
  if (group.state === 'never') return { ...base, body: { title: 'no gas yet', detail: null } };
  const { gas } = stay;
  if (!gas)
    return { ...base, body: { title: 'no current gas', detail: `last gas ${lastAt(group, reader)}` } };
  const remarks = [
    ...(gas.site === 'arterial' ? [] : [gas.site]),
    ...beforeChange(gas.changedSinceAt, reader),
  ];
  return {
    ...base,
    remarks,
    body: { rows: [[cell(gas, 'ph'), cell(gas, 'pco2MmHg'), cell(gas, 'po2MmHg'), ...pfCells(gas)]] },
  };
}

function cell({ values }: BedGas, key: GasKey): TileCell {
  const field = GAS_FIELDS[key];
  const value = values[key];
  const text = value === undefined ? '–' : formatNumber(value, field);
  const words =
    value === undefined ? `${field.label} not recorded` : `${field.label} ${formatWithUnit(value, field)}`;
  return { key, value: text, label: field.short, words };
}

function pfCells({ pfMmHg }: BedGas): TileCell[] {
  if (pfMmHg === null) return [];
  const value = formatNumber(pfMmHg, { decimals: 0 });
  return [{ key: 'pf', value, label: 'P/F', words: `P/F ${value} mmHg` }];
}
