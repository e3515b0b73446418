import { AIRWAY_FIELDS } from '@windrow/ventilation/entry/fields';
import { deviceInWords } from '../device-in-words.ts';
import { CUFF_METHOD_WORDS, POSITION_WORDS, said } from '../entry/words.ts';
import type { CardProps } from './check-card.tsx';
import { FactCard } from './fact-card.tsx';
import { shownValues } from './shown-values.ts';
import { ValueGrid } from './value-grid.tsx';

/** The device itself does not age; where it sits and how its cuff stands do. */
export function AirwayCard({ shown, stay, now, timeZone }: CardProps) {
  const { airway, device } = stay;
  if (!device) {
    return (
      <section aria-label="Airway" className="rounded-xl bg-tile px-4 py-3">
        <h2 className="font-bold text-lg">Airway</h2>
        <p className="text-ink-muted">No device is in place.</p>
      </section>
    );
  }
  return (
    <>
      <FactCard title="Airway check" group={shown.groups.airway} stamp={airway} now={now} timeZone={timeZone}>
        {airway && (
          <>
            <ValueGrid
              title="Depth and cuff"
              values={shownValues(
                {
                  ...(airway.depthCm === null ? {} : { depthCm: airway.depthCm }),
                  ...(airway.cuffCmH2O === null ? {} : { cuffCmH2O: airway.cuffCmH2O }),
                },
                AIRWAY_FIELDS,
              )}
            />
            <p className="mt-2 text-ink-muted">
              {[
                airway.cuffMethod && `cuff by ${said(CUFF_METHOD_WORDS, airway.cuffMethod).toLowerCase()}`,
                airway.position && `at the ${said(POSITION_WORDS, airway.position).toLowerCase()}`,
                airway.secured !== null && (airway.secured ? 'secured' : 'not secured'),
              ]
                .filter(Boolean)
                .join(' · ')}
            </p>
          </>
        )}
      </FactCard>
      <p className="rounded-xl bg-tile px-4 py-3">
        <span className="font-bold">Device: </span>
        {deviceInWords(device)}
      </p>
    </>
  );
}
