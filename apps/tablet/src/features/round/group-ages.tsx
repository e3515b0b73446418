import { AgeMark } from '@windrow/ui/controls/age-mark';
import type { ShownBed } from '@windrow/ventilation/board/shown-bed';
import type { BedStay, FactGroup } from '@windrow/ventilation/contract/board';

const GROUPS: readonly { group: FactGroup; label: string }[] = [
  { group: 'check', label: 'check' },
  { group: 'airway', label: 'airway' },
  { group: 'gas', label: 'gas' },
];

const STATE_WORDS = {
  current: '',
  due: 'due',
  overdue: 'overdue',
  withdrawn: 'withdrawn',
  never: 'none yet',
} as const;

/** How old each group of facts is. Without a device there is no airway to age. */
export function GroupAges({ shown, stay }: { shown: ShownBed; stay: BedStay }) {
  return (
    <dl className="grid grid-cols-3 gap-2 lg:w-64">
      {GROUPS.map(({ group, label }) => {
        const { state, ageMinutes } = shown.groups[group];
        const isMeant = group !== 'airway' || stay.device !== null || ageMinutes !== null;
        return (
          <div key={group} className="flex flex-col items-start">
            <dt className="text-ink-muted text-sm">{label}</dt>
            <dd className="flex flex-col items-start leading-tight">
              <AgeMark state={state} ageMinutes={ageMinutes} />
              <span aria-hidden={ageMinutes !== null} className="text-ink-muted text-sm">
                {isMeant ? STATE_WORDS[state] : 'no device'}
              </span>
            </dd>
          </div>
        );
      })}
    </dl>
  );
}
