import { type ClientRect, KeyboardCode, type KeyboardCoordinateGetter } from '@dnd-kit/core';

/** Where in a row a block carried by the keyboard hangs: clear of the edge, so that it is seen to be inside. */
const INSET_PX = 12;

/**
 * Arrow keys carry a block from row to row, not by pixels: down and right to the next person, up and left
 * to the one before, the tray of beds that nobody has being the last.
 */
export const stepBetweenRows: KeyboardCoordinateGetter = (event, { currentCoordinates, context }) => {
  const step = stepOf(event.code);
  if (step === 0) return undefined;
  event.preventDefault();
  const rows = [...context.droppableRects]
    .filter(([id]) => context.droppableContainers.get(id)?.disabled === false)
    .map(([id, rect]) => ({ id, rect }))
    .sort((a, b) => a.rect.top - b.rect.top);
  const here = rows.findIndex(({ id }) => id === context.over?.id);
  const from = here === -1 ? nearest(rows, currentCoordinates.y) : here;
  const next = rows[Math.min(rows.length - 1, Math.max(0, from + step))];
  return next ? { x: next.rect.left + INSET_PX, y: next.rect.top + INSET_PX } : undefined;
};

function stepOf(code: string): -1 | 0 | 1 {
  if (code === KeyboardCode.Down || code === KeyboardCode.Right) return 1;
  if (code === KeyboardCode.Up || code === KeyboardCode.Left) return -1;
  return 0;
}

function nearest(rows: readonly { rect: ClientRect }[], y: number): number {
  const distances = rows.map(({ rect }) => Math.abs(rect.top - y));
  return distances.indexOf(Math.min(...distances));
}
