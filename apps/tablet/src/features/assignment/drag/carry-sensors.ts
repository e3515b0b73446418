import {
  type CollisionDetection,
  KeyboardCode,
  KeyboardSensor,
  MouseSensor,
  pointerWithin,
  rectIntersection,
  TouchSensor,
  useSensor,
  useSensors,
} from '@dnd-kit/core';
import { stepBetweenRows } from './steps.ts';

/** A press becomes a carry only once it has moved; a touch only once it has rested, so that a swipe scrolls. */
export function useCarrySensors() {
  return useSensors(
    useSensor(MouseSensor, { activationConstraint: { distance: 6 } }),
    useSensor(TouchSensor, { activationConstraint: { delay: 220, tolerance: 8 } }),
    useSensor(KeyboardSensor, {
      coordinateGetter: stepBetweenRows,
      scrollBehavior: 'auto',
      // Enter opens the list of people; only space lifts.
      keyboardCodes: {
        start: [KeyboardCode.Space],
        cancel: [KeyboardCode.Esc],
        end: [KeyboardCode.Space, KeyboardCode.Enter],
      },
    }),
  );
}

/** The row under the finger; for the keyboard, which has none, the row that the block lies in. */
export const rowUnder: CollisionDetection = (args) =>
  args.pointerCoordinates ? pointerWithin(args) : rectIntersection(args);
