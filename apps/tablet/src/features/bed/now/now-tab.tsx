import { may } from '@windrow/ventilation/permissions/permissions';
import { useBed } from '../bed-context.ts';
import { AirwayCard } from './airway-card.tsx';
import { BedVentilator } from './bed-ventilator.tsx';
import { CheckCard } from './check-card.tsx';
import { FlagList } from './flag-list.tsx';
import { GasCard } from './gas-card.tsx';
import { StayActions } from './stay-actions.tsx';

/** What is known of the bed now, each group with its age. */
export function NowTab() {
  const { shown, stay, session, now, timeZone } = useBed();
  const { bed } = shown;
  const { grants } = session;
  return (
    <div className="grid items-start gap-3 lg:grid-cols-[minmax(0,3fr)_minmax(0,2fr)]">
      <div className="flex min-w-0 flex-col gap-3">
        <CheckCard shown={shown} stay={stay} now={now} timeZone={timeZone} />
        <AirwayCard shown={shown} stay={stay} now={now} timeZone={timeZone} />
        <GasCard shown={shown} stay={stay} now={now} timeZone={timeZone} />
      </div>
      <div className="flex min-w-0 flex-col gap-3">
        <FlagList
          flags={stay.flags}
          stayId={stay.stayId}
          mayRecord={may(grants, 'record', bed.unitId)}
          now={now}
          timeZone={timeZone}
        />
        <BedVentilator bed={bed} grants={grants} />
        {may(grants, 'place-stay', bed.unitId) && (
          <StayActions bed={bed} stay={stay} now={now} timeZone={timeZone} />
        )}
      </div>
    </div>
  );
}
