import type { PressureLadder } from '@windrow/ventilation/board/tile/pressure-ladder';
import { ladderMarks } from './ladder-marks.ts';

/**
 * A still scale from 0 to 40 cmH2O. The block runs from PEEP to plateau, filled where the plateau was read,
 * an outline where only the mode's own pressure is known; the bar is the peak, the dots are the unit's limit.
 */
export function Ladder({ ladder }: { ladder: PressureLadder }) {
  const { block, base, peak, limit, numbers } = ladderMarks(ladder);
  return (
    <div className="ladder">
      <span className="sr-only">Pressure ladder: {ladder.words}</span>
      {limit !== null && <i className="ladder-limit" style={{ top: `${limit}%` }} />}
      {block && (
        <i
          className="ladder-block"
          data-measured={block.isMeasured}
          style={{ top: `${block.top}%`, height: `${block.height}%` }}
        />
      )}
      <i className="ladder-base" style={{ top: `${base}%` }} />
      {peak !== null && <i className="ladder-peak" style={{ top: `${peak}%` }} />}
      {numbers.map(({ key, value, top }) => (
        <span
          key={key}
          className="ladder-number"
          data-key={key}
          style={{ top: `${top}%` }}
          aria-hidden="true"
        >
          {value}
        </span>
      ))}
    </div>
  );
}
