import type { WorkedOut } from '@windrow/ventilation/notes/worked-out';
import { WorkedOutLink } from '../worked-out-link.tsx';

export type ShownValue = {
  key: string;
  label: string;
  value: string;
  unit: string;
  /** What must be read with it: "not passive". */
  remark?: string | null;
  /** Where it was worked out: how, and from what. */
  from?: WorkedOut | null;
};

/** Numbers with their names below them and their units beside them. */
export function ValueGrid({ title, values }: { title: string; values: readonly ShownValue[] }) {
  if (values.length === 0) return null;
  return (
    <div className="mt-2 first:mt-0">
      <h3 className="text-ink-muted text-sm">{title}</h3>
      <dl className="grid grid-cols-2 gap-x-5 gap-y-1 sm:grid-cols-3 xl:grid-cols-4">
        {values.map(({ key, label, value, unit, remark, from }) => (
          <div key={key} className={`flex flex-col-reverse justify-end ${from ? 'relative min-h-12' : ''}`}>
            <dt className="text-ink-muted text-sm leading-tight">
              {label}
              {remark && <span className="block font-bold text-ink">{remark}</span>}
            </dt>
            <dd className="whitespace-nowrap">
              <span className="font-bold text-xl tabular-nums">
                {from ? (
                  <WorkedOutLink from={from} name={`${value} ${unit}: how ${label} is worked out`}>
                    {value}
                  </WorkedOutLink>
                ) : (
                  value
                )}
              </span>
              {unit && <span className="text-ink-muted text-sm"> {unit}</span>}
            </dd>
          </div>
        ))}
      </dl>
    </div>
  );
}
