import type { Unit } from '@windrow/ventilation/contract/board';
import { useEffect } from 'react';
import { useAddress } from '../unit/address.ts';
import { isNight } from './is-night.ts';

/** Dark in the hours that the unit calls night; `?theme=night` or `?theme=day` holds one. */
export function useTheme({ now, unit }: { now: number; unit: Unit }): void {
  const held = useAddress('theme');
  const byHour = isNight({ now, ...unit }) ? 'night' : 'day';
  const theme = held === 'night' || held === 'day' ? held : byHour;
  useEffect(() => {
    document.documentElement.dataset.theme = theme;
  }, [theme]);
}
