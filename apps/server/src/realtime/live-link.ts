import type { Server as HttpServer } from 'node:http';
import { bedForAudience } from '@windrow/ventilation/board/for-audience';
import {
  type Audience,
  BEAT_EVERY_MS,
  type Beat,
  type ServerToClient,
} from '@windrow/ventilation/contract/live';
import { may } from '@windrow/ventilation/permissions/permissions';
import { Server, type Socket } from 'socket.io';
import type { Deps, Live, Tell } from '../deps.ts';
import { isSameOrigin } from '../http/middleware/same-origin.ts';
import { allUnits, houseRevision } from '../queries/units.ts';
import { readyInUnit } from '../queries/ventilators.ts';
import type { SignedIn } from '../services/sign-ins.ts';

const SESSION_CHECK_EVERY_BEATS = 6;

const unitRoom = (unitId: string, audience: Audience) => `unit:${unitId}:${audience}`;
const sessionRoom = (sessionId: string) => `session:${sessionId}`;
const HOUSE_ROOM = 'house';
/** Signed in, but hearing no unit's beds (biomedical, administration): they still must know that the link lives. */
const NO_UNIT_ROOM = 'no-unit';

type Sockets = Server<
  Record<string, never>,
  ServerToClient,
  Record<string, never>,
  { person: SignedIn; cookie: string }
>;
type LiveSocket = Socket<
  Record<string, never>,
  ServerToClient,
  Record<string, never>,
  { person: SignedIn; cookie: string }
>;

/**
 * Open screens. A connection is let in by its session's cookie and its origin; the server alone decides
 * which rooms it is in. Clients send nothing: every write goes over HTTP, where it has a key and an answer.
 */
export function openLiveLink(httpServer: HttpServer, deps: Deps): Live & { close: () => Promise<void> } {
  const io: Sockets = new Server(httpServer, {
    transports: ['websocket'],
    perMessageDeflate: false,
    maxHttpBufferSize: 16_384,
    serveClient: false,
    pingInterval: BEAT_EVERY_MS,
    pingTimeout: BEAT_EVERY_MS,
    allowRequest: (req, allow) => allow(null, isSameOrigin(req, deps.settings.origin)),
  });

  io.use((socket, next) => {
    const cookie = socket.handshake.headers.cookie ?? '';
    deps.signIns
      .whoIs(cookie)
      .then(({ person }) => {
        if (person) socket.data = { person, cookie };
        next(person ? undefined : new Error('not signed in'));
      })
      .catch((error: unknown) => {
        deps.log.error({ err: error }, 'a session could not be read');
        next(new Error('not now'));
      });
  });
  io.on('connection', (socket) => {
    welcome(deps, socket).catch((error: unknown) => {
      deps.log.error({ err: error }, 'a screen could not be let in');
      socket.disconnect(true);
    });
  });

  const beats = setInterval(
    () => void beat(deps, io).catch((error: unknown) => deps.log.error({ err: error }, 'a beat failed')),
    BEAT_EVERY_MS,
  );
  beats.unref();
  const checks = setInterval(
    () =>
      void dropEnded(deps, io).catch((error: unknown) =>
        deps.log.error({ err: error }, 'a session check failed'),
      ),
    BEAT_EVERY_MS * SESSION_CHECK_EVERY_BEATS,
  );
  checks.unref();

  return {
    tell: (tell) => tellRooms(deps, io, tell),
    drop: (sessionId) => void io.in(sessionRoom(sessionId)).disconnectSockets(true),
    close: async () => {
      clearInterval(beats);
      clearInterval(checks);
      await io.close();
    },
  };
}

async function welcome(deps: Deps, socket: LiveSocket): Promise<void> {
  const { person } = socket.data;
  const hearsUnits = await joinRooms(deps, socket);
  // A screen is live from its first second, not from the next beat on.
  for (const event of await beatsNow(deps)) {
    const isHeard = event.unitId === null ? !hearsUnits : audienceOf(person, event.unitId, null) !== null;
    if (isHeard) socket.emit('beat', event);
  }
}

