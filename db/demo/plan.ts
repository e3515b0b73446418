import type {
  AirwayKind,
  GAS_SITES,
  Happening,
  HappeningKind,
  MASK_INTERFACES,
} from '@windrow/ventilation/contract/observations';
import type { OUTCOMES } from '@windrow/ventilation/contract/stays';
import type { GasKey, LimitKey, ReadingKey, SettingKey } from '@windrow/ventilation/entry/fields';
import type { SupportId } from '@windrow/ventilation/support/catalogue';

import type { DemoAcknowledgement } from './demo-types.ts';

/** What the patient's lungs are like at the end of the story, and where they are going. */
export type Lung = {
  complianceMlCmH2O: number;
  resistanceCmH2OPerLS: number;
  pfMmHg: number;
  pco2MmHg: number;
  hco3MmolL: number;
  intrinsicPeepCmH2O?: number;
  trend: 'better' | 'worse' | 'steady';
};

/** A stretch of time on one support. Volumes are per kg, so that each patient gets those of their size. */
export type Phase = {
  fromHoursAgo: number;
  mode: SupportId;
  settings: Partial<Record<Exclude<SettingKey, 'vtSetMl'>, number>>;
  /** Volume of a breath, mL per kg; where the ventilator sets a pressure, the lungs decide unless it is given. */
  perKgMl?: number;
  /** Volume of the patient's own breaths between those of the ventilator. */
  ownPerKgMl?: number;
  /** All breaths, /min. */
  ratePerMin: number;
  leakLMin?: number;
  interface?: (typeof MASK_INTERFACES)[number];
};

export type Tube = {
  placedHoursAgo: number;
  /** Taken out; or changed for the next one in the list. */
  outHoursAgo?: number;
  out?: 'planned' | 'unplanned' | 'changed';
  kind: AirwayKind;
  sizeMm: number;
  depthCm?: number;
  subglotticPort?: boolean;
  /** Put in after an earlier one had come out. */
  again?: boolean;
};

/** The story of one stay, from which its record is written. Times count back from the moment of filling. */
export type StayPlan = {
  bed: string;
  patient: {
    familyName: string;
    givenName: string;
    sex: 'female' | 'male' | null;
    age: number;
    heightCm: number | null;
  };
  admittedHoursAgo: number;
  left?: { hoursAgo: number; outcome: (typeof OUTCOMES)[number] };
  difficultAirway?: true;
  precautions?: string;
  careLimits?: string;
  checkEveryMinutes?: number;
  gasEveryMinutes?: number;
  lung: Lung;
  phases: Phase[];
  tubes?: Tube[];
  /** Age in minutes of the newest fact of each kind; null: there is none. */
  newest: { check: number | null; airway: number | null; gas: number | null };
  gasesADay?: number;
  newestGasSite?: (typeof GAS_SITES)[number];
  happenings?: ({ kind: HappeningKind; minutesAgo: number } & Pick<
    Happening,
    'detail' | 'method' | 'plannedMinutes' | 'minutes' | 'criteria' | 'screen'
  >)[];
  /** What the newest facts say instead of what follows from the lungs. */
  found?: {
    settings?: Partial<Record<SettingKey, number>>;
    readings?: Partial<Record<ReadingKey, number>>;
    /** Null: not written down, while the others were. */
    limits?: Partial<Record<LimitKey, number | 'off' | null>> | 'none';
    /** Whether the patient made no effort in the pause; where it is not said here, they made none. */
    passive?: boolean | 'not recorded';
    note?: string;
    airway?: { depthCm?: number; cuffCmH2O?: number; secured?: boolean };
    gas?: Partial<Record<GasKey, number>>;
  };
  /** A flag of the newest facts that somebody has looked at. */
  acknowledged?: DemoAcknowledgement;
};
