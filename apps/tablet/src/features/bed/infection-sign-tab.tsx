import { dayIn } from '@windrow/ventilation/format/zoned-time';
import { useState } from 'react';
import { useSearchParams } from 'react-router-dom';
import { useBed } from './bed-context.ts';
import { NOTHING_BEFORE } from './entry/entry-field.ts';
import { infectionSignPlan } from './entry/plans/infection-sign-plan.ts';
import { RecordingForm } from './recording-form.tsx';

/** Enters one sign of infection or one day of treatment; the address says which was wanted. */
export function InfectionSignTab() {
  const [search] = useSearchParams();
  const { now, timeZone } = useBed();
  const [today] = useState(() => dayIn(now, timeZone));
  const sign = search.get('sign') ?? '';
  return (
    <RecordingForm
      key={sign}
      name={`infection-sign-${sign}`}
      kind="infection-sign"
      planOf={planOf}
      initialValues={{ sign, day: today }}
      latestId={null}
      backTo="surveillance"
    />
  );
}

function planOf(values: Readonly<Record<string, string>>) {
  return infectionSignPlan({ sign: values.sign ?? '', earlier: () => NOTHING_BEFORE });
}