/** Every room that the person of a connection may hear; says whether a unit is among them. */
async function joinRooms(deps: Deps, socket: LiveSocket): Promise<boolean> {
  const { person } = socket.data;
  const rooms = [sessionRoom(person.sessionId)];
  for (const unit of await allUnits(deps.db)) {
    const audience = audienceOf(person, unit.id, socket.handshake.auth.audience);
    if (audience) rooms.push(unitRoom(unit.id, audience));
  }
  const hearsUnits = rooms.some((room) => room.startsWith('unit:'));
  await socket.join([...rooms, HOUSE_ROOM, ...(hearsUnits ? [] : [NO_UNIT_ROOM])]);
  if (hearsUnits) await socket.leave(NO_UNIT_ROOM);
  return hearsUnits;
}

/** A unit that is new is heard on the screens that were open before it, or they would take their silence for calm. */
async function joinNewUnits(deps: Deps, io: Sockets): Promise<void> {
  for (const socket of io.sockets.sockets.values()) await joinRooms(deps, socket);
}

/** What a connection may hear of a unit. A wall asks to hear as a display even where its person may see more. */
function audienceOf(person: SignedIn, unitId: string, asked: unknown): Audience | null {
  if (!may(person.grants, 'see-board', unitId)) return null;
  return asked !== 'display' && may(person.grants, 'see-people', unitId) ? 'staff' : 'display';
}

/** One beat a unit, with its revision, so that a screen that missed a change notices; one for those who hear no unit. */
async function beatsNow({ db, now, version }: Deps): Promise<Beat[]> {
  const serverTime = now().toISOString();
  const beats: Beat[] = [
    { serverTime, version, unitId: null, revision: await houseRevision(db), ventilatorsReady: 0 },
  ];
  for (const unit of await allUnits(db)) {
    beats.push({
      serverTime,
      version,
      unitId: unit.id,
      revision: unit.revision,
      ventilatorsReady: await readyInUnit(db, unit.id),
    });
  }
  return beats;
}

async function beat(deps: Deps, io: Sockets): Promise<void> {
  for (const event of await beatsNow(deps)) {
    if (event.unitId === null) io.to(NO_UNIT_ROOM).emit('beat', event);
    else io.to([unitRoom(event.unitId, 'staff'), unitRoom(event.unitId, 'display')]).emit('beat', event);
  }
}

/** Each changed bed to the rooms of its unit, already cut to what each may see. */
function tellRooms(deps: Deps, io: Sockets, { beds, changed, dropped }: Tell): void {
  const at = deps.now().toISOString();
  for (const { revision, unitId, bed } of beds) {
    for (const audience of ['staff', 'display'] as const) {
      io.to(unitRoom(unitId, audience)).emit('bed', {
        revision,
        unitId,
        bed: bedForAudience({ bed, audience, now: at }),
      });
    }
  }
  for (const event of changed) {
    // Shifts are their unit's affair; the rest is also told to those who set a unit up and hear no beds of it.
    const rooms =
      event.topic === 'shifts' && event.unitId !== null
        ? [unitRoom(event.unitId, 'staff'), unitRoom(event.unitId, 'display')]
        : [HOUSE_ROOM];
    io.to(rooms).emit('changed', event);
  }
  if (changed.some(({ topic }) => topic === 'units')) {
    joinNewUnits(deps, io).catch((error: unknown) =>
      deps.log.error({ err: error }, 'a new unit is not heard'),
    );
  }
  for (const sessionId of dropped) io.in(sessionRoom(sessionId)).disconnectSockets(true);
}

/** Ends connections whose session has ended, or whose person may no longer sign in; renews the others'. */
async function dropEnded({ signIns }: Deps, io: Sockets): Promise<void> {
  const bySession = new Map<string, LiveSocket[]>();
  for (const socket of io.sockets.sockets.values()) {
    const { sessionId } = socket.data.person;
    bySession.set(sessionId, [...(bySession.get(sessionId) ?? []), socket]);
  }
  for (const sockets of bySession.values()) {
    const { person } = await signIns.whoIs(sockets[0]?.data.cookie);
    if (!person) for (const socket of sockets) socket.disconnect(true);
  }
}
