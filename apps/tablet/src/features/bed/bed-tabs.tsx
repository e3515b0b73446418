import { useUnfinished } from '@windrow/client/writes/drafts';
import { SegmentedTabs, segmentClass } from '@windrow/ui/controls/segmented-tabs';
import type { Bed } from '@windrow/ventilation/contract/board';
import { type Grant, may } from '@windrow/ventilation/permissions/permissions';
import { NavLink } from 'react-router-dom';

const TABS = [
  { to: 'now', label: 'Now', draft: null, records: false },
  { to: 'check', label: 'Check', draft: 'check', records: true },
  { to: 'airway', label: 'Airway', draft: 'airway', records: true },
  { to: 'gas', label: 'Gas', draft: 'gas', records: true },
  { to: 'happening', label: 'Happening', draft: 'happening', records: true },
  { to: 'readiness', label: 'Readiness', draft: null, records: false },
  { to: 'aids', label: 'Aids', draft: null, records: false },
  { to: 'surveillance', label: 'Surveillance', draft: 'infection-sign', records: false },
  { to: 'record', label: 'Record', draft: null, records: false },
] as const;

/** Who may not record sees what is known, and no forms. A tab with something unrecorded in it says so. */
export function BedTabs({ bed, stayId, grants }: { bed: Bed; stayId: string; grants: readonly Grant[] }) {
  const unfinished = useUnfinished();
  const mayRecord = may(grants, 'record', bed.unitId);
  const open = TABS.filter(({ records }) => mayRecord || !records);
  return (
    <SegmentedTabs label={`Bed ${bed.label}`}>
      {open.map(({ to, label, draft }) => {
        const isWaiting = draft !== null && unfinished.some((key) => key.startsWith(`${stayId}/${draft}`));
        return (
          <NavLink
            key={to}
            to={`/beds/${bed.unitId}/${bed.bedId}/${to}`}
            className={({ isActive }) => segmentClass(isActive)}
          >
            {label}
            {isWaiting && (
              <>
                <span aria-hidden="true">…</span>
                <span className="sr-only">, not recorded yet</span>
              </>
            )}
          </NavLink>
        );
      })}
    </SegmentedTabs>
  );
}
