import type {
  Acknowledgement,
  Airway,
  AirwayCheck,
  Check,
  Gas,
  Happening,
} from '../contract/observations.ts';
import type { StayDetails } from '../contract/stays.ts';
import type { SupportId } from '../support/catalogue.ts';

/** A fact with its stamp, as the board needs it. */
export type Stamped<Body> = {
  observationId: string;
  observedAt: string;
  recordedAt: string;
  recordedByInitials: string;
  body: Body;
};

/**
 * The facts of one stay that can touch its row: those that hold (not amended, not struck), newest
 * observation first. Bounded, so that a row costs the same on the stay's first day and on its ninetieth.
 */
export type StayFacts = {
  stayId: string;
  version: number;
  admittedAt: string;
  details: StayDetails;
  /** The latest check, and those of the hours before it that a gas may have to be held against. */
  checks: Stamped<Check>[];
  gas: Stamped<Gas> | null;
  /** The latest placed or removed device. */
  airway: Stamped<Airway> | null;
  /** The latest airway checks, newest first: depth and cuff may come from different ones. */
  airwayChecks: Stamped<AirwayCheck>[];
  /** The latest of each kind of happening. */
  happenings: Stamped<Happening>[];
  /** Since when the latest support has been so, without a break. */
  support: { id: SupportId; sinceAt: string; observedAt: string } | null;
  /** The latest acknowledgement of each flag. */
  acknowledgements: Stamped<Acknowledgement>[];
  /**
   * By which it is seen whether an acknowledgement has held since: the newest facts of each group, back past it
   * where they reach so far. Empty where nothing was acknowledged.
   */
  sinceAcknowledged: {
    checks: Stamped<Check>[];
    gases: Stamped<Gas>[];
    airwayChecks: Stamped<AirwayCheck>[];
  };
};

/** A stay in which nobody has acknowledged anything. */
export const NOTHING_ACKNOWLEDGED: Pick<StayFacts, 'acknowledgements' | 'sinceAcknowledged'> = {
  acknowledgements: [],
  sinceAcknowledged: { checks: [], gases: [], airwayChecks: [] },
};

/** How far back checks are held against a gas: no unit keeps a gas on its board for longer. */
export const CHECKS_WINDOW_MINUTES = 2880;
