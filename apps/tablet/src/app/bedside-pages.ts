import type { Session } from '@windrow/ventilation/contract/session';
import { mayAnywhere } from '@windrow/ventilation/permissions/permissions';
import { useEffect } from 'react';

/** Every page of the bedside, by name. The router fetches one when it is opened; here they are fetched ahead. */
export const BEDSIDE = {
  round: () => import('../features/round/round-page.tsx').then(({ RoundPage }) => RoundPage),
  bed: () => import('../features/bed/bed-page.tsx').then(({ BedPage }) => BedPage),
  now: () => import('../features/bed/now/now-tab.tsx').then(({ NowTab }) => NowTab),
  check: () => import('../features/bed/check-tab.tsx').then(({ CheckTab }) => CheckTab),
  airway: () => import('../features/bed/airway-tab.tsx').then(({ AirwayTab }) => AirwayTab),
  gas: () => import('../features/bed/gas-tab.tsx').then(({ GasTab }) => GasTab),
  happening: () => import('../features/bed/happening-tab.tsx').then(({ HappeningTab }) => HappeningTab),
  transfer: () => import('../features/bed/place/transfer-tab.tsx').then(({ TransferTab }) => TransferTab),
  end: () => import('../features/bed/place/end-tab.tsx').then(({ EndTab }) => EndTab),
  readiness: () => import('../features/readiness/readiness-tab.tsx').then(({ ReadinessTab }) => ReadinessTab),
  aids: () => import('../features/aids/aids-tab.tsx').then(({ AidsTab }) => AidsTab),
  record: () => import('../features/record/record-tab.tsx').then(({ RecordTab }) => RecordTab),
  surveillance: () =>
    import('../features/surveillance/surveillance-tab.tsx').then(({ SurveillanceTab }) => SurveillanceTab),
  infectionSign: () =>
    import('../features/bed/infection-sign-tab.tsx').then(({ InfectionSignTab }) => InfectionSignTab),
  amend: () => import('../features/bed/amend/amend-tab.tsx').then(({ AmendTab }) => AmendTab),
  details: () => import('../features/admission/correct-tab.tsx').then(({ CorrectTab }) => CorrectTab),
  admit: () => import('../features/admission/admit-page.tsx').then(({ AdmitPage }) => AdmitPage),
} as const;

const QUIET_AFTER_MS = 2_000;

/**
 * The wireless can drop between two beds. Whoever works at beds has all of these pages on the tablet soon
 * after signing in, so that a form still opens and keeps what is typed.
 */
export function useBedsidePages(session: Session): void {
  const isAtBeds = mayAnywhere(session.grants, 'see-people');
  useEffect(() => {
    if (!isAtBeds) return;
    const timer = setTimeout(() => {
      for (const fetchPage of Object.values(BEDSIDE)) {
        // Not there yet is no fault: the page is fetched again when it is opened.
        fetchPage().catch(() => undefined);
      }
    }, QUIET_AFTER_MS);
    return () => clearTimeout(timer);
  }, [isAtBeds]);
}
