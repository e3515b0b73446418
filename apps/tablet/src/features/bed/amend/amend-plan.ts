import type { RecordEntry } from '@windrow/ventilation/contract/observations';
import { asRowValue, earlierOfBody, flattened } from '../entry/earlier.ts';
import type { EntryPlan } from '../entry/entry-plan.ts';
import { airwayCheckPlan } from '../entry/plans/airway-check-plan.ts';
import { airwayPlan, removalPlan } from '../entry/plans/airway-plan.ts';
import { checkPlan } from '../entry/plans/check-plan.ts';
import { gasPlan } from '../entry/plans/gas-plan.ts';
import { happeningPlan, namesCriterion } from '../entry/plans/happening-plan.ts';
import { infectionSignPlan } from '../entry/plans/infection-sign-plan.ts';
import { REASON_SECTION } from '../entry/plans/stay-plans.ts';
import type { Earlier } from '../entry/rows.ts';

type Texts = Readonly<Record<string, string>>;

/** The form that made a fact, over what stands in the record, and the reason why it is mended. */
export function amendPlan({
  entry,
  values,
  ageMinutes,
}: {
  entry: RecordEntry;
  values: Texts;
  ageMinutes: number;
}): EntryPlan {
  const plan = planOf({ entry, values, earlier: earlierOfBody({ body: entry.body, ageMinutes }) });
  return { ...plan, sections: [...plan.sections, REASON_SECTION] };
}

function planOf({
  entry,
  values,
  earlier,
}: {
  entry: RecordEntry;
  values: Texts;
  earlier: Earlier;
}): EntryPlan {
  switch (entry.kind) {
    case 'check':
      return checkPlan({ mode: values.mode ?? '', earlier });
    case 'gas':
      return gasPlan({ earlier, asSet: earlier });
    case 'airway':
      return entry.body.event === 'removed'
        ? removalPlan({ device: null })
        : airwayPlan({ kind: values.kind ?? '', earlier });
    case 'airway-check':
      return airwayCheckPlan({ earlier, cuffed: true, mark: null });
    case 'happening':
      return happeningPlan({ kind: values.kind ?? '', earlier, hasCriteria: namesCriterion(values) });
    case 'infection-sign':
      return infectionSignPlan({ sign: values.sign ?? '', earlier });
    case 'acknowledgement':
      throw new RangeError('an acknowledgement is not amended');
    case 'details':
    case 'place':
      throw new RangeError(`${entry.kind} is corrected on the bed's own pages`);
  }
}

/** Whether an entry of this kind can be amended from the record. */
export function isAmendable({ kind }: Pick<RecordEntry, 'kind'>): boolean {
  return kind !== 'details' && kind !== 'place' && kind !== 'acknowledgement';
}

/** The recorded values as texts, so that the form opens with what stands in the record. */
export function textsOf(body: RecordEntry['body']): Record<string, string> {
  const { observedAt: _time, confirmedUnusual: _kept, event: _event, ...values } = flattened(body);
  return Object.fromEntries(
    Object.entries(values).flatMap(([key, value]) => {
      const rowValue = asRowValue(value);
      return rowValue === null ? [] : [[key, String(rowValue)]];
    }),
  );
}
