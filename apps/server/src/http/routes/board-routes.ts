import { Board, Unit } from '@windrow/ventilation/contract/board';
import { Instant } from '@windrow/ventilation/contract/instant';
import { may } from '@windrow/ventilation/permissions/permissions';
import { z } from 'zod';
import { allUnits } from '../../queries/units.ts';
import { lookBack, readBoard, toUnit } from '../../services/read-board.ts';
import { pageOf } from '../paging.ts';
import { type Route, read } from '../route.ts';
import { inUnit, requireUnit, UnitParams } from './ids.ts';

const BoardQuery = z.strictObject({
  at: Instant.optional(),
  audience: z.enum(['staff', 'display']).optional(),
});

export const boardRoutes: Route[] = [
  read({
    path: '/api/units',
    summary: 'The units that this person or display may see',
    needs: 'anybody-signed-in',
    response: pageOf(Unit),
    handle: async ({ deps, person }) => {
      const mine = (await allUnits(deps.db)).filter(
        ({ id }) =>
          may(person.grants, 'see-board', id) ||
          may(person.grants, 'set-up', id) ||
          may(person.grants, 'set-policy', id),
      );
      return { items: await Promise.all(mine.map((unit) => toUnit(deps.db, unit))), nextCursor: null };
    },
  }),
  read({
    path: '/api/units/:unitId/board',
    summary: 'Every bed as it stands; with `at`, what the board showed then',
    params: UnitParams,
    query: BoardQuery,
    needs: { act: 'see-board', in: inUnit },
    response: Board,
    handle: async ({ deps, person, input: { params, query } }) => {
      const unit = await requireUnit(deps.db, params.unitId);
      // People are shown only to those who may see them, and not even to them where a display asks.
      const audience =
        query.audience !== 'display' && may(person.grants, 'see-people', unit.id) ? 'staff' : 'display';
      return query.at === undefined
        ? readBoard(deps, { unit, audience })
        : lookBack(deps, { unit, audience, at: query.at });
    },
  }),
];
