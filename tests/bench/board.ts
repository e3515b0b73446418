import { bedBoard } from '@windrow/ventilation/board/bed-board';
import { DEFAULT_POLICY } from '@windrow/ventilation/policy/policy';
import { insertObservation } from '../../apps/server/src/queries/observations.ts';
import { stayFacts } from '../../apps/server/src/queries/stay-facts.ts';
import { aCheck, aGas, anAirway } from '../support/entries.ts';
import { type House, type HouseUnit, openHouse } from '../support/house.ts';
import { temporaryFolder } from '../support/temporary-folder.ts';

/**
 * What a long stay costs, as ratios within this one run: a board read and a changed bed after one day of
 * history and after sixty. Both should stay near 1; times are printed for scale and belong to this machine.
 */
const DAYS = { short: 1, long: 60 };
const TIMES = 100;
const ROUNDS = 3;

/** Middle of the times of doing a thing again and again, ms. */
async function middle(times: number, act: (n: number) => Promise<unknown>): Promise<number> {
  const taken: number[] = [];
  for (let n = 0; n < times; n += 1) {
    const from = performance.now();
    await act(n);
    taken.push(performance.now() - from);
  }
  return taken.sort((one, other) => one - other)[Math.floor(times / 2)] ?? Number.NaN;
}

/** A stay with a check every 4 h, a gas every 6 h, cuff and depth every 8 h, and something happening twice a day. */
async function fill(house: House, stayId: string, unit: HouseUnit, days: number): Promise<number> {
  const recordedBy = house.personId('therapist');
  const facts: {
    kind: 'check' | 'gas' | 'airway' | 'airway-check' | 'happening';
    minutes: number;
    body: object;
  }[] = [];
  facts.push({ kind: 'airway', minutes: days * 1_440, body: anAirway('') });
  for (let minutes = days * 1_440 - 60; minutes > 0; minutes -= 60) {
    const hour = Math.round(minutes / 60);
    if (hour % 4 === 0)
      facts.push({ kind: 'check', minutes, body: aCheck('', { settings: { peepCmH2O: 8 + (hour % 5) } }) });
    if (hour % 6 === 0) facts.push({ kind: 'gas', minutes, body: aGas('') });
    if (hour % 8 === 0) facts.push({ kind: 'airway-check', minutes, body: { depthCm: 22, cuffCmH2O: 26 } });
    if (hour % 12 === 0)
      facts.push({ kind: 'happening', minutes, body: { kind: hour % 24 === 0 ? 'proned' : 'supine' } });
  }
  await house.db.transaction(async (trx) => {
    for (const { kind, minutes, body } of facts) {
      const { observedAt: _, ...rest } = body as { observedAt?: string };
      const at = house.ago(minutes);
      await insertObservation(trx, {
        id: crypto.randomUUID(),
        stay_id: stayId,
        unit_id: unit.unitId,
        kind,
        observed_at: at,
        recorded_at: at,
        recorded_by: recordedBy,
        source: 'hand',
        support: kind === 'check' ? 'ac-vc' : null,
        amends_id: null,
        amended_as: null,
        reason: null,
        body: JSON.stringify(rest),
      });
    }
  });
  return facts.length;
}

async function bench(): Promise<void> {
  const folder = temporaryFolder();
  const house = await openHouse({ database: `${folder.path}/windrow.sqlite3` });
  const charge = await house.addPerson('charge-of-all', [{ role: 'charge', unitId: null }]);
  const units = { short: await house.addUnit('Short', 8), long: await house.addUnit('Long', 8) };
  const stays = {
    short: (await house.admit(house.bed(units.short, 0))).stayId,
    long: (await house.admit(house.bed(units.long, 0))).stayId,
  };
  const facts = {
    short: await fill(house, stays.short, units.short, DAYS.short),
    long: await fill(house, stays.long, units.long, DAYS.long),
  };
  const costs: Record<string, (side: 'short' | 'long') => Promise<number>> = {
    'board read': (side) => middle(TIMES, () => charge.get(`/api/units/${units[side].unitId}/board`)),
    'bed change': (side) =>
      middle(TIMES, (n) =>
        charge.post(
          `/api/stays/${stays[side]}/checks`,
          aCheck(house.ago(0), { settings: { peepCmH2O: 5 + (n % 10) } }),
        ),
      ),
    'of it, facts': (side) => middle(TIMES, () => stayFacts(house.db, stays[side])),
    'look back': (side) =>
      middle(TIMES, () => charge.get(`/api/units/${units[side].unitId}/board?at=${house.ago(1)}`)),
  };

  say(
    `One stay of ${DAYS.short} day (${facts.short} facts) against one of ${DAYS.long} days (${facts.long} facts)`,
  );
  say(row('ms, middle', 'short', 'long', 'ratio'));
  for (const [name, cost] of Object.entries(costs)) {
    const best = { short: Number.POSITIVE_INFINITY, long: Number.POSITIVE_INFINITY };
    // In turns, so that a busy moment of the machine falls on both.
    for (let round = 0; round < ROUNDS; round += 1) {
      for (const side of ['short', 'long'] as const) best[side] = Math.min(best[side], await cost(side));
    }
    say(row(name, best.short.toFixed(2), best.long.toFixed(2), (best.long / best.short).toFixed(2)));
  }
  await benchRow(house, stays.long);
  await house.close();
  folder.remove();
}

/** The pure function alone: how many rows of a long stay one core makes in a second. */
async function benchRow(house: House, stayId: string): Promise<void> {
  const facts = await stayFacts(house.db, stayId);
  const place = { bedId: 'b', unitId: 'u', label: '01', row: 1, column: 1, isOpen: true };
  const from = performance.now();
  let made = 0;
  while (performance.now() - from < 1_000) {
    for (let n = 0; n < 100; n += 1)
      bedBoard({ place, revision: n, facts, policy: DEFAULT_POLICY, assignments: [], ventilator: null });
    made += 100;
  }
  say(`bedBoard makes ${Math.round((made / (performance.now() - from)) * 1_000)} rows a second`);
}

const row = (name: string, ...cells: string[]) =>
  [name.padEnd(14), ...cells.map((cell) => cell.padStart(9))].join('');

function say(line: string): void {
  process.stdout.write(`${line}\n`);
}

await bench();
