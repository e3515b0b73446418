import { Board } from '@windrow/ventilation/contract/board';
import type { BedChanged } from '@windrow/ventilation/contract/live';
import { PolicyVersion } from '@windrow/ventilation/contract/setup';
import { DEFAULT_POLICY } from '@windrow/ventilation/policy/policy';
import type { Caller } from './caller.ts';
import { anAdmission } from './entries.ts';
import type { House, HouseUnit } from './house.ts';
import type { Step } from './random-history.ts';
import { Moved, Placed, Recorded } from './shapes.ts';

export type Fact = {
  observationId: string;
  path: string;
  observedAt: string;
  order: number;
  support: string | null;
  stands: boolean;
};
export type LivedStay = {
  stayId: string;
  version: number;
  admittedAt: string;
  bedId: string | null;
  facts: Fact[];
  orders: { checkEveryMinutes: number | null; gasEveryMinutes: number | null };
};
type LivedUnit = HouseUnit & { policy: { version: number; freshness: typeof DEFAULT_POLICY.freshness } };
export type Snapshot = { at: string; board: Board };

/** Two units in which a history is lived, with what a careful person would have kept of it on paper. */
export class LivedHouse {
  readonly stays: LivedStay[] = [];
  readonly told: BedChanged[] = [];
  readonly snapshots: Snapshot[] = [];
  private order = 0;

  private constructor(
    private readonly house: House,
    private readonly charge: Caller,
    readonly units: LivedUnit[],
  ) {}

  static async open(house: House, charge: Caller, name: string): Promise<LivedHouse> {
    const units: LivedUnit[] = [];
    for (const half of ['A', 'B']) {
      const unit = await house.addUnit(`${name}${half}`, 2);
      units.push({ ...unit, policy: { version: 1, freshness: DEFAULT_POLICY.freshness } });
    }
    const lived = new LivedHouse(house, charge, units);
    const { live } = house.server.deps;
    house.server.deps.live = {
      ...live,
      tell: (tell) => {
        lived.told.push(...tell.beds);
        live.tell(tell);
      },
    };
    return lived;
  }

  get now(): string {
    return this.house.ago(0);
  }

  async board(unit: { unitId: string }, query = ''): Promise<Board> {
    return (await this.charge.get(`/api/units/${unit.unitId}/board${query}`)).as(Board);
  }

  unitOf(bedId: string): LivedUnit {
    const unit = this.units.find(({ bedIds }) => bedIds.includes(bedId));
    if (!unit) throw new Error('a bed of no unit');
    return unit;
  }

  private get present() {
    return this.stays.filter((stay): stay is LivedStay & { bedId: string } => stay.bedId !== null);
  }

  private get freeBeds() {
    const taken = this.present.map(({ bedId }) => bedId);
    return this.units.flatMap(({ bedIds }) => bedIds).filter((bedId) => !taken.includes(bedId));
  }

  /** Does one thing, where it can be done; a step that has nothing to be about is passed over. */
  async live(step: Step): Promise<void> {
    this.house.later(step.does === 'wait' ? step.minutes : 1 / 60);
    const pick = <T>(from: T[]): T | undefined => from[step.which % from.length];
    const observedAt = this.house.ago(step.agoMinutes);
    const [stay, freeBed] = [pick(this.present), pick(this.freeBeds)];
    if (step.does === 'admit' && freeBed) await this.admit(freeBed, observedAt, step.heightCm);
    if (step.does === 'policy') await this.setPolicy(pick(this.units), step);
    if (step.does === 'correct') await this.amend(pick, { observedAt, path: step.path, body: step.body });
    if (step.does === 'strike') await this.amend(pick, null);
    if (!stay) return;
    if (step.does === 'record') await this.record(stay, step, observedAt);
    if (step.does === 'orders') await this.setOrders(stay, step);
    const notBefore = observedAt < stay.admittedAt ? stay.admittedAt : observedAt;
    if (step.does === 'transfer' && freeBed) await this.transfer(stay, freeBed, notBefore);
    if (step.does === 'discharge') await this.discharge(stay, notBefore);
  }

