import { collar, highFlow, lowFlow, maskSt, pc, psv, roomAir, vc, vtpc } from '../phases.ts';
import type { Lung, StayPlan } from '../plan.ts';
import { patient } from './patient.ts';

const MENDING: Lung = {
  complianceMlCmH2O: 48,
  resistanceCmH2OPerLS: 8,
  pfMmHg: 290,
  pco2MmHg: 39,
  hco3MmolL: 24,
  trend: 'better',
};
const FAILING: Lung = {
  complianceMlCmH2O: 22,
  resistanceCmH2OPerLS: 9,
  pfMmHg: 72,
  pco2MmHg: 66,
  hco3MmolL: 21,
  trend: 'worse',
};

/** Stays that are over; each ended before the next patient came to the bed. */
export const ENDED_PLANS: { unitKey: string; plan: StayPlan }[] = [
  {
    unitKey: 'harbour',
    plan: {
      bed: '04',
      patient: patient('Bellweather', 'Cormac', 'male', 60, 177),
      admittedHoursAgo: 78,
      left: { hoursAgo: 2.5, outcome: 'ward' },
      lung: MENDING,
      tubes: [
        { placedHoursAgo: 76, outHoursAgo: 24, out: 'planned', kind: 'oral-tube', sizeMm: 8, depthCm: 23 },
      ],
      phases: [
        vc({ from: 76, perKg: 6.3, rate: 18, peep: 8, fio2: 50 }),
        psv({ from: 38, perKg: 7, total: 18, ps: 8, peep: 5, fio2: 35 }),
        highFlow({ from: 24, flow: 40, fio2: 40, total: 20 }),
        lowFlow({ from: 12, flow: 2, total: 18 }),
      ],
      newest: { check: 260, airway: 1620, gas: 700 },
      gasesADay: 3,
      happenings: [
        { kind: 'trial-started', minutesAgo: 1490, method: 'pressure-support', plannedMinutes: 30 },
        { kind: 'trial-passed', minutesAgo: 1458, minutes: 32 },
      ],
    },
  },
  {
    unitKey: 'harbour',
    plan: {
      bed: '04',
      patient: patient('Zielinska', 'Kasia', 'female', 48, 169),
      admittedHoursAgo: 150,
      left: { hoursAgo: 82, outcome: 'ward' },
      lung: MENDING,
      phases: [
        highFlow({ from: 149, flow: 50, fio2: 50, total: 26 }),
        lowFlow({ from: 110, flow: 3, total: 20 }),
      ],
      newest: { check: 5000, airway: null, gas: 5600 },
      gasesADay: 2,
    },
  },
  {
    unitKey: 'harbour',
    plan: {
      bed: '11',
      patient: patient('Costigan', 'Muriel', 'female', 81, 156),
      admittedHoursAgo: 64,
      left: { hoursAgo: 8.5, outcome: 'died' },
      careLimits: 'No escalation',
      lung: FAILING,
      tubes: [{ placedHoursAgo: 62, kind: 'oral-tube', sizeMm: 7, depthCm: 20 }],
      phases: [
        vc({ from: 62, perKg: 6, rate: 24, peep: 12, fio2: 70 }),
        pc({ from: 30, above: 15, rate: 26, peep: 12, fio2: 90 }),
      ],
      newest: { check: 600, airway: 790, gas: 640 },
      gasesADay: 4,
    },
  },
  {
    unitKey: 'harbour',
    plan: {
      bed: '15',
      patient: patient('Delacroix', 'Honoré', 'male', 54, 171),
      admittedHoursAgo: 51,
      left: { hoursAgo: 4.5, outcome: 'other-hospital' },
      lung: MENDING,
      tubes: [{ placedHoursAgo: 50, kind: 'oral-tube', sizeMm: 8, depthCm: 23 }],
      phases: [
        vtpc({ from: 50, perKg: 6.2, rate: 20, peep: 10, fio2: 60 }),
        vtpc({ from: 22, perKg: 6.2, rate: 18, peep: 8, fio2: 45 }),
      ],
      newest: { check: 330, airway: 420, gas: 360 },
      gasesADay: 3,
      happenings: [{ kind: 'left-for-transport', minutesAgo: 275, detail: 'Transfer by road' }],
    },
  },
  {
    unitKey: 'harbour',
    plan: {
      bed: '16',
      patient: patient('Etxeberria', 'Nerea', 'female', 37, 164),
      admittedHoursAgo: 40,
      left: { hoursAgo: 1.6, outcome: 'ward' },
      lung: MENDING,
      phases: [
        maskSt({ from: 39.5, ipap: 12, epap: 6, rate: 12, total: 24, perKg: 7, leak: 20, fio2: 45 }),
        highFlow({ from: 26, flow: 40, fio2: 40, total: 20 }),
        roomAir({ from: 9, total: 16 }),
      ],
      newest: { check: 200, airway: null, gas: 820 },
      gasesADay: 2,
    },
  },
  {
    unitKey: 'lantern',
    plan: {
      bed: '07',
      patient: patient('Goldfinch', 'Winifred', 'female', 63, 160),
      admittedHoursAgo: 96,
      left: { hoursAgo: 6, outcome: 'ward' },
      lung: MENDING,
      tubes: [
        { placedHoursAgo: 95, outHoursAgo: 30, out: 'planned', kind: 'oral-tube', sizeMm: 7, depthCm: 21 },
      ],
      phases: [
        vc({ from: 95, perKg: 6.3, rate: 16, peep: 6, fio2: 45 }),
        psv({ from: 47, perKg: 7, total: 17, ps: 8, peep: 5, fio2: 30 }),
        lowFlow({ from: 30, flow: 2, total: 17 }),
      ],
      newest: { check: 480, airway: 1960, gas: 900 },
      gasesADay: 2,
    },
  },
  {
    unitKey: 'lantern',
    plan: {
      bed: '08',
      patient: patient('Imamura', 'Kenta', 'male', 25, 175),
      admittedHoursAgo: 70,
      left: { hoursAgo: 29, outcome: 'other-hospital' },
      lung: MENDING,
      tubes: [{ placedHoursAgo: 69, kind: 'oral-tube', sizeMm: 7.5, depthCm: 23 }],
      phases: [vtpc({ from: 69, perKg: 6.4, rate: 16, peep: 5, fio2: 40 })],
      newest: { check: 1830, airway: 1960, gas: 1900 },
      gasesADay: 3,
    },
  },
  {
    unitKey: 'orchard',
    plan: {
      bed: '13',
      patient: patient('Jeyaratnam', 'Suresh', 'male', 59, 167),
      admittedHoursAgo: 60,
      left: { hoursAgo: 3.8, outcome: 'ward' },
      lung: MENDING,
      tubes: [
        { placedHoursAgo: 59, outHoursAgo: 21, out: 'planned', kind: 'oral-tube', sizeMm: 8, depthCm: 22 },
      ],
      phases: [
        vtpc({ from: 59, perKg: 6.3, rate: 18, peep: 8, fio2: 45 }),
        psv({ from: 33, perKg: 7, total: 18, ps: 8, peep: 5, fio2: 35 }),
        highFlow({ from: 21, flow: 40, fio2: 35, total: 19 }),
        lowFlow({ from: 10, flow: 2, total: 18 }),
      ],
      newest: { check: 330, airway: 1440, gas: 560 },
      gasesADay: 3,
    },
  },
  {
    unitKey: 'orchard',
    plan: {
      bed: '22',
      patient: patient('Kirwan', 'Aoife', 'female', 45, 170),
      admittedHoursAgo: 240,
      left: { hoursAgo: 18, outcome: 'other-hospital' },
      lung: MENDING,
      tubes: [
        { placedHoursAgo: 238, outHoursAgo: 90, out: 'changed', kind: 'oral-tube', sizeMm: 7.5, depthCm: 22 },
        { placedHoursAgo: 90, kind: 'tracheostomy', sizeMm: 7.5 },
      ],
      phases: [
        vc({ from: 238, perKg: 6.2, rate: 18, peep: 8, fio2: 45 }),
        psv({ from: 80, perKg: 7, total: 18, ps: 10, peep: 5, fio2: 35 }),
        collar({ from: 40, flow: 10, fio2: 30, total: 18 }),
      ],
      newest: { check: 1180, airway: 1300, gas: 1500 },
      gasesADay: 2,
    },
  },
  {
    unitKey: 'orchard',
    plan: {
      bed: '17',
      patient: patient('Lazarević', 'Mila', 'female', 73, 158),
      admittedHoursAgo: 90,
      left: { hoursAgo: 23, outcome: 'died' },
      careLimits: 'Comfort first',
      lung: FAILING,
      phases: [
        maskSt({
          from: 89,
          ipap: 16,
          epap: 8,
          rate: 14,
          total: 28,
          perKg: 6.4,
          leak: 28,
          fio2: 70,
          interface: 'full-face',
        }),
        highFlow({ from: 44, flow: 60, fio2: 90, total: 32 }),
      ],
      newest: { check: 1470, airway: null, gas: 1620 },
      gasesADay: 3,
    },
  },
  {
    unitKey: 'orchard',
    plan: {
      bed: '07',
      patient: patient('Marchetti', 'Gino', 'male', 66, 172),
      admittedHoursAgo: 44,
      left: { hoursAgo: 13, outcome: 'ward' },
      lung: MENDING,
      phases: [
        highFlow({ from: 43.5, flow: 50, fio2: 50, total: 25 }),
        lowFlow({ from: 26, flow: 3, total: 19 }),
      ],
      newest: { check: 960, airway: null, gas: 1100 },
      gasesADay: 2,
    },
  },
  {
    unitKey: 'orchard',
    plan: {
      bed: '24',
      patient: patient('Nwosu', 'Chidi', 'male', 52, 180),
      admittedHoursAgo: 58,
      left: { hoursAgo: 10.5, outcome: 'ward' },
      lung: MENDING,
      tubes: [
        { placedHoursAgo: 57, outHoursAgo: 32, out: 'planned', kind: 'oral-tube', sizeMm: 8, depthCm: 24 },
      ],
      phases: [
        vc({ from: 57, perKg: 6.4, rate: 16, peep: 6, fio2: 40 }),
        psv({ from: 42, perKg: 7, total: 16, ps: 8, peep: 5, fio2: 30 }),
        roomAir({ from: 32, total: 16 }),
      ],
      newest: { check: 780, airway: 2100, gas: 1400 },
      gasesADay: 2,
    },
  },
];
