import type { Role } from '@windrow/ventilation/permissions/permissions';

/** The columns of the table, in its order. */
const COLUMNS = [
  'therapist',
  'charge',
  'supervisor',
  'clinician',
  'biomedical',
  'administrator',
  'display',
] as const satisfies readonly Role[];

type Row = Record<Role, string>;

function row(...words: [string, string, string, string, string, string, string]): Row {
  return Object.fromEntries(COLUMNS.map((role, index) => [role, words[index]])) as Row;
}

/** "Who may do what", word for word as the domain page has it. Written anew here, and not taken from the code. */
export const WHO_MAY_DO_WHAT = {
  'see board, bed, history': row('yes', 'yes', 'yes', 'yes', 'counts only', 'no clinical data', 'its units'),
  'record check, airway, gas, happening': row('own units', 'own units', '–', '–', '–', '–', '–'),
  'amend own; amend another’s': row('yes; no', 'yes; yes', '–', '–', '–', '–', '–'),
  'admit, transfer, discharge a stay': row('yes', 'yes', 'yes', '–', '–', '–', '–'),
  'shifts, assignment, publish': row('–', 'own units', 'any', '–', '–', '–', '–'),
  'accept handover': row('yes', 'yes', '–', '–', '–', '–', '–'),
  'fleet: move, clean, hold, loan': row('use/return', 'use/return, request', 'any', '–', 'any', '–', '–'),
  'capacity, forecast, surge stage': row('see', 'see', 'see and set', '–', 'see fleet', '–', 'if policy'),
  'policies, beds, displays': row('–', 'own unit’s policies', '–', '–', '–', 'all', '–'),
  'people and roles, feeds, backups': row('–', '–', '–', '–', '–', 'all', '–'),
  'audit trail': row('own acts', 'own units', '–', '–', '–', 'all', '–'),
} satisfies Record<string, Row>;

/** What the table leaves to be concluded: reading what those who act on it, or look at it, must have read. */
export const READING = {
  // Who has which bed, for everybody who reads the board as a person.
  'see shifts': row('yes', 'yes', 'yes', 'yes', '–', '–', '–'),
  // The ladder of every tile is the policy, so whoever sees tiles may read it; and whoever sets it.
  'read a policy': row('yes', 'yes', 'yes', 'yes', '–', 'all', 'yes'),
} satisfies Record<string, Row>;

const NO = new Set([
  '–',
  // Counts are had from /api/capacity; a board row is a patient.
  'counts only',
  'no clinical data',
  // No policy that shows capacity on a display exists yet, so none allows it.
  'if policy',
]);

export type Expected =
  | 'open'
  | 'anybody signed in'
  | {
      row: keyof typeof WHO_MAY_DO_WHAT | keyof typeof READING;
      /**
       * `unit`: a role held in one unit reaches the things of that unit only. `house`: the thing belongs to no
       * unit, and asks for a role in the whole hospital. `anywhere`: a role held in any unit will do.
       */
      where: 'unit' | 'house' | 'anywhere';
      /** Roles whose word in the row is about another of its acts, each with the reason. */
      except?: Partial<Record<Role, string>>;
    };

const board = 'see board, bed, history';
const place = 'admit, transfer, discharge a stay';
const fleet = 'fleet: move, clean, hold, loan';
const seeFleet = 'capacity, forecast, surge stage';
const setUp = 'policies, beds, displays';
const record = { row: 'record check, airway, gas, happening', where: 'unit' } as const;
const notPolicies = { charge: 'sets policies, and makes no units or beds' };

