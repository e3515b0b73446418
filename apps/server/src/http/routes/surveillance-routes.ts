import { Surveillance } from '@windrow/ventilation/contract/surveillance';
import { readSurveillance } from '../../services/read-surveillance.ts';
import { type Route, read } from '../route.ts';
import { inUnitOfStay, requireStay, StayParams } from './ids.ts';

export const surveillanceRoutes: Route[] = [
  read({
    path: '/api/stays/:stayId/surveillance',
    summary: 'The days of a stay on the ventilator by the surveillance definitions, with events and why',
    params: StayParams,
    response: Surveillance,
    needs: { act: 'see-people', in: inUnitOfStay },
    handle: async ({ deps, input: { params } }) =>
      readSurveillance(deps, { stay: await requireStay(deps.db, params.stayId) }),
  }),
];
