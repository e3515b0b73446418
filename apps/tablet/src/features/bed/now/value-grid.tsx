export type ShownValue = { key: string; label: string; value: string; unit: string };

/** Numbers with their names below them and their units beside them. */
export function ValueGrid({ title, values }: { title: string; values: readonly ShownValue[] }) {
  if (values.length === 0) return null;
  return (
    <div className="mt-2 first:mt-0">
      <h3 className="text-ink-muted text-sm">{title}</h3>
      <dl className="grid grid-cols-2 gap-x-5 gap-y-1 sm:grid-cols-3 xl:grid-cols-4">
        {values.map(({ key, label, value, unit }) => (
          <div key={key} className="flex flex-col-reverse">
            <dt className="text-ink-muted text-sm leading-tight">{label}</dt>
            <dd className="whitespace-nowrap">
              <span className="font-bold text-xl tabular-nums">{value}</span>
              {unit && <span className="text-ink-muted text-sm"> {unit}</span>}
            </dd>
          </div>
        ))}
      </dl>
    </div>
  );
}
