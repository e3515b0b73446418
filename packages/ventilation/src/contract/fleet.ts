import { z } from 'zod';
import { Id, Instant, Note } from './instant.ts';

export const VENTILATOR_CLASSES = {
  'adult-icu': 'Adult intensive care',
  transport: 'Transport',
  noninvasive: 'Mask',
  neonatal: 'Neonatal',
} as const;
export type VentilatorClass = keyof typeof VENTILATOR_CLASSES;
export const VENTILATOR_STATES = {
  'in-use': 'in use',
  ready: 'ready',
  cleaning: 'cleaning',
  held: 'held for service',
  'on-loan': 'on loan',
  retired: 'retired',
} as const;
export type VentilatorState = keyof typeof VENTILATOR_STATES;

const classes = Object.keys(VENTILATOR_CLASSES) as [VentilatorClass, ...VentilatorClass[]];
const states = Object.keys(VENTILATOR_STATES) as [VentilatorState, ...VentilatorState[]];

export const Ventilator = z.object({
  ventilatorId: Id,
  assetNumber: z.string(),
  model: z.string(),
  class: z.enum(classes),
  homeUnitId: Id.nullable(),
  state: z.enum(states),
  /** Where it stands: a bed, a unit's store, or words ("workshop"). */
  place: z.object({
    unitId: Id.nullable(),
    bedId: Id.nullable(),
    bedLabel: z.string().nullable(),
    words: z.string().nullable(),
  }),
  sinceAt: z.string(),
  version: z.number().int(),
});
export type Ventilator = z.infer<typeof Ventilator>;

export const NewVentilator = z.strictObject({
  assetNumber: z.string().trim().min(1).max(30),
  model: z.string().trim().min(1).max(60),
  class: z.enum(classes),
  homeUnitId: Id.nullable(),
});
export type NewVentilator = z.infer<typeof NewVentilator>;

/** A machine changes state or place. `in-use` needs the bed; every other state leaves it. */
export const VentilatorMove = z
  .strictObject({
    state: z.enum(states),
    bedId: Id.nullable().optional(),
    unitId: Id.nullable().optional(),
    words: z.string().trim().max(80).nullable().optional(),
    observedAt: Instant.optional(),
    note: Note.optional(),
  })
  .refine((move) => (move.state === 'in-use') === Boolean(move.bedId), {
    path: ['bedId'],
    error: 'a machine in use stands at a bed, and only a machine in use does',
  });
export type VentilatorMove = z.infer<typeof VentilatorMove>;

export const VentilatorMoved = z.object({
  moveId: Id,
  ventilatorId: Id,
  from: z.enum(states),
  to: z.enum(states),
  bedLabel: z.string().nullable(),
  unitId: Id.nullable(),
  words: z.string().nullable(),
  observedAt: z.string(),
  recordedAt: z.string(),
  movedBy: z.string(),
  note: z.string().nullable(),
});
export type VentilatorMoved = z.infer<typeof VentilatorMoved>;

/** Which state may follow which. Cleaning stands between two patients; a held machine is cleaned before it is ready. */
export const NEXT_STATES: Record<VentilatorState, readonly VentilatorState[]> = {
  ready: ['in-use', 'held', 'on-loan', 'cleaning', 'retired'],
  'in-use': ['cleaning', 'held'],
  cleaning: ['ready', 'held'],
  held: ['cleaning', 'retired', 'on-loan'],
  'on-loan': ['cleaning', 'held'],
  retired: [],
};
/** The moves that bedside staff make; all others belong to those who manage the fleet. */
export const BEDSIDE_MOVES: readonly (readonly [VentilatorState, VentilatorState])[] = [
  ['ready', 'in-use'],
  ['in-use', 'cleaning'],
];

const counts = z.object({
  inUse: z.number().int(),
  ready: z.number().int(),
  cleaning: z.number().int(),
  held: z.number().int(),
  onLoan: z.number().int(),
});

export const Capacity = z.object({
  serverTime: z.string(),
  classes: z.array(z.object({ class: z.enum(classes), label: z.string(), counts })),
  units: z.array(
    z.object({
      unitId: Id,
      name: z.string(),
      beds: z.object({
        open: z.number().int(),
        closed: z.number().int(),
        occupied: z.number().int(),
        free: z.number().int(),
      }),
      support: z.object({
        invasive: z.number().int(),
        mask: z.number().int(),
        highFlow: z.number().int(),
        other: z.number().int(),
        unknown: z.number().int(),
      }),
      unassigned: z.number().int(),
      checksOverdue: z.number().int(),
      ventilatorsReady: z.number().int(),
      /** On a ventilator by the record, with no machine of the fleet at the bed: the count would be short by these. */
      withoutMachine: z.number().int(),
      oldestCheckAt: z.string().nullable(),
    }),
  ),
});
export type Capacity = z.infer<typeof Capacity>;
