import type { Phase } from './plan.ts';

// One builder for each entry of the support catalogue; the words are the short ones of the bedside.

type Machine = { from: number; peep: number; fio2: number };

export function vc(p: Machine & { perKg: number; rate: number; total?: number; flow?: number }): Phase {
  return {
    fromHoursAgo: p.from,
    mode: 'ac-vc',
    perKgMl: p.perKg,
    ratePerMin: p.total ?? p.rate,
    settings: {
      rateSetPerMin: p.rate,
      peepCmH2O: p.peep,
      fio2Percent: p.fio2,
      inspiratoryFlowLMin: p.flow ?? 60,
    },
  };
}

export function pc(p: Machine & { above: number; rate: number; total?: number; ti?: number }): Phase {
  return {
    fromHoursAgo: p.from,
    mode: 'ac-pc',
    ratePerMin: p.total ?? p.rate,
    settings: {
      pInspCmH2O: p.above,
      rateSetPerMin: p.rate,
      peepCmH2O: p.peep,
      fio2Percent: p.fio2,
      inspiratoryTimeS: p.ti ?? 0.9,
    },
  };
}

export function vtpc(p: Machine & { perKg: number; rate: number; total?: number; ceiling?: number }): Phase {
  return {
    fromHoursAgo: p.from,
    mode: 'ac-vtpc',
    perKgMl: p.perKg,
    ratePerMin: p.total ?? p.rate,
    settings: {
      rateSetPerMin: p.rate,
      peepCmH2O: p.peep,
      fio2Percent: p.fio2,
      inspiratoryTimeS: 0.9,
      pressureCeilingCmH2O: p.ceiling ?? 35,
    },
  };
}

export function simvVc(
  p: Machine & { perKg: number; rate: number; total: number; ps: number; ownPerKg: number },
): Phase {
  return {
    fromHoursAgo: p.from,
    mode: 'simv-vc',
    perKgMl: p.perKg,
    ownPerKgMl: p.ownPerKg,
    ratePerMin: p.total,
    settings: {
      rateSetPerMin: p.rate,
      psCmH2O: p.ps,
      peepCmH2O: p.peep,
      fio2Percent: p.fio2,
      inspiratoryFlowLMin: 60,
    },
  };
}

export function simvPc(
  p: Machine & { above: number; rate: number; total: number; ps: number; ownPerKg: number },
): Phase {
  return {
    fromHoursAgo: p.from,
    mode: 'simv-pc',
    ownPerKgMl: p.ownPerKg,
    ratePerMin: p.total,
    settings: {
      pInspCmH2O: p.above,
      rateSetPerMin: p.rate,
      psCmH2O: p.ps,
      peepCmH2O: p.peep,
      fio2Percent: p.fio2,
      inspiratoryTimeS: 0.9,
    },
  };
}

export function psv(p: Machine & { perKg: number; total: number; ps: number }): Phase {
  return {
    fromHoursAgo: p.from,
    mode: 'psv',
    perKgMl: p.perKg,
    ratePerMin: p.total,
    settings: { psCmH2O: p.ps, peepCmH2O: p.peep, fio2Percent: p.fio2, cyclePercent: 25 },
  };
}

export function cpap(p: Machine & { perKg: number; total: number }): Phase {
  return {
    fromHoursAgo: p.from,
    mode: 'cpap',
    perKgMl: p.perKg,
    ratePerMin: p.total,
    settings: { peepCmH2O: p.peep, fio2Percent: p.fio2 },
  };
}

export function aprv(p: {
  from: number;
  high: number;
  low: number;
  tHigh: number;
  tLow: number;
  perKg: number;
  total: number;
  fio2: number;
}): Phase {
  return {
    fromHoursAgo: p.from,
    mode: 'aprv',
    perKgMl: p.perKg,
    ownPerKgMl: 2.5,
    ratePerMin: p.total,
    settings: { pHighCmH2O: p.high, pLowCmH2O: p.low, tHighS: p.tHigh, tLowS: p.tLow, fio2Percent: p.fio2 },
  };
}

export function hfov(p: { from: number; mean: number; amplitude: number; hz: number; fio2: number }): Phase {
  return {
    fromHoursAgo: p.from,
    mode: 'hfov',
    ratePerMin: 0,
    settings: {
      meanPressureCmH2O: p.mean,
      amplitudeCmH2O: p.amplitude,
      frequencyHz: p.hz,
      fio2Percent: p.fio2,
      biasFlowLMin: 30,
    },
  };
}

type Mask = {
  from: number;
  fio2: number;
  perKg: number;
  total: number;
  leak: number;
  interface?: Phase['interface'];
};

export function maskSt(p: Mask & { ipap: number; epap: number; rate: number }): Phase {
  return {
    fromHoursAgo: p.from,
    mode: 'niv-st',
    perKgMl: p.perKg,
    ratePerMin: p.total,
    leakLMin: p.leak,
    interface: p.interface ?? 'oronasal',
    settings: { ipapCmH2O: p.ipap, epapCmH2O: p.epap, rateSetPerMin: p.rate, fio2Percent: p.fio2 },
  };
}

export function maskCpap(p: Mask & { cpap: number }): Phase {
  return {
    fromHoursAgo: p.from,
    mode: 'niv-cpap',
    perKgMl: p.perKg,
    ratePerMin: p.total,
    leakLMin: p.leak,
    interface: p.interface ?? 'full-face',
    settings: { cpapCmH2O: p.cpap, fio2Percent: p.fio2 },
  };
}

type Oxygen = { from: number; total: number };

export function highFlow(p: Oxygen & { flow: number; fio2: number }): Phase {
  return {
    fromHoursAgo: p.from,
    mode: 'hfnc',
    ratePerMin: p.total,
    settings: { flowLMin: p.flow, fio2Percent: p.fio2 },
  };
}

export function tPiece(p: Oxygen & { flow: number; fio2: number }): Phase {
  return {
    fromHoursAgo: p.from,
    mode: 'tpiece',
    ratePerMin: p.total,
    settings: { flowLMin: p.flow, fio2Percent: p.fio2 },
  };
}

export function collar(p: Oxygen & { flow: number; fio2: number }): Phase {
  return {
    fromHoursAgo: p.from,
    mode: 'trach-collar',
    ratePerMin: p.total,
    settings: { flowLMin: p.flow, fio2Percent: p.fio2 },
  };
}

/** The oxygen that is breathed on low flow is anybody's guess, and nobody records one. */
export function lowFlow(p: Oxygen & { flow: number }): Phase {
  return { fromHoursAgo: p.from, mode: 'low-flow', ratePerMin: p.total, settings: { flowLMin: p.flow } };
}

export function roomAir(p: Oxygen): Phase {
  return { fromHoursAgo: p.from, mode: 'room-air', ratePerMin: p.total, settings: {} };
}
