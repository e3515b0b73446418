import type { Lung } from './plan.ts';

/** What the lungs were like so many hours before the end of the story. */
export function lungAt(lung: Lung, hoursBefore: number): Lung {
  const hours = Math.max(0, hoursBefore);
  if (lung.trend === 'steady') return lung;
  const [pf, compliance, pco2] =
    lung.trend === 'better'
      ? [1 - Math.min(0.4, 0.008 * hours), 1 - Math.min(0.2, 0.004 * hours), Math.min(6, 0.12 * hours)]
      : [1 + Math.min(0.7, 0.018 * hours), 1 + Math.min(0.3, 0.007 * hours), -Math.min(6, 0.15 * hours)];
  return {
    ...lung,
    pfMmHg: lung.pfMmHg * pf,
    complianceMlCmH2O: lung.complianceMlCmH2O * compliance,
    pco2MmHg: lung.pco2MmHg + pco2,
  };
}
