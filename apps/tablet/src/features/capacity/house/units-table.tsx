import type { Capacity } from '@windrow/ventilation/contract/fleet';
import { ageInWords, formatAge } from '@windrow/ventilation/format/age';
import { Fragment } from 'react';
import { MEASURES, type Measure, oldestCheck } from './measures.ts';

type Units = Capacity['units'];

const HEAD = 'sticky left-0 bg-tile py-2 pr-2 text-left';

/** What each unit has and needs, unit by unit and for the house, so that they can be compared along a line. */
export function UnitsTable({ units, now }: { units: Units; now: number }) {
  return (
    // A house of many units is wider than a phone: it scrolls in its frame, which the keyboard must reach.
    <section
      // biome-ignore lint/a11y/noNoninteractiveTabindex: a scrolling region needs the focus to be scrolled by keys
      tabIndex={0}
      aria-label="Units in counts"
      className="overflow-x-auto rounded-xl bg-tile px-3 pb-2 sm:px-4"
    >
      <table className="w-full text-sm sm:text-base">
        <caption className="sr-only">Beds, patients, ventilators and work by unit</caption>
        <thead>
          <tr className="border-ink border-b-2 align-bottom">
            <td className={HEAD} />
            <Column words="House" />
            {units.map(({ unitId, name }) => (
              <Column key={unitId} words={name} />
            ))}
          </tr>
        </thead>
        <tbody>
          {MEASURES.map(({ heading, rows }) => (
            <Fragment key={heading}>
              <tr>
                <th scope="rowgroup" colSpan={units.length + 2} className="pt-4 text-left font-bold">
                  <span className="sticky left-0">{heading}</span>
                </th>
              </tr>
              {rows.map((measure) => (
                <MeasureRow key={measure.words} measure={measure} units={units} />
              ))}
            </Fragment>
          ))}
          <tr className="border-line border-t">
            <th scope="row" className={`${HEAD} font-normal`}>
              oldest check
            </th>
            <AgeCell of={units} now={now} />
            {units.map((unit) => (
              <AgeCell key={unit.unitId} of={[unit]} now={now} />
            ))}
          </tr>
        </tbody>
      </table>
    </section>
  );
}

function Column({ words }: { words: string }) {
  return (
    <th scope="col" className="max-w-28 py-2 pl-2 text-right sm:pl-3 font-bold">
      {words}
    </th>
  );
}

function MeasureRow({ measure: { words, of }, units }: { measure: Measure; units: Units }) {
  const house = units.reduce((sum, unit) => sum + of(unit), 0);
  return (
    <tr className="border-line border-t">
      <th scope="row" className={`${HEAD} font-normal`}>
        {words}
      </th>
      <CountCell count={house} />
      {units.map((unit) => (
        <CountCell key={unit.unitId} count={of(unit)} />
      ))}
    </tr>
  );
}

/** A nought recedes, so that what there is stands out. */
function CountCell({ count }: { count: number }) {
  return (
    <td
      className={`py-2 pl-2 text-right sm:pl-3 text-base sm:text-lg ${count > 0 ? 'font-bold' : 'text-ink-muted'}`}
    >
      {count}
    </td>
  );
}

function AgeCell({ of, now }: { of: Units; now: number }) {
  const at = oldestCheck(of);
  if (at === null) return <td className="py-2 pl-2 text-right sm:pl-3 text-ink-muted">none</td>;
  const minutes = (now - at) / 60_000;
  return (
    <td className="py-2 pl-2 text-right sm:pl-3 text-ink-muted">
      <span aria-hidden="true">{formatAge(minutes)}</span>
      <span className="sr-only">{ageInWords(minutes)}</span>
    </td>
  );
}
