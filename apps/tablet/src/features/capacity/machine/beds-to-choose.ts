import type { Bed } from '@windrow/ventilation/contract/board';
import { isOnVentilator } from '@windrow/ventilation/support/catalogue';

/** Open beds without a machine, those that by the record need one first. A bed has one machine at a time. */
export function bedsToChoose(beds: readonly Bed[]): { value: string; label: string }[] {
  return beds
    .filter((bed) => bed.isOpen && bed.ventilator === null)
    .sort((a, b) => rank(a) - rank(b) || a.label.localeCompare(b.label, 'en', { numeric: true }))
    .map((bed) => ({ value: bed.bedId, label: `${bed.label} · ${words(bed)}` }));
}

function rank({ stay }: Bed): number {
  if (!stay) return 2;
  return stay.support && isOnVentilator(stay.support.id) ? 0 : 1;
}

function words({ stay }: Bed): string {
  if (!stay) return 'empty';
  if (!stay.support) return 'support not recorded';
  return isOnVentilator(stay.support.id)
    ? `${stay.support.shortName}, no machine yet`
    : stay.support.shortName;
}