/** Every route with the row that rules it. A route that is not here fails the test, and so does one too many. */
export const EXPECTED: Record<string, Expected> = {
  'GET /api/health': 'open',
  'GET /api/start': 'open',
  'GET /api/openapi.json': 'open',
  'POST /api/start/administrator': 'open',
  'POST /api/session': 'open',
  'GET /api/session': 'anybody signed in',
  'DELETE /api/session': 'anybody signed in',
  'GET /api/units': 'anybody signed in',

  'GET /api/units/:unitId/board': { row: board, where: 'unit' },
  'GET /api/stays/:stayId/record': {
    row: board,
    where: 'unit',
    except: { display: 'shows boards; a record names its patient' },
  },
  'GET /api/stays/:stayId/surveillance': {
    row: board,
    where: 'unit',
    except: { display: 'shows boards; a day table names its patient' },
  },
  'POST /api/stays/:stayId/infection-signs': record,
  'GET /api/stays/:stayId/trials': {
    row: board,
    where: 'unit',
    except: { display: 'shows the bed, and not its past' },
  },
  'POST /api/stays': { row: place, where: 'unit' },
  'PATCH /api/stays/:stayId': { row: place, where: 'unit' },
  'POST /api/stays/:stayId/transfer': { row: place, where: 'unit' },
  'POST /api/stays/:stayId/discharge': { row: place, where: 'unit' },
  'POST /api/stays/:stayId/checks': record,
  'POST /api/stays/:stayId/gases': record,
  'POST /api/stays/:stayId/airways': record,
  'POST /api/stays/:stayId/airway-checks': record,
  'POST /api/stays/:stayId/happenings': record,
  'POST /api/stays/:stayId/acknowledgements': record,
  'POST /api/observations/:observationId/amendments': { row: 'amend own; amend another’s', where: 'unit' },

  'GET /api/units/:unitId/colleagues': { row: 'see shifts', where: 'unit' },
  'GET /api/units/:unitId/shifts': { row: 'see shifts', where: 'unit' },
  'GET /api/shifts/:shiftId/assignment': { row: 'see shifts', where: 'unit' },
  'POST /api/units/:unitId/shifts': { row: 'shifts, assignment, publish', where: 'unit' },
  'PUT /api/shifts/:shiftId/assignment': { row: 'shifts, assignment, publish', where: 'unit' },

  'GET /api/capacity': { row: seeFleet, where: 'anywhere' },
  'GET /api/ventilators': { row: seeFleet, where: 'anywhere' },
  'GET /api/ventilators/:ventilatorId/moves': { row: seeFleet, where: 'anywhere' },
  'POST /api/ventilators': {
    row: fleet,
    where: 'house',
    except: { therapist: 'uses and returns machines', charge: 'uses, returns and requests machines' },
  },
  'POST /api/ventilators/:ventilatorId/moves': { row: fleet, where: 'unit' },

  'POST /api/units': { row: setUp, where: 'house', except: notPolicies },
  'GET /api/units/:unitId/beds': { row: setUp, where: 'unit', except: notPolicies },
  'POST /api/units/:unitId/beds': { row: setUp, where: 'unit', except: notPolicies },
  'PATCH /api/beds/:bedId': { row: setUp, where: 'unit', except: notPolicies },
  'GET /api/units/:unitId/policy': { row: 'read a policy', where: 'unit' },
  'PUT /api/units/:unitId/policy': { row: setUp, where: 'unit' },
  'GET /api/people': { row: 'people and roles, feeds, backups', where: 'house' },
  'POST /api/people': { row: 'people and roles, feeds, backups', where: 'house' },
  'PATCH /api/people/:personId': { row: 'people and roles, feeds, backups', where: 'house' },
  'GET /api/audit': { row: 'audit trail', where: 'anywhere' },
};

export type Held = 'in the unit' | 'in another unit' | 'in the hospital';

/** Whether the table allows it to somebody who holds a role there. */
export function isAllowed(expected: Expected, role: Role, held: Held): boolean {
  if (expected === 'open' || expected === 'anybody signed in') return true;
  const word = { ...WHO_MAY_DO_WHAT, ...READING }[expected.row][role];
  if (NO.has(word) || expected.except?.[role] !== undefined) return false;
  if (held === 'in the hospital') return true;
  return expected.where === 'anywhere' || (expected.where === 'unit' && held === 'in the unit');
}
