import type { TileChip } from '@windrow/ventilation/board/tile/tile-view';

/** A flag: orchid with a triangle where it asks for a look, an outline in blue where it only informs. */
export function Chip({ level, children }: { level: TileChip['level']; children: string }) {
  return (
    <span className="chip" data-level={level}>
      {level === 'attention' && <Triangle />}
      <span className="sr-only">{level === 'attention' ? 'attention: ' : 'note: '}</span>
      {children}
    </span>
  );
}

/** Drawn, since the typeface has no such sign and another face's would differ from screen to screen. */
function Triangle() {
  return (
    <svg
      viewBox="0 0 12 11"
      className="chip-triangle"
      fill="currentColor"
      aria-hidden="true"
      focusable="false"
    >
      <path d="M6 0 12 11H0z" />
    </svg>
  );
}
