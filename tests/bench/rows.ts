import { bedBoard } from '@windrow/ventilation/board/bed-board';
import type { StayFacts } from '@windrow/ventilation/board/facts';
import { tileView } from '@windrow/ventilation/board/tile/tile-view';
import type { Bed } from '@windrow/ventilation/contract/board';
import { DEFAULT_POLICY } from '@windrow/ventilation/policy/policy';
import { census } from '../../apps/wall/src/board/census.ts';
import { bigHouse, NOW } from './big-house.ts';

/**
 * What the pure part costs: the rows of a house of 500 beds on one core, and one second's tick of a wall with 40
 * tiles. Beside each stands a floor from this same run, since times alone tell of the machine: copying the same
 * row as text and back, which no way of making it could be asked to beat by much.
 */
const BEDS = 500;
const TILES = 40;
const WANTED_ROWS_PER_SECOND = 20_000;
const WANTED_TICK_MS = 2;
const ROUNDS = 5;
const ROUND_MS = 600;

const house = bigHouse(BEDS);
const rows = house.map((facts, at) => rowOf(facts, at));

// In turns, so that a busy moment of the machine falls on both; of each the best round, which is the least disturbed.
const best = { rows: 0, floor: 0 };
for (let round = 0; round < ROUNDS; round += 1) {
  best.rows = Math.max(
    best.rows,
    perSecond(() => house.forEach(rowOf), BEDS),
  );
  best.floor = Math.max(
    best.floor,
    perSecond(() => {
      for (const row of rows) JSON.parse(JSON.stringify(row));
    }, BEDS),
  );
}
const flags = rows.reduce((sum, { stay }) => sum + (stay?.flags.length ?? 0), 0);
say(`A house of ${BEDS} beds, ${(flags / BEDS).toFixed(1)} flags a bed, one core`);
say(`  rows a second      ${thousands(best.rows)}`);
say(
  `  floor, copied rows ${thousands(best.floor)} (a row costs ${(best.floor / best.rows).toFixed(2)} copies of it)`,
);
say(`  wanted ${thousands(WANTED_ROWS_PER_SECOND)}: ${verdict(best.rows >= WANTED_ROWS_PER_SECOND)}`);

const wall = rows.slice(0, TILES);
const ticks: number[] = [];
for (let second = 0; second < 2_000; second += 1) ticks.push(tick(wall, NOW + second * 1_000));
// The first ticks are those of a program that has not warmed up yet.
const settled = ticks.slice(200).sort((one, other) => one - other);
const copying = perSecond(() => {
  for (const row of wall) JSON.parse(JSON.stringify(row));
}, 1);
const middle = settled[Math.floor(settled.length / 2)] ?? Number.NaN;
const rare = settled[Math.floor(settled.length * 0.99)] ?? Number.NaN;
const first = ticks[0] ?? Number.NaN;
say(`A wall of ${TILES} tiles, each looked at each second (the words, their key, the counts of the head)`);
say(
  `  tick, middle ${middle.toFixed(3)} ms, 99 of 100 within ${rare.toFixed(3)} ms, the very first ${first.toFixed(2)} ms`,
);
say(`  floor, the same 40 rows copied ${(1_000 / copying).toFixed(3)} ms`);
say(`  wanted below ${WANTED_TICK_MS} ms: ${verdict(middle < WANTED_TICK_MS)}`);

function rowOf(facts: StayFacts, at: number): Bed {
  const place = { bedId: `b${at}`, unitId: 'u', label: String(at), row: 1, column: at, isOpen: true };
  return bedBoard({ place, revision: at, facts, policy: DEFAULT_POLICY, assignments: [], ventilator: null });
}

/** What the wall does with every tile each second before it draws: the view, and its key. */
function tick(beds: readonly Bed[], now: number): number {
  const from = performance.now();
  let length = 0;
  for (const bed of beds) {
    length += JSON.stringify(tileView({ bed, reader: { now, timeZone: 'Europe/London' } })).length;
  }
  const counts = census(beds, now);
  const took = performance.now() - from;
  if (length === 0 || counts.bedsEmpty > 0) throw new Error('the tiles say nothing');
  return took;
}

function perSecond(act: () => void, count: number): number {
  const from = performance.now();
  let done = 0;
  while (performance.now() - from < ROUND_MS) {
    act();
    done += count;
  }
  return (done / (performance.now() - from)) * 1_000;
}

function thousands(value: number): string {
  return Math.round(value).toLocaleString('en-GB');
}

function verdict(isMet: boolean): string {
  return isMet ? 'met' : 'not met';
}

function say(line: string): void {
  process.stdout.write(`${line}\n`);
}