  private async admit(bedId: string, observedAt: string, heightCm: number | null): Promise<void> {
    const admission = anAdmission(bedId, observedAt);
    const { stay } = (
      await this.charge.post('/api/stays', { ...admission, patient: { ...admission.patient, heightCm } })
    ).as(Placed);
    const orders = { checkEveryMinutes: null, gasEveryMinutes: null };
    this.stays.push({
      stayId: stay.stayId,
      version: 1,
      admittedAt: stay.admittedAt,
      bedId,
      facts: [],
      orders,
    });
  }

  private async record(
    stay: LivedStay,
    { path, body }: { path: string; body: Record<string, unknown> },
    observedAt: string,
  ) {
    const { observationId } = (
      await this.charge.post(`/api/stays/${stay.stayId}/${path}`, { ...body, observedAt })
    ).as(Recorded);
    this.keep(stay, { observationId, path, observedAt, support: supportIn(body) });
  }

  private keep(stay: LivedStay, fact: Omit<Fact, 'order' | 'stands'>): void {
    this.order += 1;
    stay.facts.push({ ...fact, order: this.order, stands: true });
  }

  /** Corrects a fact of the kind that the correction is of, or strikes any. */
  private async amend(
    pick: <T>(from: T[]) => T | undefined,
    correction: { observedAt: string; path: string; body: Record<string, unknown> } | null,
  ): Promise<void> {
    const all = this.stays.flatMap((stay) => stay.facts.map((fact) => ({ stay, fact })));
    const found = pick(
      all.filter(({ fact }) => fact.stands && (!correction || fact.path === correction.path)),
    );
    if (!found) return;
    const { stay, fact } = found;
    const body = correction && { ...correction.body, observedAt: correction.observedAt };
    const amendment = { reason: 'typed wrong', ...(body ? { as: 'corrected', body } : { as: 'struck' }) };
    const path = `/api/observations/${fact.observationId}/amendments`;
    const { observationId } = (await this.charge.post(path, amendment)).as(Recorded);
    fact.stands = false;
    if (correction) {
      const { observedAt } = correction;
      this.keep(stay, { observationId, path: fact.path, observedAt, support: supportIn(correction.body) });
    }
  }

  private async setOrders(
    stay: LivedStay,
    { checkEveryMinutes, gasEveryMinutes }: LivedStay['orders'],
  ): Promise<void> {
    const orders = { checkEveryMinutes, gasEveryMinutes };
    const reply = await this.charge.patch(`/api/stays/${stay.stayId}`, { orders }, { version: stay.version });
    stay.version = reply.as(Placed).stay.version;
    stay.orders = orders;
  }

  private async transfer(stay: LivedStay, bedId: string, observedAt: string): Promise<void> {
    const moved = (await this.charge.post(`/api/stays/${stay.stayId}/transfer`, { bedId, observedAt })).as(
      Moved,
    );
    stay.version = moved.stay.version;
    stay.bedId = bedId;
  }

  private async discharge(stay: LivedStay, observedAt: string): Promise<void> {
    const out = { outcome: 'ward', observedAt };
    (await this.charge.post(`/api/stays/${stay.stayId}/discharge`, out)).as(Placed);
    stay.bedId = null;
  }

  private async setPolicy(
    unit: LivedUnit | undefined,
    { check, airway, gas }: LivedUnit['policy']['freshness'],
  ): Promise<void> {
    if (!unit) return;
    const freshness = { check, airway, gas };
    const change = { policy: { ...DEFAULT_POLICY, freshness }, reason: 'as it was agreed' };
    const { version } = unit.policy;
    const reply = await this.charge.put(`/api/units/${unit.unitId}/policy`, change, { version });
    unit.policy = { version: reply.as(PolicyVersion).version, freshness };
  }

  async photograph(): Promise<void> {
    for (const unit of this.units) this.snapshots.push({ at: this.now, board: await this.board(unit) });
  }
}

function supportIn(body: Record<string, unknown>): string | null {
  const support = body.mode ?? body.toSupport;
  return typeof support === 'string' ? support : null;
}
