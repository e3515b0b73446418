import type { PolicyDifference } from './policy-merge.ts';

/** Values side by side, where two policies differ. */
export function DifferenceTable({
  differences,
  theirsName,
  mineName,
}: {
  differences: readonly PolicyDifference[];
  theirsName: string;
  mineName: string;
}) {
  return (
    <div className="overflow-x-auto">
      <table className="w-full max-w-3xl text-left">
        <caption className="sr-only">Values that differ</caption>
        <thead>
          <tr className="border-ink border-b-2">
            <th scope="col" className="py-1 pr-4">
              Value
            </th>
            <th scope="col" className="py-1 pr-4">
              {theirsName}
            </th>
            <th scope="col" className="py-1">
              {mineName}
            </th>
          </tr>
        </thead>
        <tbody>
          {differences.map(({ path, label, theirs, mine }) => (
            <tr key={path} className="border-line border-b">
              <th scope="row" className="py-1 pr-4 font-normal">
                {label}
              </th>
              <td className="whitespace-nowrap py-1 pr-4">{theirs}</td>
              <td className="whitespace-nowrap py-1 font-bold">{mine}</td>
            </tr>
          ))}
        </tbody>
      </table>
    </div>
  );
}
