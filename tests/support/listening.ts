import type { Audience, Beat, BedChanged, Changed, ServerToClient } from '@windrow/ventilation/contract/live';
import { io, type Socket } from 'socket.io-client';
import type { Caller } from './caller.ts';

type Options = { audience?: Audience; origin?: string; site?: string };
type Heard = { beats: Beat[]; beds: BedChanged[]; changed: Changed[]; raw: string[] };

/** An open screen that writes down everything it is told. */
export class Listener {
  readonly heard: Heard = { beats: [], beds: [], changed: [], raw: [] };
  private readonly end: Promise<string>;
  private readonly waiting = new Set<() => void>();

  constructor(private readonly socket: Socket<ServerToClient>) {
    const { heard } = this;
    socket.onAny((...event: unknown[]) => heard.raw.push(JSON.stringify(event)));
    socket.on('beat', (beat) => this.note(() => heard.beats.push(beat)));
    socket.on('bed', (changed) => this.note(() => heard.beds.push(changed)));
    socket.on('changed', (changed) => this.note(() => heard.changed.push(changed)));
    this.end = new Promise((resolve) => socket.once('disconnect', resolve));
  }

  private note(keep: () => unknown): void {
    keep();
    for (const look of this.waiting) look();
  }

  /** Waits until what was heard is enough; fails, and says what was heard, when it never is. */
  async until(isEnough: (heard: Heard) => boolean, withinMs = 10_000): Promise<Heard> {
    await new Promise<void>((resolve, reject) => {
      const look = () => {
        if (!isEnough(this.heard)) return;
        clearTimeout(late);
        this.waiting.delete(look);
        resolve();
      };
      const late = setTimeout(() => {
        this.waiting.delete(look);
        reject(
          new Error(`not told within ${withinMs} ms; heard ${this.heard.raw.join('\n').slice(0, 2_000)}`),
        );
      }, withinMs);
      this.waiting.add(look);
      look();
    });
    return this.heard;
  }

  /** Why the server ended it; fails when it did not soon, and leaves no time for the check that comes by every half minute. */
  ended(withinMs = 10_000): Promise<string> {
    const late = new Promise<string>((_, reject) => {
      setTimeout(() => reject(new Error(`still open after ${withinMs} ms`)), withinMs).unref();
    });
    return Promise.race([this.end, late]);
  }

  /** Forgets what was said on the way in. */
  forget(): void {
    for (const list of Object.values(this.heard)) list.length = 0;
  }

  /** Sends what no screen of ours would. */
  say(event: string, ...words: unknown[]): void {
    // The types hold that a screen says nothing; this is about those that do.
    (this.socket as unknown as Socket).emit(event, ...words);
  }

  get isOpen(): boolean {
    return this.socket.connected;
  }

  close(): void {
    this.socket.disconnect();
  }
}

/** Opens the live link as somebody, and resolves when the server has let them in; rejects when it does not. */
export async function listen(caller: Caller, { audience, origin, site }: Options = {}): Promise<Listener> {
  const extraHeaders: Record<string, string> = { cookie: caller.cookieHeader };
  if (origin) extraHeaders.origin = origin;
  if (site) extraHeaders['sec-fetch-site'] = site;
  const socket: Socket<ServerToClient> = io(caller.url, {
    transports: ['websocket'],
    forceNew: true,
    reconnection: false,
    auth: { audience },
    extraHeaders,
  });
  const listener = new Listener(socket);
  await new Promise<void>((resolve, reject) => {
    socket.once('connect', resolve);
    socket.once('connect_error', (error) => {
      socket.disconnect();
      reject(error);
    });
  });
  // In its rooms from the first beat on; before it nothing that is written can be expected to be told.
  await listener.until(({ beats }) => beats.length > 0);
  return listener;
}
