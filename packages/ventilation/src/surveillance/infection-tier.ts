import type { EnteredSigns, InfectionTier, SurveillanceEvent } from '../contract/surveillance.ts';
import { formatDay } from '../format/clock.ts';
import { dayNumber } from '../units/calendar-day.ts';
import { isTemperatureSign, isWhiteCellSign } from './infection-limits.ts';
import { infectionRelated } from './infection-related.ts';
import { QUALIFYING_DAYS_NEEDED, runFromWindow } from './qualifying-days.ts';

/**
 * The second tier of an event by what was entered by hand: the verdict of `infectionRelated`, the signs that were
 * found in the window, the qualifying antimicrobial days, and in words what is missing.
 *
 * @source CDC NHSN, ventilator-associated event protocol, through `infectionRelated`.
 */
export function infectionTier({
  event,
  entered,
}: {
  event: SurveillanceEvent;
  entered: EnteredSigns;
}): InfectionTier {
  const { temperatures, whiteCells, antimicrobialDays } = entered;
  const { ivac, qualifyingDays } = infectionRelated({ event, temperatures, whiteCells, antimicrobialDays });
  const signs = signsIn(event.window, entered);
  const longestRun = runFromWindow(
    qualifyingDays.map((day) => dayNumber('day', day)),
    { last: dayNumber('window', event.window.last) },
  );
  return {
    ivac,
    signs,
    qualifyingDays,
    longestRun,
    missing: [
      ...(signs.length > 0 ? [] : [missingSign(event.window, entered)]),
      ...(longestRun >= QUALIFYING_DAYS_NEEDED ? [] : [missingDays(event.window, longestRun)]),
    ],
  };
}

type Window = SurveillanceEvent['window'];

function isIn({ first, last }: Window, day: string): boolean {
  return day >= first && day <= last;
}

function signsIn(window: Window, { temperatures, whiteCells }: EnteredSigns): string[] {
  return [
    ...temperatures
      .filter(({ day, celsius }) => isIn(window, day) && isTemperatureSign(celsius))
      .map(
        ({ day, celsius }) =>
          `${celsius.toFixed(1)}\u00a0°C on ${formatDay(day)}, ${celsius > 38 ? 'above 38.0' : 'below 36.0'}`,
      ),
    ...whiteCells
      .filter(({ day, perMm3 }) => isIn(window, day) && isWhiteCellSign(perMm3))
      .map(
        ({ day, perMm3 }) =>
          `White cells ${perMm3}\u00a0/mm3 on ${formatDay(day)}, ${perMm3 >= 12_000 ? '12,000 or more' : '4,000 or fewer'}`,
      ),
  ];
}

function missingSign(window: Window, { temperatures, whiteCells }: EnteredSigns): string {
  const isAnyEntered = [...temperatures, ...whiteCells].some(({ day }) => isIn(window, day));
  const when = `from ${formatDay(window.first)} to ${formatDay(window.last)}`;
  return isAnyEntered
    ? `A sign of infection: nothing entered ${when} is above 38.0 or below 36.0\u00a0°C, or 12,000 or more or 4,000 or fewer white cells per mm3.`
    : `A sign of infection: no temperature and no white cells are entered ${when}.`;
}

function missingDays({ first, last }: Window, longestRun: number): string {
  const when = `from ${formatDay(first)} to ${formatDay(last)}`;
  return longestRun === 0
    ? `A new antimicrobial: none is entered that was first given ${when} and not on the two days before.`
    : `Antimicrobial days: ${longestRun} of the ${QUALIFYING_DAYS_NEEDED} in a row that are needed, beginning ${when}.`;
}
