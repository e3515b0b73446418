// The package's one barrel: the calculations that other programs may call, by the names of the contract.
export { bicarbonate } from './acid-base/bicarbonate.ts';
export { expectedPaco2Winters } from './acid-base/expected-paco2-winters.ts';
export { type GasConsistency, gasConsistency } from './acid-base/gas-consistency.ts';
export { hydrogenIon } from './acid-base/hydrogen-ion.ts';
export { expectedTubeDepth } from './airway/expected-tube-depth.ts';
export { suctionCatheterMaxFr } from './airway/suction-catheter-max-fr.ts';
export { type AgeLadder, type Freshness, freshness } from './freshness/freshness.ts';
export { airwayResistance } from './mechanics/airway-resistance.ts';
export { type BreathTiming, breathTiming } from './mechanics/breath-timing.ts';
export { drivingPressure } from './mechanics/driving-pressure.ts';
export { dynamicCompliance } from './mechanics/dynamic-compliance.ts';
export { mechanicalPowerPressureControl } from './mechanics/mechanical-power-pressure-control.ts';
export { mechanicalPowerVolumeControl } from './mechanics/mechanical-power-volume-control.ts';
export { mechanicalPowerWithoutPlateau } from './mechanics/mechanical-power-without-plateau.ts';
export { staticCompliance } from './mechanics/static-compliance.ts';
export { timeConstant } from './mechanics/time-constant.ts';
export { alveolarArterialGradient } from './oxygenation/alveolar-arterial-gradient.ts';
export { type AlveolarOxygenInput, alveolarOxygen } from './oxygenation/alveolar-oxygen.ts';
export type { ArdsClass } from './oxygenation/ards-bands.ts';
export { berlinClass } from './oxygenation/berlin-class.ts';
export { globalArdsClass } from './oxygenation/global-ards-class.ts';
export { oxygenSaturationIndex } from './oxygenation/oxygen-saturation-index.ts';
export { oxygenationIndex } from './oxygenation/oxygenation-index.ts';
export { peepFio2Step } from './oxygenation/peep-fio2-step.ts';
export { pfRatio } from './oxygenation/pf-ratio.ts';
export { roxIndex } from './oxygenation/rox-index.ts';
export { sfRatio } from './oxygenation/sf-ratio.ts';
export { deadSpaceFraction } from './physiology/dead-space-fraction.ts';
export { minuteVentilation } from './physiology/minute-ventilation.ts';
export { predictedBodyWeight } from './physiology/predicted-body-weight.ts';
export { rapidShallowBreathingIndex } from './physiology/rapid-shallow-breathing-index.ts';
export { rateForTargetPaco2 } from './physiology/rate-for-target-paco2.ts';
export { tidalVolumePerKg } from './physiology/tidal-volume-per-kg.ts';
export { ventilatoryRatio } from './physiology/ventilatory-ratio.ts';
export { erlangB } from './queueing/erlang-b.ts';
export { offeredForBlocking } from './queueing/offered-for-blocking.ts';
export { poissonBinomial } from './queueing/poisson-binomial.ts';
export { serversForBlocking } from './queueing/servers-for-blocking.ts';
export { hacorScore } from './scores/hacor-score.ts';
export { murrayScore } from './scores/murray-score.ts';
export { respiratorySofa } from './scores/respiratory-sofa.ts';
export { blendedFio2 } from './supply/blended-fio2.ts';
export { cylinderDuration } from './supply/cylinder-duration.ts';
export { liquidOxygenGas } from './supply/liquid-oxygen-gas.ts';
export { oxygenFlow } from './supply/oxygen-flow.ts';
export { dailyMinimum } from './surveillance/daily-minimum.ts';
export { infectionRelated } from './surveillance/infection-related.ts';
export {
  type EventParameter,
  type SurveillanceDay,
  type VentilatorEvent,
  ventilatorEvents,
} from './surveillance/ventilator-events.ts';
export { cmH2OFromMmHg } from './units/cmh2o-from-mmhg.ts';
export { hPaFromCmH2O } from './units/hpa-from-cmh2o.ts';
export { kpaFromMmHg } from './units/kpa-from-mmhg.ts';
export { mmHgFromKpa } from './units/mmhg-from-kpa.ts';
