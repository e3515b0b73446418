/** Where a bed can be put down: a person, by id, or the tray of beds that nobody has. */
export const NOBODY = 'nobody';

export function personOf(placeId: string): string | null {
  return placeId === NOBODY ? null : placeId;
}
