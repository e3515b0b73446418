import { DEFAULT_POLICY } from '@windrow/ventilation/policy/policy';
import type { Asking, Caller } from '../../support/caller.ts';
import { aCheck, aGas, anAdmission, anAirway } from '../../support/entries.ts';
import { PASSWORD } from '../../support/house.ts';
import { Recorded } from '../../support/shapes.ts';
import type { Place, Scene } from './scene.ts';

type Ground = { scene: Scene; place: Place; caller: Caller | null; number: number };
export type Probe = Asking & {
  path: string;
  /** Somebody else asks in place of the caller, whose session must outlive the question. */
  as?: Caller;
  /** Makes undone what an allowed probe did. */
  after?: () => Promise<unknown>;
};

/** A version that nothing has: whoever may replace the thing gets as far as "changed by somebody else". */
const STALE = 9_999;

const under = ({ place }: Ground, rest: string) => ({ path: `/api/units/${place.unitId}/${rest}` });
const onStay = ({ place }: Ground, rest: string) => ({ path: `/api/stays/${place.stayId}/${rest}` });
const now = ({ scene }: Ground) => scene.house.ago(0);

/**
 * For each route a request that reaches the question whether it is allowed – real ids, a body that its schema
 * takes, a key – and then does no harm: what it asks for is taken, stale, or only one more entry.
 */
