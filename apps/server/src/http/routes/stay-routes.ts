import { Bed } from '@windrow/ventilation/contract/board';
import { Id } from '@windrow/ventilation/contract/instant';
import {
  Acknowledgement,
  Amendment,
  RECORDED_KINDS,
  RecordEntry,
  type RecordedKind,
} from '@windrow/ventilation/contract/observations';
import { Admission, Discharge, Stay, StayCorrection, Transfer } from '@windrow/ventilation/contract/stays';
import { may } from '@windrow/ventilation/permissions/permissions';
import { z } from 'zod';
import { notAllowed, staleVersion } from '../../errors.ts';
import { stayVersionBy } from '../../queries/observations.ts';
import { acknowledgeFlag } from '../../services/acknowledge-flag.ts';
import { amendObservation } from '../../services/amend-observation.ts';
import { admitStay, correctStay, dischargeStay, transferStay } from '../../services/place-stay.ts';
import { readRecord } from '../../services/read-record.ts';
import { recordObservation } from '../../services/record-observation.ts';
import { Paging, pageOf } from '../paging.ts';
import { type Route, read, write } from '../route.ts';
import {
  inUnitOfStay,
  ObservationParams,
  requireBed,
  requireObservation,
  requireStay,
  StayParams,
} from './ids.ts';

const Placed = z.object({ stay: Stay, bed: Bed });
const Recorded = z.object({ observationId: Id, revision: z.number().int().nullable(), bed: Bed.nullable() });

export const stayRoutes: Route[] = [
  write({
    method: 'post',
    path: '/api/stays',
    summary: 'Admit a patient to a bed',
    body: Admission,
    response: Placed,
    status: 201,
    needs: { act: 'place-stay', in: async ({ db }, { body }) => (await requireBed(db, body.bedId)).unit_id },
    handle: ({ write, input }) => admitStay(write, input.body),
  }),
  write({
    method: 'patch',
    path: '/api/stays/:stayId',
    summary: 'Correct identity or orders',
    versioned: true,
    params: StayParams,
    body: StayCorrection,
    response: Placed,
    needs: { act: 'place-stay', in: inUnitOfStay },
    handle: async ({ write, input, version }) => {
      const stay = await requireStay(write.trx, input.params.stayId);
      if (version !== stay.version) {
        const { by, at } = await stayVersionBy(write.trx, stay.id);
        throw staleVersion({ thing: 'stay', given: version, current: stay.version, by, at });
      }
      return correctStay(write, { stay, correction: input.body });
    },
  }),
  write({
    method: 'post',
    path: '/api/stays/:stayId/transfer',
    summary: 'Move a stay to another bed',
    params: StayParams,
    body: Transfer,
    response: z.object({ stay: Stay, beds: z.array(Bed) }),
    needs: { act: 'place-stay', in: inUnitOfStay },
    handle: async ({ write, input }) => {
      const to = await requireBed(write.trx, input.body.bedId);
      if (!may(write.person.grants, 'place-stay', to.unit_id))
        throw notAllowed(
          'The other bed is in a unit where you place no patients; ask its charge therapist or the supervisor.',
        );
      return transferStay(write, {
        stay: await requireStay(write.trx, input.params.stayId),
        transfer: input.body,
      });
    },
  }),
  write({
    method: 'post',
    path: '/api/stays/:stayId/discharge',
    summary: 'End a stay',
    params: StayParams,
    body: Discharge,
    response: Placed,
    needs: { act: 'place-stay', in: inUnitOfStay },
    handle: async ({ write, input }) =>
      dischargeStay(write, {
        stay: await requireStay(write.trx, input.params.stayId),
        discharge: input.body,
      }),
  }),
  ...recordRoutes(),
  write({
    method: 'post',
    path: '/api/stays/:stayId/acknowledgements',
    summary: 'Acknowledge a flag with a note, until what it rests on changes',
    params: StayParams,
    body: Acknowledgement,
    response: Recorded,
    status: 201,
    needs: { act: 'record', in: inUnitOfStay },
    handle: async ({ write, input }) =>
      acknowledgeFlag(write, {
        stay: await requireStay(write.trx, input.params.stayId),
        entry: input.body,
      }),
  }),
  write({
    method: 'post',
    path: '/api/observations/:observationId/amendments',
    summary: 'Correct a fact, or strike it out, with a reason',
    params: ObservationParams,
    body: Amendment,
    response: Recorded,
    status: 201,
    needs: {
      act: 'amend-own',
      in: async ({ db }, { params }) =>
        (await requireStay(db, (await requireObservation(db, params.observationId)).stay_id)).unit_id,
    },
    handle: async ({ write, input }) =>
      amendObservation(write, {
        observation: await requireObservation(write.trx, input.params.observationId),
        amendment: input.body,
      }),
  }),
  read({
    path: '/api/stays/:stayId/record',
    summary: 'The whole record of a stay, newest first',
    params: StayParams,
    query: Paging,
    response: pageOf(RecordEntry),
    needs: { act: 'see-people', in: inUnitOfStay },
    handle: ({ deps, input: { params, query } }) =>
      readRecord(deps.db, { stayId: params.stayId, limit: query.limit, cursor: query.cursor ?? null }),
  }),
];

/** One route for each kind of fact, all alike: the kinds' own schemas are the difference. */
function recordRoutes(): Route[] {
  return Object.entries(RECORDED_KINDS).map(([kind, { path, label, schema }]) =>
    write<typeof StayParams, z.ZodType<{ observedAt: string }>>({
      method: 'post',
      path: `/api/stays/:stayId/${path}`,
      summary: `Record: ${label.toLowerCase()}`,
      params: StayParams,
      body: schema,
      response: Recorded,
      status: 201,
      needs: { act: 'record', in: inUnitOfStay },
      handle: async ({ write, input }) =>
        recordObservation(write, {
          stay: await requireStay(write.trx, input.params.stayId),
          kind: kind as RecordedKind,
          entry: { ...input.body },
        }),
    }),
  );
}
