import { requireNumber, requireNumbers } from '../units/require-number.ts';

/**
 * The part of each breath that takes up no CO2.
 *
 * @title Dead space fraction
 * @formula `(PaCO2 − PĒCO2) ÷ PaCO2`.
 * @valid with mixed expired CO2 from the whole breath; an end-tidal value is not one.
 *
 * @param input.paco2MmHg arterial CO2 pressure, mmHg (5 to 250).
 * @param input.mixedExpiredPco2MmHg mixed expired CO2 pressure, mmHg (0 to 250), not above the arterial one.
 * @returns fraction, 0–1.
 * @throws RangeError on missing, non-finite or impossible input.
 *
 * @source Bohr, with arterial for alveolar CO2 after Enghoff 1938.
 */
export function deadSpaceFraction({
  paco2MmHg,
  mixedExpiredPco2MmHg,
}: {
  paco2MmHg: number;
  mixedExpiredPco2MmHg: number;
}): number {
  requireNumbers({ paco2MmHg });
  requireNumber('mixedExpiredPco2MmHg', mixedExpiredPco2MmHg, [0, paco2MmHg]);
  return (paco2MmHg - mixedExpiredPco2MmHg) / paco2MmHg;
}
