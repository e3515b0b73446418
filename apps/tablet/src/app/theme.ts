import { useNow } from '@windrow/client/clock/use-now';
import type { Unit } from '@windrow/ventilation/contract/board';
import { minuteOfDay } from '@windrow/ventilation/format/clock';
import { useEffect, useSyncExternalStore } from 'react';
import { recall, remember } from './device-memory.ts';

export type ThemeChoice = 'unit' | 'night' | 'day';

const KEY = 'theme';
const MINUTE_MS = 60_000;
const listeners = new Set<() => void>();
let choice: ThemeChoice = asChoice(recall(KEY));

function asChoice(text: string | null): ThemeChoice {
  return text === 'night' || text === 'day' ? text : 'unit';
}

export function chooseTheme(next: ThemeChoice): void {
  choice = next;
  remember(KEY, next);
  for (const listener of listeners) listener();
}

export function useThemeChoice(): ThemeChoice {
  return useSyncExternalStore(subscribe, () => choice);
}

function subscribe(listener: () => void): () => void {
  listeners.add(listener);
  return () => listeners.delete(listener);
}

/** Night by the unit's own hours, unless this tablet was told otherwise. */
export function useTheme(unit: Pick<Unit, 'nightFrom' | 'nightTo' | 'timeZone'> | null): void {
  const chosen = useThemeChoice();
  const now = useNow(MINUTE_MS);
  const theme = chosen === 'unit' ? (unit ? hourlyTheme({ ...unit, now }) : null) : chosen;

  useEffect(() => {
    if (theme === null) return;
    document.documentElement.dataset.theme = theme;
  }, [theme]);
}

/** Night may run past midnight; its first minute belongs to it, its last does not. */
export function hourlyTheme({
  nightFrom,
  nightTo,
  timeZone,
  now,
}: {
  nightFrom: string;
  nightTo: string;
  timeZone: string;
  now: number;
}): 'night' | 'day' {
  const [from, to, minute] = [minutesOf(nightFrom), minutesOf(nightTo), minuteOfDay(now, timeZone)];
  const isNight = from <= to ? minute >= from && minute < to : minute >= from || minute < to;
  return isNight ? 'night' : 'day';
}

function minutesOf(clock: string): number {
  const [hours, minutes] = clock.split(':').map(Number);
  return (hours ?? 0) * 60 + (minutes ?? 0);
}
