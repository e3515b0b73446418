import type { BedCheck } from '../contract/board.ts';
import { READING_FIELDS, type ReadingKey, SETTING_FIELDS, type SettingKey } from '../entry/fields.ts';
import { formatNumber } from '../format/number.ts';
import type { SupportId } from '../support/catalogue.ts';
import { tidalVolumeOf } from './derive-check.ts';

/** One value of a tile with what stands under it, and the same said in full for those who listen. */
export type TileCell = { key: string; value: string; label: string; words: string };

export type CheckToShow = Pick<BedCheck, 'mode' | 'settings' | 'readings' | 'passive' | 'derived'>;

/** A tile's two rows: what is moved, then the pressures and the oxygen it takes. */
export type TileCells = readonly [TileCell[], TileCell[]];

/** A value that the mode wants and nobody recorded. */
const MISSING = '–';

type Draw = (check: CheckToShow) => TileCell | null;

/**
 * The settings and readings by which a mode is known at a glance, few enough to be read from across the
 * room; all others are on the bed's page. A value that was not recorded is shown as missing.
 */
export function tileCells(check: CheckToShow): TileCells {
  const [above, below] = ROWS[check.mode];
  return [drawn(above, check), drawn(below, check)];
}

function drawn(row: readonly Draw[], check: CheckToShow): TileCell[] {
  return row.flatMap((draw) => draw(check) ?? []);
}

const PER_KG = { decimals: 1 } as const;

/** Per kg of predicted weight; where that is not known the volume itself, and the reason. Never a guess. */
const volume: Draw = (check) => {
  const ml = tidalVolumeOf(check);
  const { vtPerKgMl } = check.derived;
  const name = check.mode === 'aprv' ? 'release volume' : 'tidal volume';
  if (ml === null) return { key: 'vt', value: MISSING, label: 'mL/kg', words: `${name} not recorded` };
  if (vtPerKgMl === null) {
    const value = formatNumber(ml, READING_FIELDS.vtExhaledMl);
    return { key: 'vt', value, label: 'mL, no height', words: `${name} ${value} mL, no height` };
  }
  const value = formatNumber(vtPerKgMl, PER_KG);
  const label = check.mode === 'aprv' ? 'mL/kg release' : 'mL/kg';
  return { key: 'vt', value, label, words: `${name} ${value} mL per kg` };
};

/** Set and total side by side: their difference is what the patient adds. */
const rates: Draw = ({ settings, readings }) => {
  const set = settingText(settings, 'rateSetPerMin');
  const total = readingText(readings, 'rateTotalPerMin');
  const words = `rate ${said(set)} set, ${said(total)} in total, per minute`;
  return { key: 'rate', value: `${set}/${total}`, label: 'set/rate', words };
};

function set(key: SettingKey, label: string, { sign = '' }: { sign?: '+' | '' } = {}): Draw {
  return ({ settings }) => {
    const value = settingText(settings, key);
    return {
      key,
      value: value === MISSING ? value : sign + value,
      label,
      words: inWords(SETTING_FIELDS[key], value),
    };
  };
}

function read(key: ReadingKey, label: string): Draw {
  return ({ readings }) => {
    const value = readingText(readings, key);
    return { key, value, label, words: inWords(READING_FIELDS[key], value) };
  };
}

/** For what a mode can do without: nothing rather than a dash. */
function ifGiven(draw: Draw): Draw {
  return (check) => {
    const cell = draw(check);
    return cell?.value === MISSING ? null : cell;
  };
}

/** Two settings that are spoken of as one: 26/0. */
function pair(first: SettingKey, second: SettingKey, label: string): Draw {
  return ({ settings }) => {
    const [a, b] = [settingText(settings, first), settingText(settings, second)];
    const words = `${inWords(SETTING_FIELDS[first], a)}, ${inWords(SETTING_FIELDS[second], b)}`;
    return { key: first, value: `${a}/${b}`, label, words };
  };
}

const rox: Draw = ({ derived: { roxIndex } }) => {
  if (roxIndex === null) return null;
  const value = formatNumber(roxIndex, PER_KG);
  return { key: 'rox', value, label: 'ROX', words: `ROX index ${value}` };
};

function settingText(settings: CheckToShow['settings'], key: SettingKey): string {
  return text(settings[key], SETTING_FIELDS[key]);
}

function readingText(readings: CheckToShow['readings'], key: ReadingKey): string {
  return text(readings[key], READING_FIELDS[key]);
}

function text(value: number | undefined, field: Parameters<typeof formatNumber>[1]): string {
  return value === undefined ? MISSING : formatNumber(value, field);
}

function said(value: string): string {
  return value === MISSING ? 'not recorded' : value;
}

function inWords({ label, unit }: { label: string; unit: string }, value: string): string {
  return value === MISSING ? `${label} not recorded` : `${label} ${value} ${unit}`;
}

const rate = read('rateTotalPerMin', 'rate');
const peep = set('peepCmH2O', 'PEEP');
const support = set('psCmH2O', 'PS', { sign: '+' });
const inspiratory = set('pInspCmH2O', 'P insp', { sign: '+' });
const oxygen = set('fio2Percent', '% O2');
const flow = set('flowLMin', 'L/min');
const leak = read('leakLMin', 'leak L/min');
const spo2 = read('spo2Percent', '% SpO2');

const ROWS: Record<SupportId, readonly [readonly Draw[], readonly Draw[]]> = {
  'ac-vc': [
    [volume, rates],
    [peep, oxygen],
  ],
  'ac-pc': [
    [volume, rates],
    [inspiratory, peep, oxygen],
  ],
  'ac-vtpc': [
    [volume, rates],
    [peep, oxygen],
  ],
  'simv-vc': [
    [volume, rates],
    [support, peep, oxygen],
  ],
  'simv-pc': [
    [volume, rates],
    [inspiratory, peep, oxygen],
  ],
  psv: [
    [volume, rate],
    [support, peep, oxygen],
  ],
  cpap: [
    [volume, rate],
    [peep, oxygen],
  ],
  aprv: [
    [volume, rate],
    [pair('pHighCmH2O', 'pLowCmH2O', 'P hi/lo'), oxygen],
  ],
  hfov: [
    [set('meanPressureCmH2O', 'mean P'), set('amplitudeCmH2O', 'ampl.')],
    [set('frequencyHz', 'Hz'), oxygen],
  ],
  'niv-st': [
    [pair('ipapCmH2O', 'epapCmH2O', 'IPAP/EPAP'), rates],
    [leak, oxygen],
  ],
  'niv-cpap': [
    [set('cpapCmH2O', 'CPAP'), rate],
    [leak, oxygen],
  ],
  hfnc: [
    [flow, rate],
    [oxygen, rox],
  ],
  tpiece: [
    [rate, spo2],
    [oxygen, ifGiven(flow)],
  ],
  'trach-collar': [
    [rate, spo2],
    [oxygen, ifGiven(flow)],
  ],
  'low-flow': [
    [flow, rate],
    [spo2, ifGiven(oxygen)],
  ],
  'room-air': [[rate, spo2], []],
};
