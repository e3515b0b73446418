import { asClockTime, isClockTime } from '@windrow/ventilation/assignment/clock-time';
import {
  dayAfter,
  presetSpan,
  SHIFT_PRESETS,
  type ShiftPreset,
  type ShiftSpan,
  shiftMinutes,
  spanFrom,
} from '@windrow/ventilation/assignment/shift-span';
import { NewShift } from '@windrow/ventilation/contract/shifts';

/** A shift while it is being made: a preset or other times, and who is on with how many minutes. */
export type ShiftDraft = {
  kind: ShiftPreset | 'other';
  /** For other times only. */
  name: string;
  day: string;
  from: string;
  to: string;
  /** Minutes as typed, by person; a person who is not in it is not on. */
  people: Readonly<Record<string, string>>;
};

/** What a shift's length is usually less by: meals and the two handovers. */
const BREAK_MINUTES = 30;

export type ShiftErrors = {
  name?: string;
  span?: string;
  people?: string;
  minutes: Readonly<Record<string, string>>;
};

/** The span that a draft means; null while its times are not whole. */
export function spanOfDraft({
  draft,
  now,
  timeZone,
}: {
  draft: ShiftDraft;
  now: number;
  timeZone: string;
}): ShiftSpan | null {
  if (draft.kind !== 'other') return presetSpan({ preset: draft.kind, now, timeZone });
  const { day } = draft;
  const [from, to] = [asClockTime(draft.from), asClockTime(draft.to)];
  return isClockTime(from) && isClockTime(to) ? spanFrom({ day, from, to, timeZone }) : null;
}

/** The days on which a shift can be made: yesterday, today and the week to come. */
export function daysAround(today: string): string[] {
  return Array.from({ length: 9 }, (_, index) => dayAfter(today, index - 1));
}

export function usualMinutes(span: ShiftSpan | null): number {
  return span ? Math.max(BREAK_MINUTES, shiftMinutes(span) - BREAK_MINUTES) : 690;
}

/** The shift to send, or what is still wrong with it, each beside its field. */
export function shiftFrom(input: {
  draft: ShiftDraft;
  span: ShiftSpan | null;
}): { shift: NewShift } | { errors: ShiftErrors } {
  const { draft, span } = input;
  if (!span) return { errors: { span: 'enter the start and the end, such as 07:00', minutes: {} } };
  const name = draft.kind === 'other' ? draft.name : SHIFT_PRESETS[draft.kind].name;
  const on = Object.entries(draft.people).map(([personId, typed]) => ({
    personId,
    minutesAvailable: minutesOf(typed),
  }));
  const parsed = NewShift.safeParse({ name, ...span, people: on });
  if (parsed.success) return { shift: parsed.data };
  const errors: ShiftErrors = { minutes: {} };
  for (const { path, message } of parsed.error.issues) {
    const [field, index] = path;
    if (field === 'name') errors.name = 'give the shift a name of up to 40 letters';
    else if (field === 'people' && typeof index === 'number') {
      const personId = on[index]?.personId ?? '';
      errors.minutes = { ...errors.minutes, [personId]: 'minutes must be a whole number from 30 to 1440' };
    } else if (field === 'people') errors.people = 'choose who is on';
    else errors.span = message;
  }
  return { errors };
}

function minutesOf(typed: string): number {
  return typed.trim() === '' ? Number.NaN : Number(typed);
}
