import { instantMs } from '../units/instant.ts';
import { requireNumber, shown } from '../units/require-number.ts';
import { requireWord } from '../units/require-word.ts';

/** How far a fact can still be trusted, from its age alone. */
export type Freshness = 'current' | 'due' | 'overdue' | 'withdrawn' | 'never';

/** Ages in minutes at which a fact becomes due, overdue and withdrawn. */
export type AgeLadder = { dueFrom: number; overdueFrom: number; withdrawFrom: number };

const MINUTE_MS = 60_000;
const YEAR_MIN = 527_040;

/**
 * Where a fact stands on the age ladder. An age below zero (two clocks that disagree) counts as zero.
 *
 * @title Freshness of a fact
 * @formula `age = now − observedAt`; `current < dueFrom ≤ due < overdueFrom ≤ overdue < withdrawFrom ≤
 *   withdrawn`.
 * @valid for any fact with a time. A boundary belongs to the older state; equal boundaries leave a state out.
 *
 * @param input.kind kind of fact, text, a key of the policy.
 * @param input.observedAt when it was true, text, ISO 8601 with offset; `null` when nothing was ever recorded.
 * @param input.now the server’s clock, text, ISO 8601 with offset.
 * @param input.policy record of each kind’s three ages, minutes (0 to 527040), ascending.
 * @returns state: 'current', 'due', 'overdue' or 'withdrawn', and 'never' when `observedAt` is `null`.
 * @throws RangeError on a kind without a policy, text that is no instant, or ages that do not ascend.
 * @example { "kind": "check", "observedAt": "2026-03-05T06:00:00Z", "now": "2026-03-05T10:00:00Z", "policy": {
 *   "check": { "dueFrom": 210, "overdueFrom": 240, "withdrawFrom": 480 } } }
 *
 * @source common practice; each unit sets its own ages.
 */
export function freshness<Policy extends Readonly<Record<string, AgeLadder>>>({
  kind,
  observedAt,
  now,
  policy,
}: {
  kind: keyof Policy & string;
  observedAt: string | null;
  now: string;
  policy: Policy;
}): Freshness {
  const { dueFrom, overdueFrom, withdrawFrom } = ladderFor(kind, policy);
  const nowMs = instantMs('now', now);
  if (observedAt === null) return 'never';

  const ageMin = Math.max(0, nowMs - instantMs('observedAt', observedAt)) / MINUTE_MS;
  const oldestFirst = [
    { from: withdrawFrom, is: 'withdrawn' },
    { from: overdueFrom, is: 'overdue' },
    { from: dueFrom, is: 'due' },
  ] as const;
  return oldestFirst.find(({ from }) => ageMin >= from)?.is ?? 'current';
}

function ladderFor(kind: string, policy: Readonly<Record<string, AgeLadder>>): AgeLadder {
  if (typeof policy !== 'object' || policy === null) {
    throw new RangeError(`policy must give three ages for each kind, not ${shown(policy)}`);
  }
  requireWord('kind', kind, Object.keys(policy));
  const ladder = policy[kind];
  const from = `policy.${kind}`;
  if (!ladder) throw new RangeError(`${from} must give three ages, not ${shown(ladder)}`);
  requireNumber(`${from}.dueFrom`, ladder.dueFrom, [0, YEAR_MIN]);
  requireNumber(`${from}.overdueFrom`, ladder.overdueFrom, [ladder.dueFrom, YEAR_MIN]);
  requireNumber(`${from}.withdrawFrom`, ladder.withdrawFrom, [ladder.overdueFrom, YEAR_MIN]);
  return ladder;
}
