import {
  Capacity,
  NewVentilator,
  Ventilator,
  VentilatorMove,
  VentilatorMoved,
} from '@windrow/ventilation/contract/fleet';
import type { Knex } from 'knex';
import { bedById } from '../../queries/units.ts';
import { movePage, type VentilatorRow, ventilatorPage } from '../../queries/ventilators.ts';
import { addVentilator, moveVentilator, requireVentilator } from '../../services/move-ventilator.ts';
import { readCapacity } from '../../services/read-capacity.ts';
import { Paging, PagingBySequence, pageOf, toPage } from '../paging.ts';
import { type Route, read, write } from '../route.ts';
import { VentilatorParams } from './ids.ts';

export const fleetRoutes: Route[] = [
  read({
    path: '/api/capacity',
    summary: 'Machines by class and state, beds and support by unit: counts, now',
    response: Capacity,
    needs: { act: 'see-capacity', in: 'any' },
    handle: ({ deps }) => readCapacity(deps),
  }),
  read({
    path: '/api/ventilators',
    summary: 'The fleet',
    query: Paging,
    response: pageOf(Ventilator),
    needs: { act: 'see-fleet', in: 'any' },
    handle: async ({ deps, input: { query } }) => {
      const rows = await ventilatorPage(deps.db, { limit: query.limit + 1, after: query.cursor ?? null });
      return toPage(rows, query.limit, {
        item: (row) => toVentilator(row, row.bed_label),
        cursor: (row) => row.asset_number,
      });
    },
  }),
  write({
    method: 'post',
    path: '/api/ventilators',
    summary: 'Add a machine to the fleet',
    body: NewVentilator,
    response: Ventilator,
    status: 201,
    needs: { act: 'manage-fleet', in: () => null },
    handle: async ({ write, input }) => presentVentilator(write.trx, await addVentilator(write, input.body)),
  }),
  write({
    method: 'post',
    path: '/api/ventilators/:ventilatorId/moves',
    summary: 'Take into use, return, hold, lend a machine',
    params: VentilatorParams,
    body: VentilatorMove,
    response: Ventilator,
    status: 201,
    needs: { act: 'use-ventilator', in: 'any' },
    handle: async ({ write, input }) => {
      const ventilator = await requireVentilator(write.trx, input.params.ventilatorId);
      await moveVentilator(write, { ventilator, move: input.body });
      return presentVentilator(write.trx, ventilator.id);
    },
  }),
  read({
    path: '/api/ventilators/:ventilatorId/moves',
    summary: 'Where a machine was, newest first',
    params: VentilatorParams,
    query: PagingBySequence,
    response: pageOf(VentilatorMoved),
    needs: { act: 'see-fleet', in: 'any' },
    handle: async ({ deps, input: { params, query } }) => {
      const { id } = await requireVentilator(deps.db, params.ventilatorId);
      const rows = await movePage(deps.db, {
        ventilatorId: id,
        limit: query.limit + 1,
        before: query.cursor ?? null,
      });
      return toPage(rows, query.limit, {
        item: (row): VentilatorMoved => ({
          moveId: row.id,
          ventilatorId: row.ventilator_id,
          from: row.from_state,
          to: row.to_state,
          bedLabel: row.bed_label,
          unitId: row.unit_id,
          words: row.place_words,
          observedAt: row.observed_at,
          recordedAt: row.recorded_at,
          movedBy: row.display_name,
          note: row.note,
        }),
        cursor: (row) => String(row.sequence),
      });
    },
  }),
];

async function presentVentilator(db: Knex, id: string): Promise<Ventilator> {
  const row = await requireVentilator(db, id);
  return toVentilator(row, row.bed_id === null ? null : ((await bedById(db, row.bed_id))?.label ?? null));
}

function toVentilator(row: VentilatorRow, bedLabel: string | null): Ventilator {
  return {
    ventilatorId: row.id,
    assetNumber: row.asset_number,
    model: row.model,
    class: row.class,
    homeUnitId: row.home_unit_id,
    state: row.state,
    place: { unitId: row.unit_id, bedId: row.bed_id, bedLabel, words: row.place_words },
    sinceAt: row.since_at,
    version: row.version,
  };
}
