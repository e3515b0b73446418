import type { Policy } from '@windrow/ventilation/policy/policy';

export const LADDER_ROWS = [
  { kind: 'check', label: 'Check: settings and readings' },
  { kind: 'airway', label: 'Airway: depth and cuff' },
  { kind: 'gas', label: 'Blood gas' },
] as const satisfies readonly { kind: keyof Policy['freshness']; label: string }[];

export const LADDER_STEPS = [
  { step: 'dueFrom', label: 'due from' },
  { step: 'overdueFrom', label: 'overdue from' },
  { step: 'withdrawFrom', label: 'withdrawn from' },
] as const;

export const TASK_ROWS = [
  { task: 'check', label: 'Check', whom: 'everybody on a ventilator' },
  { task: 'airwayCare', label: 'Airway care', whom: 'everybody with a tube or tracheostomy' },
  { task: 'inhaledTreatment', label: 'Inhaled treatment', whom: 'everybody on a ventilator' },
  { task: 'maskCare', label: 'Mask care', whom: 'mask ventilation' },
  { task: 'oxygenRound', label: 'Oxygen round', whom: 'high flow and oxygen' },
] as const satisfies readonly { task: keyof Policy['tasks']; label: string; whom: string }[];

export const THRESHOLDS = [
  { key: 'vtPerKgHighMl', label: 'Tidal volume, attention above', unit: 'mL/kg', step: 0.1 },
  { key: 'vtPerKgNoteMl', label: 'Tidal volume, note above', unit: 'mL/kg', step: 0.1 },
  { key: 'plateauHighCmH2O', label: 'Plateau above', unit: 'cmH2O', step: 1 },
  { key: 'drivingPressureHighCmH2O', label: 'Driving pressure above', unit: 'cmH2O', step: 1 },
  { key: 'mechanicalPowerHighJMin', label: 'Mechanical power above', unit: 'J/min', step: 1 },
  { key: 'intrinsicPeepHighCmH2O', label: 'Intrinsic PEEP from', unit: 'cmH2O', step: 1 },
  { key: 'fio2HighPercent', label: 'Oxygen (FiO2) from', unit: '%', step: 1 },
  { key: 'pfModerateMmHg', label: 'P/F, note below', unit: 'mmHg', step: 1 },
  { key: 'pfLowMmHg', label: 'P/F, attention below', unit: 'mmHg', step: 1 },
  { key: 'phLow', label: 'pH below', unit: '', step: 0.01 },
  { key: 'cuffLowCmH2O', label: 'Cuff pressure below', unit: 'cmH2O', step: 1 },
  { key: 'cuffHighCmH2O', label: 'Cuff pressure above', unit: 'cmH2O', step: 1 },
  { key: 'depthMovedCm', label: 'Tube moved by', unit: 'cm', step: 0.5 },
  { key: 'rateAboveSetPerMin', label: 'Rate above set by', unit: '/min', step: 1 },
  { key: 'screenHoldsHours', label: 'Readiness screen stands for', unit: 'h', step: 1 },
  { key: 'trialDueHours', label: 'Breathing trial due after the screen', unit: 'h', step: 0.5 },
  { key: 'trialAgainHours', label: 'No second trial within', unit: 'h', step: 1 },
  { key: 'suctionMaxPercent', label: 'Suction catheter fills at most', unit: '% of the tube', step: 1 },
] as const satisfies readonly {
  key: keyof Policy['thresholds'];
  label: string;
  unit: string;
  step: number;
}[];

/** Every value of a policy by its path, with its name: what two versions are compared by. */
export function policyValues(policy: Policy): { path: string; label: string; value: string }[] {
  const ladders = LADDER_ROWS.flatMap(({ kind, label }) =>
    LADDER_STEPS.map(({ step, label: word }) => ({
      path: `freshness.${kind}.${step}`,
      label: `${label}, ${word}`,
      value: shown(policy.freshness[kind][step], 'min'),
    })),
  );
  const thresholds = THRESHOLDS.map(({ key, label, unit }) => ({
    path: `thresholds.${key}`,
    label,
    value: shown(policy.thresholds[key], unit),
  }));
  const tasks = TASK_ROWS.flatMap(({ task, label }) => [
    {
      path: `tasks.${task}.minutes`,
      label: `${label}, minutes each`,
      value: shown(policy.tasks[task].minutes, 'min'),
    },
    {
      path: `tasks.${task}.everyMinutes`,
      label: `${label}, every`,
      value: shown(policy.tasks[task].everyMinutes, 'min'),
    },
  ]);
  const night = [
    { path: 'nightFrom', label: 'Night from', value: policy.nightFrom },
    { path: 'nightTo', label: 'Night to', value: policy.nightTo },
  ];
  return [...ladders, ...thresholds, ...tasks, ...night];
}

/** A field that was emptied holds no number while it is. */
function shown(value: number, unit: string): string {
  return Number.isNaN(value) ? 'nothing' : `${value} ${unit}`.trim();
}