export const PROBES: Record<string, (ground: Ground) => Probe | Promise<Probe>> = {
  'GET /api/health': () => ({ path: '/api/health' }),
  'GET /api/start': () => ({ path: '/api/start' }),
  'GET /api/openapi.json': () => ({ path: '/api/openapi.json' }),
  'POST /api/start/administrator': () => ({
    path: '/api/start/administrator',
    body: { username: 'second', displayName: 'Second Root', password: PASSWORD },
  }),
  'POST /api/session': async ({ scene, caller }) => ({
    path: '/api/session',
    body: { username: 'therapist2', password: PASSWORD },
    ...(caller ? await askedOnce(scene) : {}),
  }),
  'GET /api/session': () => ({ path: '/api/session' }),
  'DELETE /api/session': async ({ scene, caller }) => ({
    path: '/api/session',
    ...(caller ? await askedOnce(scene) : {}),
  }),
  'GET /api/units': () => ({ path: '/api/units' }),

  'GET /api/units/:unitId/board': (ground) => under(ground, 'board'),
  'GET /api/stays/:stayId/record': (ground) => onStay(ground, 'record'),
  'GET /api/stays/:stayId/surveillance': (ground) => onStay(ground, 'surveillance'),
  'POST /api/stays/:stayId/infection-signs': (ground) => ({
    ...onStay(ground, 'infection-signs'),
    body: { observedAt: now(ground), sign: 'temperature', temperatureC: 38.4 },
  }),
  'GET /api/stays/:stayId/trials': (ground) => onStay(ground, 'trials'),
  'POST /api/stays': (ground) => ({
    path: '/api/stays',
    body: anAdmission(ground.place.takenBedId, now(ground)),
  }),
  'PATCH /api/stays/:stayId': ({ place }) => ({
    path: `/api/stays/${place.stayId}`,
    body: { difficultAirway: true },
    version: STALE,
  }),
  'POST /api/stays/:stayId/transfer': (ground) => ({
    ...onStay(ground, 'transfer'),
    body: { bedId: ground.place.takenBedId, observedAt: now(ground) },
  }),
  'POST /api/stays/:stayId/discharge': (ground) => ({
    ...onStay(ground, 'discharge'),
    body: { outcome: 'ward', observedAt: '2020-01-01T00:00:00Z' },
  }),
  'POST /api/stays/:stayId/checks': (ground) => ({ ...onStay(ground, 'checks'), body: aCheck(now(ground)) }),
  'POST /api/stays/:stayId/gases': (ground) => ({ ...onStay(ground, 'gases'), body: aGas(now(ground)) }),
  'POST /api/stays/:stayId/airways': (ground) => ({
    ...onStay(ground, 'airways'),
    body: anAirway(now(ground)),
  }),
  'POST /api/stays/:stayId/airway-checks': (ground) => ({
    ...onStay(ground, 'airway-checks'),
    body: { observedAt: now(ground), secured: true },
  }),
  'POST /api/stays/:stayId/happenings': (ground) => ({
    ...onStay(ground, 'happenings'),
    body: { observedAt: now(ground), kind: 'proned' },
  }),
  'POST /api/stays/:stayId/acknowledgements': (ground) => ({
    ...onStay(ground, 'acknowledgements'),
    body: { observedAt: now(ground), flagId: 'none', fingerprint: 'none', note: 'seen at the bed' },
  }),
  'POST /api/observations/:observationId/amendments': async (ground) => ({
    path: `/api/observations/${await ownObservation(ground)}/amendments`,
    body: { as: 'struck', reason: 'wrong patient' },
  }),

  'GET /api/units/:unitId/colleagues': (ground) => under(ground, 'colleagues'),
  'GET /api/units/:unitId/shifts': (ground) => under(ground, 'shifts'),
  'GET /api/shifts/:shiftId/assignment': ({ place }) => ({ path: `/api/shifts/${place.shiftId}/assignment` }),
  'POST /api/units/:unitId/shifts': (ground) => ({
    ...under(ground, 'shifts'),
    body: {
      name: 'Day',
      startsAt: now(ground),
      endsAt: ground.scene.house.ago(-60),
      people: [{ personId: 'nobody', minutesAvailable: 60 }],
    },
  }),
  'PUT /api/shifts/:shiftId/assignment': ({ place }) => ({
    path: `/api/shifts/${place.shiftId}/assignment`,
    body: { places: [], publish: true },
    version: STALE,
  }),

  'GET /api/capacity': () => ({ path: '/api/capacity' }),
  'GET /api/ventilators': () => ({ path: '/api/ventilators' }),
  'GET /api/ventilators/:ventilatorId/moves': ({ scene }) => ({
    path: `/api/ventilators/${scene.machineId}/moves`,
  }),
  'POST /api/ventilators': () => ({
    path: '/api/ventilators',
    body: { assetNumber: 'V-X', model: 'Model T', class: 'adult-icu', homeUnitId: 'nowhere' },
  }),
  'POST /api/ventilators/:ventilatorId/moves': async ({ scene, place, number }) => {
    const { ventilatorId } = await scene.house.readyMachine(`V-${number}`, place.unitId);
    const path = `/api/ventilators/${ventilatorId}/moves`;
    const clean = () => scene.inHospital.biomedical.post(path, { state: 'cleaning' });
    return { path, body: { state: 'in-use', bedId: place.freeBedId }, after: clean };
  },

  'POST /api/units': () => ({ path: '/api/units', body: { name: 'Alder', timeZone: 'Europe/London' } }),
  'GET /api/units/:unitId/beds': (ground) => under(ground, 'beds'),
  'POST /api/units/:unitId/beds': (ground) => ({
    ...under(ground, 'beds'),
    body: { label: '01', row: 9, column: 9 },
  }),
  'PATCH /api/beds/:bedId': ({ place }) => ({
    path: `/api/beds/${place.takenBedId}`,
    body: { isOpen: false },
  }),
  'GET /api/units/:unitId/policy': (ground) => under(ground, 'policy'),
  'PUT /api/units/:unitId/policy': (ground) => ({
    ...under(ground, 'policy'),
    body: { policy: DEFAULT_POLICY, reason: 'as it was' },
    version: STALE,
  }),
  'GET /api/people': () => ({ path: '/api/people' }),
  'POST /api/people': () => ({
    path: '/api/people',
    body: {
      username: 'therapist',
      displayName: 'Twice Here',
      initials: 'TH',
      password: PASSWORD,
      grants: [],
    },
  }),
  'PATCH /api/people/:personId': ({ scene }) => ({
    path: `/api/people/${scene.house.personId('therapist2')}`,
    body: { disabled: false },
    version: STALE,
  }),
  'GET /api/audit': () => ({ path: '/api/audit' }),
};

/** Somebody whose session may end with the question. */
async function askedOnce({ house }: Scene): Promise<{ as: Caller }> {
  const once = house.anybody();
  await once.signIn('therapist2', PASSWORD);
  return { as: once };
}

/** A fact that the caller recorded, where they may record; somebody else's where they may not. */
async function ownObservation({ scene, place, caller }: Ground): Promise<string> {
  const reply = await caller?.post(`/api/stays/${place.stayId}/checks`, aCheck(scene.house.ago(0)));
  return reply?.status === 201 ? reply.as(Recorded).observationId : place.observationId;
}
