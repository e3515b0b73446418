import type { BedChanged, Changed } from '@windrow/ventilation/contract/live';
import type { Knex } from 'knex';
import type { Logger } from 'pino';
import type { Settings } from './config/settings.ts';
import type { SignIns } from './services/sign-ins.ts';

/** What a committed write tells the screens, and whose connections it ends. */
export type Tell = { beds: BedChanged[]; changed: Changed[]; dropped: string[] };

/** How services speak to open screens without knowing how. */
export type Live = {
  tell: (tell: Tell) => void;
  /** Ends the open connections of a session. */
  drop: (sessionId: string) => void;
};

export type Deps = {
  db: Knex;
  settings: Settings;
  signIns: SignIns;
  live: Live;
  log: Logger;
  version: string;
  /** Whether the record is the invented hospital: a fact of the record, said on every screen. */
  demonstration: boolean;
  /** The server's clock is the clock; tests bring their own. */
  now: () => Date;
};
