/** A number and what it counts, in two short lines beside it. */
export function Count({ count, words: [above, below] }: { count: number; words: readonly [string, string] }) {
  return (
    <p className="flex items-center gap-2">
      <b className="text-title">{count}</b>
      <span className="text-label leading-tight whitespace-nowrap text-ink-muted">
        {above} <br />
        {below}
      </span>
    </p>
  );
}
