import { Trial } from '@windrow/ventilation/contract/readiness';
import { readTrials } from '../../services/read-trials.ts';
import { pageOf } from '../paging.ts';
import { type Route, read } from '../route.ts';
import { inUnitOfStay, StayParams } from './ids.ts';

export const readinessRoutes: Route[] = [
  read({
    path: '/api/stays/:stayId/trials',
    summary: 'The breathing trials of a stay, newest first',
    params: StayParams,
    response: pageOf(Trial),
    needs: { act: 'see-people', in: inUnitOfStay },
    handle: ({ deps, input: { params } }) => readTrials(deps.db, params.stayId),
  }),
];
