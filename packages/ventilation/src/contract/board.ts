import { z } from 'zod';
import { AgeLadder } from '../policy/policy.ts';
import { Id } from './instant.ts';
import { MASK_INTERFACES, Support, TRIAL_METHOD_IDS } from './observations.ts';
import { Patient, StayDetails } from './stays.ts';

const numbers = z.record(z.string(), z.number());
const limits = z.record(z.string(), z.union([z.number(), z.literal('off')]));

/** The groups of a bed's row; each ages by its own ladder. */
export const FactGroup = z.enum(['check', 'airway', 'gas']);
export type FactGroup = z.infer<typeof FactGroup>;

/**
 * Something in the present facts that a person should look at. A note informs; attention asks.
 * It carries why: the inputs, the threshold and the published source.
 */
export const Flag = z.object({
  id: z.string(),
  level: z.enum(['note', 'attention']),
  /** For the tile: "Vt 8.6 mL/kg". */
  short: z.string(),
  /** For the bed page: a whole sentence with the threshold. */
  sentence: z.string(),
  source: z.string(),
  /** The groups whose facts it rests on; when one of them is withdrawn, the flag is gone. */
  from: z.array(FactGroup),
  inputs: z.array(
    z.object({ label: z.string(), value: z.number(), unit: z.string(), decimals: z.number().int() }),
  ),
  /** For a flag that comes or goes by the clock alone: the instants between which it holds. */
  holds: z.object({ from: z.string().nullable(), until: z.string().nullable() }).optional(),
  /** What it rests on, as one word; see flags/flag-fingerprint.ts. */
  fingerprint: z.string(),
  /**
   * Who looked at it and said so, while what it rests on is as it was then. It is quieted on the wall, never
   * gone: as soon as one of its values differs, this is null again.
   */
  acknowledged: z
    .object({
      by: z.string(),
      at: z.string(),
      /** Null on a display: what people write is not for the wall. */
      note: z.string().nullable(),
    })
    .nullable(),
});
export type Flag = z.infer<typeof Flag>;

const stamp = {
  observationId: Id,
  observedAt: z.string(),
  recordedAt: z.string(),
  recordedByInitials: z.string(),
  /** True of an earlier state: since then settings or support were changed, at this time. */
  changedSinceAt: z.string().nullable(),
};

/** Derived from one check; null where an input is missing or the quantity cannot exist. */
export const CheckDerived = z.object({
  vtPerKgMl: z.number().nullable(),
  drivingPressureCmH2O: z.number().nullable(),
  staticComplianceMlCmH2O: z.number().nullable(),
  mechanicalPowerJMin: z.number().nullable(),
  minuteVolumeLMin: z.number().nullable(),
  roxIndex: z.number().nullable(),
  rsbiPerMinL: z.number().nullable(),
});
export type CheckDerived = z.infer<typeof CheckDerived>;

export const BedCheck = z.object({
  ...stamp,
  mode: Support,
  settings: numbers,
  readings: numbers,
  limits,
  interface: z.enum(MASK_INTERFACES).nullable(),
  passive: z.boolean().nullable(),
  derived: CheckDerived,
});
export type BedCheck = z.infer<typeof BedCheck>;

export const BedDevice = z.object({
  observationId: Id,
  placedAt: z.string(),
  kind: z.string(),
  sizeMm: z.number(),
  depthCm: z.number().nullable(),
  depthMark: z.string().nullable(),
  cuffed: z.boolean(),
  subglotticPort: z.boolean().nullable(),
});

export const BedAirway = z.object({
  ...stamp,
  depthCm: z.number().nullable(),
  cuffCmH2O: z.number().nullable(),
  cuffMethod: z.string().nullable(),
  position: z.string().nullable(),
  secured: z.boolean().nullable(),
});
export type BedAirway = z.infer<typeof BedAirway>;

export const BedGas = z.object({
  ...stamp,
  site: z.string(),
  values: numbers,
  /** P/F, only of an arterial gas with FiO2 at the draw. */
  pfMmHg: z.number().nullable(),
  ventilatoryRatio: z.number().nullable(),
  /** What the ventilatory ratio was reckoned with. */
  minuteVolumeAtDrawLMin: z.number().nullable(),
});
export type BedGas = z.infer<typeof BedGas>;

