import { cuffBand } from '../airway/cuff-band.ts';
import { expectedTubeDepth } from '../airway/expected-tube-depth.ts';
import { suctionCatheter } from '../airway/suction-catheter.ts';
import type { BedStay } from '../contract/board.ts';
import { AIRWAY_FIELDS, PATIENT_FIELDS } from '../entry/fields.ts';
import type { Policy } from '../policy/policy.ts';
import type { Aid, AidRule } from './aid.ts';
import { Collected } from './collect.ts';

export type TubeAid = {
  /** For an oral tube and a known height. */
  expectedDepthCm: number | null;
  depthCm: number | null;
  suction: { atMostFr: number; catheterFr: number | null; atMostPercent: number };
  /** Null without a cuff. */
  cuff: {
    low: number;
    high: number;
    nowCmH2O: number | null;
    state: 'below' | 'within' | 'above' | null;
  } | null;
};

export const TUBE_RULE: AidRule = {
  rule: 'Depth of an oral tube at the teeth: height ÷ 7 − 2.5 cm, a starting point only; the film and the exam decide. Suction catheter: the largest that is sold and fills no more of the inner diameter than the unit allows. Cuff: the unit’s band.',
  source:
    'depth: common practice, read in a secondary page; suction: AARC guideline, Respir Care 2010;55:758–64, rule and band by the unit’s policy',
};

/** What the tube that lies there should be like, and how it was last found. */
export function tubeAid({
  stay,
  thresholds,
}: {
  stay: BedStay;
  thresholds: Policy['thresholds'];
}): Aid<TubeAid> {
  const { device, airway, patient } = stay;
  const collected = new Collected();
  if (!device) return { result: null, inputs: [], missing: ['no tube is in the airway'] };
  collected.use(device.sizeMm, AIRWAY_FIELDS.sizeMm, null);
  const heightCm = collected.use(patient?.heightCm, PATIENT_FIELDS.heightCm, null);
  const depthCm = collected.use(airway?.depthCm, AIRWAY_FIELDS.depthCm, airway);
  const nowCmH2O = collected.use(airway?.cuffCmH2O, AIRWAY_FIELDS.cuffCmH2O, airway);
  const isOral = device.kind === 'oral-tube';
  if (isOral && heightCm === null) collected.lacks('no height, so no expected depth');
  if (!airway) collected.lacks('no current airway check: depth and cuff are not known now');
  const { suctionMaxPercent: atMostPercent } = thresholds;
  return {
    ...collected,
    result: {
      expectedDepthCm: isOral && heightCm !== null ? expectedTubeDepth({ heightCm }) : null,
      depthCm,
      suction: {
        ...suctionCatheter({ tubeInternalDiameterMm: device.sizeMm, atMostPercent }),
        atMostPercent,
      },
      cuff: device.cuffed
        ? {
            low: thresholds.cuffLowCmH2O,
            high: thresholds.cuffHighCmH2O,
            nowCmH2O,
            state: nowCmH2O === null ? null : cuffBand({ cuffCmH2O: nowCmH2O, thresholds }),
          }
        : null,
    },
  };
}
