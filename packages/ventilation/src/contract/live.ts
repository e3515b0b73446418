import type { Bed } from './board.ts';

/** Every 5 s to each unit that a connection hears. A screen that hears none for 15 s is not live. */
export type Beat = {
  serverTime: string;
  revision: number;
  unitId: string | null;
  version: string;
  ventilatorsReady: number;
};

/** One bed after a commit. Revisions are consecutive per unit; a gap means: read the board again. */
export type BedChanged = { revision: number; unitId: string; bed: Bed };

/** Something that is read by request has changed; the reader asks again. */
export type Changed = { topic: 'shifts' | 'fleet' | 'policy' | 'units'; unitId: string | null };

export type ServerToClient = {
  beat: (beat: Beat) => void;
  bed: (changed: BedChanged) => void;
  changed: (changed: Changed) => void;
};

/** The rooms of a unit: staff hear people, displays do not. */
export type Audience = 'staff' | 'display';

export const BEAT_EVERY_MS = 5_000;
export const NOT_LIVE_AFTER_MS = 15_000;
export const WITHDRAW_ALL_AFTER_MS = 300_000;
