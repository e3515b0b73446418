import { Bed, BedPlace, Unit } from '@windrow/ventilation/contract/board';
import {
  AuditEntry,
  BedOpening,
  NewBed,
  NewPerson,
  NewUnit,
  Person,
  PersonChange,
  PolicyChange,
  PolicyVersion,
} from '@windrow/ventilation/contract/setup';
import { notFound } from '../../errors.ts';
import { type AuditScope, auditPage } from '../../queries/audit.ts';
import { peoplePage, personById } from '../../queries/people.ts';
import { policyOf } from '../../queries/policies.ts';
import { bedsOfUnit } from '../../queries/units.ts';
import { toPlace } from '../../services/rebuild-bed.ts';
import {
  addBed,
  addPerson,
  addUnit,
  changePerson,
  changePolicy,
  openOrCloseBed,
  toPerson,
  toPolicyVersion,
} from '../../services/set-up.ts';
import type { SignedIn } from '../../services/sign-ins.ts';
import { Paging, PagingBySequence, pageOf, toPage } from '../paging.ts';
import { type Route, read, write } from '../route.ts';
import { BedParams, inUnit, inUnitOfBed, PersonParams, requireBed, UnitParams } from './ids.ts';

const house = () => null;

export const setUpRoutes: Route[] = [
  write({
    method: 'post',
    path: '/api/units',
    summary: 'Add a unit',
    body: NewUnit,
    response: Unit,
    status: 201,
    needs: { act: 'set-up', in: house },
    handle: ({ write, input }) => addUnit(write, input.body),
  }),
  write({
    method: 'post',
    path: '/api/units/:unitId/beds',
    summary: 'Add a bed to a unit',
    params: UnitParams,
    body: NewBed,
    response: Bed,
    status: 201,
    needs: { act: 'set-up', in: inUnit },
    handle: ({ write, input }) => addBed(write, { unitId: input.params.unitId, bed: input.body }),
  }),
  read({
    path: '/api/units/:unitId/beds',
    summary: 'The beds of a unit as places: nothing of who lies in them',
    params: UnitParams,
    response: pageOf(BedPlace),
    needs: { act: 'set-up', in: inUnit },
    handle: async ({ deps, input }) => ({
      items: (await bedsOfUnit(deps.db, input.params.unitId)).map(toPlace),
      nextCursor: null,
    }),
  }),
  write({
    method: 'patch',
    path: '/api/beds/:bedId',
    summary: 'Open or close a bed',
    params: BedParams,
    body: BedOpening,
    response: Bed,
    needs: { act: 'set-up', in: inUnitOfBed },
    handle: async ({ write, input }) =>
      openOrCloseBed(write, {
        bed: await requireBed(write.trx, input.params.bedId),
        isOpen: input.body.isOpen,
      }),
  }),
  read({
    path: '/api/units/:unitId/policy',
    summary: "A unit's policy, with who changed it, when and why",
    params: UnitParams,
    response: PolicyVersion,
    needs: { act: 'see-policy', in: inUnit },
    handle: async ({ deps, input }) => toPolicyVersion(deps.db, await policyOf(deps.db, input.params.unitId)),
  }),
  write({
    method: 'put',
    path: '/api/units/:unitId/policy',
    summary: "Replace a unit's policy",
    versioned: true,
    params: UnitParams,
    body: PolicyChange,
    response: PolicyVersion,
    needs: { act: 'set-policy', in: inUnit },
    handle: ({ write, input, version }) =>
      changePolicy(write, { unitId: input.params.unitId, change: input.body, version }),
  }),
  read({
    path: '/api/people',
    summary: 'Everybody who may sign in',
    query: Paging,
    response: pageOf(Person),
    needs: { act: 'set-up', in: house },
    handle: async ({ deps, input: { query } }) => {
      const rows = await peoplePage(deps.db, { limit: query.limit + 1, after: query.cursor ?? null });
      const page = toPage(rows, query.limit, { item: (row) => row, cursor: (row) => row.username });
      return {
        items: await Promise.all(page.items.map((row) => toPerson(deps.db, row))),
        nextCursor: page.nextCursor,
      };
    },
  }),
  write({
    method: 'post',
    path: '/api/people',
    summary: 'Add a person with their roles',
    body: NewPerson,
    response: Person,
    status: 201,
    needs: { act: 'set-up', in: house },
    handle: ({ deps, write, input }) => addPerson(deps, write, input.body),
  }),
  write({
    method: 'patch',
    path: '/api/people/:personId',
    summary: "Change a person's roles, password or right to sign in",
    versioned: true,
    params: PersonParams,
    body: PersonChange,
    response: Person,
    needs: { act: 'set-up', in: house },
    handle: async ({ deps, write, input, version }) => {
      const person = await personById(write.trx, input.params.personId);
      if (!person) throw notFound('person', 'personId', input.params.personId);
      return changePerson(deps, write, { person, change: input.body, version });
    },
  }),
  read({
    path: '/api/audit',
    summary: 'Who did what, when: own acts, those of own units, or all, by role',
    query: PagingBySequence,
    response: pageOf(AuditEntry),
    needs: { act: 'see-audit', in: 'any' },
    handle: async ({ deps, person, input: { query } }) => {
      const rows = await auditPage(deps.db, {
        scope: auditScope(person),
        limit: query.limit + 1,
        before: query.cursor ?? null,
      });
      return toPage(rows, query.limit, {
        item: (row): AuditEntry => ({
          auditId: row.id,
          at: row.at,
          personId: row.person_id,
          displayName: row.display_name,
          act: row.act,
          unitId: row.unit_id,
          subject: row.subject,
          outcome: row.outcome,
        }),
        cursor: (row) => String(row.id),
      });
    },
  }),
];

/** Own acts for everybody; those of a unit for whoever leads or sets up the unit; all for who does so in the whole house. */
function auditScope({ personId, grants }: SignedIn): AuditScope {
  const leads = grants.filter(({ role }) => role === 'charge' || role === 'administrator');
  if (leads.some(({ unitId }) => unitId === null)) return 'all';
  return { personId, unitIds: leads.flatMap(({ unitId }) => unitId ?? []) };
}
