import type { VentilatorClass, VentilatorState } from '@windrow/ventilation/contract/fleet';
import type { RecordedKind } from '@windrow/ventilation/contract/observations';
import type { OUTCOMES, StayDetails } from '@windrow/ventilation/contract/stays';
import type { Role } from '@windrow/ventilation/permissions/permissions';

/** The invented hospital as data. All times are minutes before (or after) the moment it is filled. */
export type DemoHospital = {
  name: string;
  units: DemoUnit[];
  people: DemoPerson[];
  stays: DemoStay[];
  ventilators: DemoVentilator[];
  shifts: DemoShift[];
};

export type DemoUnit = {
  key: string;
  name: string;
  timeZone: string;
  beds: { label: string; row: number; column: number; isOpen: boolean }[];
};

export type DemoPerson = {
  username: string;
  displayName: string;
  initials: string;
  /** `unitKey` null: in the whole hospital. */
  grants: { role: Role; unitKey: string | null }[];
};

/** One fact; its body is what the route takes, without `observedAt`, which is `minutesAgo`. */
export type DemoFact = {
  kind: RecordedKind;
  minutesAgo: number;
  recordedMinutesAgo: number;
  by: string;
  body: Record<string, unknown>;
};

/** Made by whoever has the bed, of the flag as it is when the hospital is filled. */
export type DemoAcknowledgement = { flagId: string; minutesAgo: number; note: string };

export type DemoStay = {
  key: string;
  unitKey: string;
  bedLabel: string;
  details: StayDetails;
  admittedMinutesAgo: number;
  leftMinutesAgo: number | null;
  outcome: (typeof OUTCOMES)[number] | null;
  /** Oldest first. */
  facts: DemoFact[];
  acknowledged: (DemoAcknowledgement & { by: string }) | null;
};

export type DemoVentilator = {
  assetNumber: string;
  model: string;
  class: VentilatorClass;
  homeUnitKey: string | null;
  state: VentilatorState;
  bed: { unitKey: string; bedLabel: string } | null;
  words: string | null;
  sinceMinutesAgo: number;
};

export type DemoShift = {
  unitKey: string;
  name: string;
  startsMinutesFromNow: number;
  endsMinutesFromNow: number;
  /** A draft is seen by those who assign, and by no bed. */
  published: boolean;
  people: { username: string; minutesAvailable: number }[];
  places: { bedLabel: string; username: string }[];
};