export const BedStay = z.object({
  stayId: Id,
  version: z.number().int(),
  admittedAt: z.string(),
  /** Null on a display that may not show people. */
  patient: Patient.nullable(),
  predictedBodyWeightKg: z.number().nullable(),
  difficultAirway: z.boolean(),
  precautions: z.string().nullable(),
  careLimits: z.string().nullable(),
  orders: StayDetails.shape.orders,
  /** What the patient breathes with, and since when it is so. Null: nothing recorded yet. */
  support: z.object({ id: Support, shortName: z.string(), sinceAt: z.string() }).nullable(),
  proneSinceAt: z.string().nullable(),
  away: z.object({ sinceAt: z.string(), to: z.string().nullable() }).nullable(),
  /** The breathing trial that runs now. */
  trial: z
    .object({
      startedAt: z.string(),
      method: z.enum(TRIAL_METHOD_IDS).nullable(),
      plannedMinutes: z.number().nullable(),
    })
    .nullable(),
  /** How the last breathing trial ended. */
  lastTrial: z
    .object({ startedAt: z.string().nullable(), endedAt: z.string(), outcome: z.enum(['passed', 'failed']) })
    .nullable(),
  /** The answers that only a person at the bed could give, and until when they stand. */
  screen: z
    .object({
      observationId: Id,
      observedAt: z.string(),
      recordedByInitials: z.string(),
      answers: z.record(z.string(), z.boolean()),
      holdsUntil: z.string(),
    })
    .nullable(),
  check: BedCheck.nullable(),
  device: BedDevice.nullable(),
  /** The latest airway check of this device, or its placement where none was made since. */
  airway: BedAirway.nullable(),
  gas: BedGas.nullable(),
  flags: z.array(Flag),
  /** The unit's ladder, tightened by this stay's orders. */
  ladder: z.object({ check: AgeLadder, airway: AgeLadder, gas: AgeLadder }),
  /** The plateau limit of the unit, drawn on the pressure ladder. */
  plateauLimitCmH2O: z.number(),
  /** Groups emptied because their facts are older than the ladder's end; the time alone is kept. */
  withdrawn: z.object({
    check: z.string().nullable(),
    airway: z.string().nullable(),
    gas: z.string().nullable(),
  }),
});
export type BedStay = z.infer<typeof BedStay>;

export const BedAssignment = z.object({
  shiftId: Id,
  startsAt: z.string(),
  endsAt: z.string(),
  personId: Id,
  initials: z.string(),
  displayName: z.string(),
  coverInitials: z.string().nullable(),
});
export type BedAssignment = z.infer<typeof BedAssignment>;

/** One bed as the board shows it. It holds times, never ages: each screen ages it by the server's clock. */
export const Bed = z.object({
  bedId: Id,
  unitId: Id,
  label: z.string(),
  row: z.number().int(),
  column: z.number().int(),
  isOpen: z.boolean(),
  revision: z.number().int(),
  stay: BedStay.nullable(),
  /** Published assignments of this bed that have not ended. The one whose shift runs now counts. */
  assignments: z.array(BedAssignment),
  ventilator: z.object({ ventilatorId: Id, assetNumber: z.string(), model: z.string() }).nullable(),
});
export type Bed = z.infer<typeof Bed>;

/** The place itself, without anything that changes by the hour. */
export const BedPlace = Bed.pick({
  bedId: true,
  unitId: true,
  label: true,
  row: true,
  column: true,
  isOpen: true,
});
export type BedPlace = z.infer<typeof BedPlace>;

export const Unit = z.object({
  unitId: Id,
  name: z.string(),
  timeZone: z.string(),
  revision: z.number().int(),
  nightFrom: z.string(),
  nightTo: z.string(),
  bedCount: z.number().int(),
});
export type Unit = z.infer<typeof Unit>;

export const Board = z.object({
  unit: Unit,
  revision: z.number().int(),
  serverTime: z.string(),
  /** Set when this is a look back: the minute shown. */
  at: z.string().nullable(),
  demonstration: z.boolean(),
  beds: z.array(Bed),
  fleet: z.object({ ready: z.number().int() }),
});
export type Board = z.infer<typeof Board>;
