import type { TileMark } from '@windrow/ventilation/board/tile/tile-view';

/** Whose bed it is in this shift. Nobody's is a finding, so it has a shape of its own. */
export function Who({ initials, cover }: { initials: string | null; cover: string | null }) {
  if (initials === null) {
    return (
      <span className="tile-who" data-nobody="true">
        <span aria-hidden="true">?</span>
        <span className="sr-only">nobody assigned</span>
      </span>
    );
  }
  return (
    <span className="tile-who" data-long={initials.length > 2}>
      <span className="sr-only">therapist </span>
      {initials}
      {cover !== null && <span className="sr-only">, covered by {cover}</span>}
    </span>
  );
}

/** Words to know before anything is done at the bed, in solid blocks. */
export function Marks({ marks }: { marks: readonly TileMark[] }) {
  if (marks.length === 0) return null;
  return (
    <span className="tile-marks" data-count={marks.length}>
      {marks.map(({ key, lines }) => (
        <span key={key} className="tile-mark" data-mark={key}>
          {lines.map((line) => (
            <span key={line}>{line} </span>
          ))}
        </span>
      ))}
    </span>
  );
}
