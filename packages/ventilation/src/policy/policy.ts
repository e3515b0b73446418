import { z } from 'zod';

const minutes = z.number().int().min(1).max(20160);

/** Ages, in minutes since a fact was observed, at which it is due, overdue and withdrawn. */
export const AgeLadder = z
  .strictObject({ dueFrom: minutes, overdueFrom: minutes, withdrawFrom: minutes })
  .refine((ladder) => ladder.dueFrom <= ladder.overdueFrom && ladder.overdueFrom <= ladder.withdrawFrom, {
    error: 'dueFrom, overdueFrom and withdrawFrom must not go down',
  });
export type AgeLadder = z.infer<typeof AgeLadder>;

export const AGED_KINDS = ['check', 'airway', 'gas'] as const;
/** The groups of facts that a tile ages apart: settings and readings; depth and cuff; the gas. */
export type AgedKind = (typeof AGED_KINDS)[number];

/** Of two bounds that a flag is judged between, the lower stands below; otherwise every value would be flagged. */
const THRESHOLD_PAIRS = [
  ['vtPerKgNoteMl', 'vtPerKgHighMl'],
  ['pfLowMmHg', 'pfModerateMmHg'],
  ['cuffLowCmH2O', 'cuffHighCmH2O'],
] as const;

const task = z.strictObject({
  minutes: z.number().min(0).max(240),
  everyMinutes: z.number().int().min(15).max(2880),
});

/** What a unit has decided: intervals, thresholds and the minutes its tasks take. Kept by version. */
export const Policy = z.strictObject({
  freshness: z.strictObject({
    check: AgeLadder,
    airway: AgeLadder,
    // A gas is held against the checks of two days; an older one could not be marked as before a change.
    gas: AgeLadder.refine((ladder) => ladder.withdrawFrom <= 2880, {
      error: 'a gas is withdrawn within 2880 minutes',
    }),
  }),
  thresholds: z
    .strictObject({
      vtPerKgHighMl: z.number().min(4).max(15),
      vtPerKgNoteMl: z.number().min(4).max(15),
      plateauHighCmH2O: z.number().min(15).max(60),
      drivingPressureHighCmH2O: z.number().min(5).max(40),
      mechanicalPowerHighJMin: z.number().min(5).max(60),
      intrinsicPeepHighCmH2O: z.number().min(1).max(20),
      fio2HighPercent: z.number().min(30).max(100),
      pfModerateMmHg: z.number().min(50).max(400),
      pfLowMmHg: z.number().min(50).max(400),
      phLow: z.number().min(6.8).max(7.4),
      cuffLowCmH2O: z.number().min(5).max(40),
      cuffHighCmH2O: z.number().min(10).max(60),
      depthMovedCm: z.number().min(0.5).max(10),
      rateAboveSetPerMin: z.number().min(3).max(40),
      /** How long the answers of a readiness screen stand. */
      screenHoldsHours: z.number().min(4).max(48),
      /** From a screen that is met until its breathing trial is due. */
      trialDueHours: z.number().min(0.5).max(24),
      /** A screen sooner than this after the last trial asks for no other. */
      trialAgainHours: z.number().min(1).max(48),
      /** How much of a tube's inner diameter a suction catheter may fill. */
      suctionMaxPercent: z.number().min(30).max(70),
    })
    .superRefine((thresholds, ctx) => {
      if (thresholds.trialDueHours >= thresholds.screenHoldsHours) {
        ctx.addIssue({
          code: 'custom',
          path: ['trialDueHours'],
          input: thresholds.trialDueHours,
          message: `must be below screenHoldsHours, ${thresholds.screenHoldsHours}, not ${thresholds.trialDueHours}: a trial would never be due`,
        });
      }
      for (const [low, high] of THRESHOLD_PAIRS) {
        if (thresholds[low] <= thresholds[high]) continue;
        ctx.addIssue({
          code: 'custom',
          path: [high],
          input: thresholds[high],
          message: `must be at least ${low}, ${thresholds[low]}, not ${thresholds[high]}`,
        });
      }
    }),
  tasks: z.strictObject({
    check: task,
    airwayCare: task,
    inhaledTreatment: task,
    maskCare: task,
    oxygenRound: task,
  }),
  /** The hours in which the wall is dark, in the unit's own time. */
  nightFrom: z.string().regex(/^([01]\d|2[0-3]):[0-5]\d$/),
  nightTo: z.string().regex(/^([01]\d|2[0-3]):[0-5]\d$/),
});
export type Policy = z.infer<typeof Policy>;

/**
 * Where a new unit starts. Intervals and task minutes are common practice and our own invention;
 * thresholds are published limits, with their sources beside the flags that use them.
 */
export const DEFAULT_POLICY: Policy = {
  freshness: {
    check: { dueFrom: 210, overdueFrom: 240, withdrawFrom: 480 },
    airway: { dueFrom: 420, overdueFrom: 480, withdrawFrom: 960 },
    gas: { dueFrom: 1440, overdueFrom: 1440, withdrawFrom: 1440 },
  },
  thresholds: {
    vtPerKgHighMl: 8,
    vtPerKgNoteMl: 6.5,
    plateauHighCmH2O: 30,
    drivingPressureHighCmH2O: 15,
    mechanicalPowerHighJMin: 17,
    intrinsicPeepHighCmH2O: 5,
    fio2HighPercent: 60,
    pfModerateMmHg: 150,
    pfLowMmHg: 100,
    phLow: 7.25,
    cuffLowCmH2O: 20,
    cuffHighCmH2O: 30,
    depthMovedCm: 2,
    rateAboveSetPerMin: 10,
    screenHoldsHours: 24,
    trialDueHours: 4,
    trialAgainHours: 12,
    suctionMaxPercent: 50,
  },
  tasks: {
    check: { minutes: 12, everyMinutes: 240 },
    airwayCare: { minutes: 15, everyMinutes: 480 },
    inhaledTreatment: { minutes: 10, everyMinutes: 360 },
    maskCare: { minutes: 10, everyMinutes: 240 },
    oxygenRound: { minutes: 8, everyMinutes: 480 },
  },
  nightFrom: '20:00',
  nightTo: '07:00',
};

export type Orders = { checkEveryMinutes: number | null; gasEveryMinutes: number | null };

/** The unit's ladder tightened by a stay's orders; an order never loosens it. */
export function ladderFor(freshness: Policy['freshness'], orders: Orders): Policy['freshness'] {
  return {
    check: tightened(freshness.check, orders.checkEveryMinutes),
    airway: freshness.airway,
    gas: tightened(freshness.gas, orders.gasEveryMinutes),
  };
}

function tightened(ladder: AgeLadder, everyMinutes: number | null): AgeLadder {
  if (everyMinutes === null) return ladder;
  // Due in the last eighth of the interval, as the default (210 of 240) is.
  return {
    dueFrom: Math.min(ladder.dueFrom, Math.round(everyMinutes * 0.875)),
    overdueFrom: Math.min(ladder.overdueFrom, everyMinutes),
    withdrawFrom: Math.min(ladder.withdrawFrom, everyMinutes * 2),
  };
}
