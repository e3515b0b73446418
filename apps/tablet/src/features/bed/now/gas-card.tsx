import { GAS_FIELDS } from '@windrow/ventilation/entry/fields';
import { gasDerivedLines } from '../derived-in-words.ts';
import { SITE_WORDS, said } from '../entry/words.ts';
import type { CardProps } from './check-card.tsx';
import { FactCard } from './fact-card.tsx';
import { shownDerived, shownValues } from './shown-values.ts';
import { ValueGrid } from './value-grid.tsx';

export function GasCard({ shown, stay: { gas, predictedBodyWeightKg }, now, timeZone }: CardProps) {
  return (
    <FactCard title="Gas" group={shown.groups.gas} stamp={gas} now={now} timeZone={timeZone}>
      {gas && (
        <>
          <ValueGrid title={said(SITE_WORDS, gas.site)} values={shownValues(gas.values, GAS_FIELDS)} />
          <ValueGrid
            title="Worked out"
            values={shownDerived(gasDerivedLines({ gas, predictedBodyWeightKg }))}
          />
        </>
      )}
    </FactCard>
  );
}
