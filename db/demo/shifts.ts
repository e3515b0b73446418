import type { DemoShift } from './demo-types.ts';

const SHIFT_MINUTES = 720;
/** A shift of twelve hours less its breaks. */
const AVAILABLE_MINUTES = 660;
/** Who leads a unit has less time at the beds. */
const CHARGE_MINUTES = 360;
/** The running shift began about this long before the demo is filled, on a full hour of the unit's clock. */
const BEGAN_MINUTES_AGO = 240;

/** Beds of each person in the shift that runs now. Beds that are not named are unassigned. */
const HARBOUR_BEDS = {
  therapist: ['01', '02', '03', '04', '05'],
  therapist2: ['06', '07', '08', '09', '10'],
  charge: ['11', '12', '13', '14', '16'],
};
const LANTERN_BEDS = {
  'ines.duarte': ['01', '02', '03', '04'],
  'yusuf.demir': ['05', '06', '08'],
  'ilse.maas': [],
};
const ORCHARD_BEDS = {
  'sami.laine': ['01', '02', '03', '04', '05', '06'],
  'priya.nair': ['07', '08', '10', '11', '12'],
  'caleb.okafor': ['14', '15', '16', '17', '19'],
  'lucia.ferrer': ['20', '21', '23', '24'],
  'noor.haddad': [],
};
/** Those who were on before, two a unit; they wrote what is older than the running shift. */
const BEFORE: Record<string, readonly [string, string]> = {
  harbour: ['hana.sato', 'owen.price'],
  lantern: ['yusuf.demir', 'ines.duarte'],
  orchard: ['tomasz.wrona', 'lucia.ferrer'],
};

/** The shift that runs in each unit, published, and the next one of Harbour, still to be divided. */
export function demoShifts({ now, timeZone }: { now: string; timeZone: string }): DemoShift[] {
  const { startsMinutesFromNow, startHour } = runningShift({ now, timeZone });
  const endsMinutesFromNow = startsMinutesFromNow + SHIFT_MINUTES;
  const running = { name: shiftName(startHour), startsMinutesFromNow, endsMinutesFromNow, published: true };
  return [
    { unitKey: 'harbour', ...running, ...divided(HARBOUR_BEDS, 'charge') },
    { unitKey: 'lantern', ...running, ...divided(LANTERN_BEDS, 'ilse.maas') },
    { unitKey: 'orchard', ...running, ...divided(ORCHARD_BEDS, 'noor.haddad') },
    {
      unitKey: 'harbour',
      name: shiftName((startHour + SHIFT_MINUTES / 60) % 24),
      startsMinutesFromNow: endsMinutesFromNow,
      endsMinutesFromNow: endsMinutesFromNow + SHIFT_MINUTES,
      published: false,
      people: ['hana.sato', 'owen.price', 'therapist2'].map((username) => ({
        username,
        minutesAvailable: AVAILABLE_MINUTES,
      })),
      places: [],
    },
  ];
}

/** Who wrote a fact of a bed: whoever had the bed in the shift at that time. */
export function authorOf({
  unitKey,
  bedLabel,
  minutesAgo,
  shifts,
}: {
  unitKey: string;
  bedLabel: string;
  minutesAgo: number;
  shifts: readonly DemoShift[];
}): string {
  const running = shifts.find((shift) => shift.unitKey === unitKey && shift.published);
  const before = BEFORE[unitKey];
  if (!running || !before) throw new RangeError(`no shift runs in a unit "${unitKey}"`);
  const sinceStart = -running.startsMinutesFromNow;
  const placed = running.places.find((place) => place.bedLabel === bedLabel)?.username;
  // A bed that nobody has been given is written of by whoever leads the unit.
  const present = placed ?? running.people.at(-1)?.username ?? before[0];
  if (minutesAgo <= sinceStart) return present;
  const shiftsBack = Math.ceil((minutesAgo - sinceStart) / SHIFT_MINUTES);
  return shiftsBack % 2 === 0 ? present : before[Number(bedLabel) % 2 === 0 ? 0 : 1];
}

function divided(beds: Record<string, string[]>, charge: string): Pick<DemoShift, 'people' | 'places'> {
  return {
    people: Object.keys(beds).map((username) => ({
      username,
      minutesAvailable: username === charge ? CHARGE_MINUTES : AVAILABLE_MINUTES,
    })),
    places: Object.entries(beds).flatMap(([username, labels]) =>
      labels.map((bedLabel) => ({ bedLabel, username })),
    ),
  };
}

/** On the hour, so that its clock times look like a roster's; never about to end, so that a demo has an owner for its beds. */
function runningShift({ now, timeZone }: { now: string; timeZone: string }) {
  const clock = new Intl.DateTimeFormat('en-GB', {
    timeZone,
    hour: '2-digit',
    minute: '2-digit',
    hourCycle: 'h23',
  });
  const parts = new Map(clock.formatToParts(new Date(now)).map(({ type, value }) => [type, Number(value)]));
  const pastTheHour = parts.get('minute') ?? 0;
  const hoursBack = Math.floor(BEGAN_MINUTES_AGO / 60);
  return {
    startsMinutesFromNow: -(hoursBack * 60 + pastTheHour),
    startHour: ((parts.get('hour') ?? 0) - hoursBack + 24) % 24,
  };
}

function shiftName(startHour: number): string {
  return startHour >= 4 && startHour < 16 ? 'Day' : 'Night';
}
