import { notPassiveWords } from '@windrow/ventilation/board/passive-breath';
import type { ShownBed } from '@windrow/ventilation/board/shown-bed';
import type { BedCheck, BedStay } from '@windrow/ventilation/contract/board';
import { LIMIT_FIELDS, READING_FIELDS, SETTING_FIELDS } from '@windrow/ventilation/entry/fields';
import { formatMoment } from '@windrow/ventilation/format/clock';
import { supportEntry } from '@windrow/ventilation/support/catalogue';
import { checkDerivedLines } from '../derived-in-words.ts';
import { MASK_WORDS, said } from '../entry/words.ts';
import { CheckLadder } from './check-ladder.tsx';
import { FactCard } from './fact-card.tsx';
import { shownDerived, shownValues } from './shown-values.ts';
import { ValueGrid } from './value-grid.tsx';

export type CardProps = { shown: ShownBed; stay: BedStay; now: number; timeZone: string };

export function CheckCard({ shown, stay, now, timeZone }: CardProps) {
  const { check, support } = stay;
  return (
    <FactCard title="Check" group={shown.groups.check} stamp={check} now={now} timeZone={timeZone}>
      {support && (
        <p className="text-lg">
          <span className="font-bold">{support.shortName}</span> · {supportEntry(support.id).fullName}
          <span className="text-ink-muted"> · since {formatMoment(support.sinceAt, now, timeZone)}</span>
        </p>
      )}
      {check && (
        <div className="flex gap-4">
          <CheckValues check={check} predictedBodyWeightKg={stay.predictedBodyWeightKg} />
          <CheckLadder check={check} plateauLimitCmH2O={stay.plateauLimitCmH2O} />
        </div>
      )}
    </FactCard>
  );
}

function CheckValues({
  check,
  predictedBodyWeightKg,
}: {
  check: BedCheck;
  predictedBodyWeightKg: number | null;
}) {
  return (
    <div className="mt-2 min-w-0 grow">
      <ValueGrid
        title={`Settings of ${supportEntry(check.mode).shortName}`}
        values={shownValues(check.settings, SETTING_FIELDS)}
      />
      <ValueGrid
        title="Readings"
        values={shownValues(check.readings, READING_FIELDS).map((shown) =>
          shown.key === 'plateauCmH2O' ? { ...shown, remark: notPassiveWords(check) } : shown,
        )}
      />
      <ValueGrid
        title="Worked out"
        values={shownDerived(checkDerivedLines({ check, predictedBodyWeightKg }))}
      />
      {check.readings.plateauCmH2O !== undefined && notPassiveWords(check) !== null && (
        <p className="mt-1 text-ink-muted">
          The plateau is shown as entered ({notPassiveWords(check)}): no driving pressure, compliance or power
          is worked out from it.
        </p>
      )}
      {predictedBodyWeightKg === null && (
        <p className="text-ink-muted">No height or sex is recorded, so nothing is judged per kg.</p>
      )}
      <ValueGrid title="Alarm limits as set" values={shownValues(check.limits, LIMIT_FIELDS)} />
      <p className="mt-2 text-ink-muted">
        {[
          check.interface && `Mask: ${said(MASK_WORDS, check.interface).toLowerCase()}`,
          check.passive !== null && (check.passive ? 'Patient passive, no effort' : 'Patient made an effort'),
        ]
          .filter(Boolean)
          .join(' · ')}
      </p>
    </div>
  );
}
