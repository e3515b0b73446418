import { SegmentedChoice } from '@windrow/ui/controls/segmented-tabs';
import type { BedStay } from '@windrow/ventilation/contract/board';
import { useCallback, useState } from 'react';
import { useBed } from './bed-context.ts';
import { deviceInWords } from './device-in-words.ts';
import { earlierOf } from './entry/earlier.ts';
import { NOTHING_BEFORE } from './entry/entry-field.ts';
import { airwayCheckPlan } from './entry/plans/airway-check-plan.ts';
import { airwayPlan, removalPlan } from './entry/plans/airway-plan.ts';
import { DEPTH_MARK_WORDS, said } from './entry/words.ts';
import { RecordingForm } from './recording-form.tsx';

type Act = 'check' | 'place' | 'remove';

const ACTS: readonly { value: Act; label: string }[] = [
  { value: 'check', label: 'Airway check' },
  { value: 'place', label: 'Place a device' },
  { value: 'remove', label: 'Take it out' },
];

/** Without a device there is nothing to check and nothing to take out. */
export function AirwayTab() {
  const { stay } = useBed();
  const [chosen, setChosen] = useState<Act>('check');
  const act = stay.device ? chosen : 'place';
  return (
    <div className="flex flex-col gap-3">
      <div className="flex flex-wrap items-center gap-x-4 gap-y-2">
        {stay.device && (
          <SegmentedChoice label="What to record" options={ACTS} value={act} onChoose={setChosen} />
        )}
        <p className="text-ink-muted">
          {stay.device ? `In place: ${deviceInWords(stay.device)}` : 'No device is in place.'}
        </p>
      </div>
      {act === 'check' && stay.device && <AirwayCheckForm device={stay.device} />}
      {act === 'place' && <PlaceForm />}
      {act === 'remove' && stay.device && <RemoveForm device={stay.device} />}
    </div>
  );
}

type Device = NonNullable<BedStay['device']>;

function AirwayCheckForm({ device }: { device: Device }) {
  const { shown, stored } = useBed();
  const { cuffed, depthMark } = device;
  const planOf = useCallback(
    () =>
      airwayCheckPlan({
        earlier: earlierOf({ shown, group: 'airway' }),
        cuffed,
        mark: depthMark && said(DEPTH_MARK_WORDS, depthMark).toLowerCase(),
      }),
    [shown, cuffed, depthMark],
  );
  return (
    <RecordingForm
      name="airway-check"
      kind="airway-check"
      planOf={planOf}
      latestId={stored.airway?.observationId ?? null}
    />
  );
}

function PlaceForm() {
  const { stored } = useBed();
  return (
    <RecordingForm
      name="airway-place"
      kind="airway"
      planOf={placePlan}
      latestId={stored.device?.observationId ?? null}
    />
  );
}

/** A new device has nothing before it: the last one's size says nothing of this one's. */
function placePlan(values: Readonly<Record<string, string>>) {
  return airwayPlan({ kind: values.kind ?? '', earlier: () => NOTHING_BEFORE });
}

function RemoveForm({ device }: { device: Device }) {
  const { stored } = useBed();
  const words = deviceInWords(device);
  const planOf = useCallback(() => removalPlan({ device: words }), [words]);
  return (
    <RecordingForm
      name="airway-remove"
      kind="airway"
      planOf={planOf}
      latestId={stored.device?.observationId ?? null}
    />
  );
}
