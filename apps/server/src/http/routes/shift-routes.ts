import {
  Assignment,
  AssignmentInput,
  Colleague,
  NewShift,
  Shift,
} from '@windrow/ventilation/contract/shifts';
import type { Deps } from '../../deps.ts';
import { colleaguesOfUnit } from '../../queries/people.ts';
import { shiftPage } from '../../queries/shifts.ts';
import {
  makeShift,
  putAssignment,
  readAssignment,
  readShift,
  requireShift,
} from '../../services/plan-shift.ts';
import { PagingByTime, pageOf } from '../paging.ts';
import { type Route, read, write } from '../route.ts';
import { inUnit, ShiftParams, UnitParams } from './ids.ts';

const inUnitOfShift = async ({ db }: Deps, { params }: { params: { shiftId: string } }) =>
  (await requireShift(db, params.shiftId)).unit_id;

export const shiftRoutes: Route[] = [
  read({
    path: '/api/units/:unitId/colleagues',
    summary: 'Who can be put on a shift of this unit',
    params: UnitParams,
    response: pageOf(Colleague),
    needs: { act: 'see-shifts', in: inUnit },
    handle: async ({ deps, input: { params } }) => ({
      items: (await colleaguesOfUnit(deps.db, params.unitId)).map(({ id, display_name, initials }) => ({
        personId: id,
        displayName: display_name,
        initials,
      })),
      nextCursor: null,
    }),
  }),
  read({
    path: '/api/units/:unitId/shifts',
    summary: 'Shifts of a unit, the latest first',
    params: UnitParams,
    query: PagingByTime,
    response: pageOf(Shift),
    needs: { act: 'see-shifts', in: inUnit },
    handle: async ({ deps, input: { params, query } }) => {
      const rows = await shiftPage(deps.db, {
        unitId: params.unitId,
        limit: query.limit + 1,
        before: query.cursor ?? null,
      });
      const page = rows.slice(0, query.limit);
      const shifts: Shift[] = [];
      for (const row of page) shifts.push(await readShift(deps.db, row));
      return {
        items: shifts,
        nextCursor: rows.length > query.limit ? (page.at(-1)?.starts_at ?? null) : null,
      };
    },
  }),
  write({
    method: 'post',
    path: '/api/units/:unitId/shifts',
    summary: 'Make a shift with the people on it',
    params: UnitParams,
    body: NewShift,
    response: Shift,
    status: 201,
    needs: { act: 'assign', in: inUnit },
    handle: ({ write, input }) => makeShift(write, { unitId: input.params.unitId, shift: input.body }),
  }),
  read({
    path: '/api/shifts/:shiftId/assignment',
    summary: 'Who has which bed in a shift',
    params: ShiftParams,
    response: Assignment,
    needs: { act: 'see-shifts', in: inUnitOfShift },
    handle: async ({ deps, input: { params } }) =>
      readAssignment(deps.db, await requireShift(deps.db, params.shiftId)),
  }),
  write({
    method: 'put',
    path: '/api/shifts/:shiftId/assignment',
    summary: 'Replace, and publish, who has which bed',
    versioned: true,
    params: ShiftParams,
    body: AssignmentInput,
    response: Assignment,
    needs: { act: 'assign', in: inUnitOfShift },
    handle: async ({ write, input, version }) =>
      putAssignment(write, {
        shift: await requireShift(write.trx, input.params.shiftId),
        input: input.body,
        version,
      }),
  }),
];
