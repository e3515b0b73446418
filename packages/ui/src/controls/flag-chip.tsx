/** A flag in a few words: attention as a filled chip with its sign, a note as an outline. */
export function FlagChip({ level, children }: { level: 'note' | 'attention'; children: string }) {
  const look = level === 'attention' ? 'bg-flag text-flag-ink' : 'border-2 border-note text-note';
  return (
    <span
      data-level={level}
      className={`inline-flex items-center gap-1.5 rounded-md px-2 py-0.5 font-bold text-base leading-snug ${look}`}
    >
      {level === 'attention' && <span aria-hidden="true">▲</span>}
      <span className="sr-only">{level === 'attention' ? 'Attention: ' : 'Note: '}</span>
      {children}
    </span>
  );
}
