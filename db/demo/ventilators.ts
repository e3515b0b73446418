import type { VentilatorClass, VentilatorState } from '@windrow/ventilation/contract/fleet';
import { supportEntry } from '@windrow/ventilation/support/catalogue';
import type { DemoStay, DemoVentilator } from './demo-types.ts';
import { supportNow } from './support-now.ts';

/** On a ventilator by the record, with none of the fleet at the bed: so that the mismatch is to be seen. */
const WITHOUT_MACHINE = { unitKey: 'orchard', bedLabel: '20' };

/** Invented models, named after birds of the marsh. */
const MODELS = {
  'adult-icu': ['Heron 5', 'Heron 3', 'Egret 2'],
  transport: ['Avocet T'],
  noninvasive: ['Plover M'],
  neonatal: ['Wren N'],
} as const satisfies Record<VentilatorClass, readonly string[]>;
const OSCILLATOR = 'Curlew Osc';

const FLEET_SIZE = { 'adult-icu': 40, transport: 8, noninvasive: 8, neonatal: 4 } as const satisfies Record<
  VentilatorClass,
  number
>;

type Idle = { state: Exclude<VentilatorState, 'in-use'>; words: string | null; hoursAgo: number };

/** Where machines are that stand at no bed; whatever a class has beyond these is ready. */
const IDLE: Record<VentilatorClass, readonly Idle[]> = {
  'adult-icu': [
    { state: 'cleaning', words: 'Decontamination', hoursAgo: 2.3 },
    { state: 'cleaning', words: 'Decontamination', hoursAgo: 4.2 },
    { state: 'cleaning', words: 'Decontamination', hoursAgo: 8.1 },
    { state: 'held', words: 'Workshop: flow sensor awaited', hoursAgo: 74 },
    { state: 'held', words: 'Workshop: yearly service', hoursAgo: 29 },
    { state: 'on-loan', words: 'Fenwick Cottage Hospital', hoursAgo: 130 },
  ],
  transport: [
    { state: 'cleaning', words: 'Decontamination', hoursAgo: 5.5 },
    { state: 'held', words: 'Workshop: battery', hoursAgo: 51 },
    { state: 'on-loan', words: 'Ambulance service', hoursAgo: 20 },
  ],
  noninvasive: [
    { state: 'cleaning', words: 'Decontamination', hoursAgo: 1.4 },
    { state: 'held', words: 'Workshop: blower noise', hoursAgo: 98 },
  ],
  neonatal: [{ state: 'held', words: 'Workshop: yearly service', hoursAgo: 33 }],
};

const HOMES = ['harbour', 'orchard', 'lantern', 'orchard', 'harbour'] as const;
const STORES: Record<string, string> = {
  harbour: 'Harbour store',
  orchard: 'Orchard store',
  lantern: 'Lantern store',
};

/** Sixty machines: one in use at each bed with a patient on a ventilator, but for the one that is missing. */
export function demoVentilators(stays: readonly DemoStay[]): DemoVentilator[] {
  const inUse = stays.flatMap(inUseAt);
  const classes = ['adult-icu', 'transport', 'noninvasive', 'neonatal'] as const;
  const fleet = classes.flatMap((machineClass) => {
    const standing = inUse.filter((machine) => machine.class === machineClass);
    const idle = IDLE[machineClass].map((entry) => idleMachine(machineClass, entry));
    const ready = Array.from(
      { length: Math.max(0, FLEET_SIZE[machineClass] - standing.length - idle.length) },
      (_, index) => idleMachine(machineClass, { state: 'ready', words: null, hoursAgo: 6 + index * 9 }),
    );
    return [...standing, ...ready, ...idle].map((machine, index) => withHome(machine, index));
  });
  return fleet.map((machine, index) => ({
    ...machine,
    assetNumber: `SG-V${String(index + 1).padStart(3, '0')}`,
  }));
}

type Machine = Omit<DemoVentilator, 'assetNumber' | 'homeUnitKey'> & { homeUnitKey?: string | null };

function inUseAt(stay: DemoStay): Machine[] {
  const support = supportNow(stay);
  const kind = support && supportEntry(support.id).kind;
  const isMissing = stay.unitKey === WITHOUT_MACHINE.unitKey && stay.bedLabel === WITHOUT_MACHINE.bedLabel;
  if (stay.leftMinutesAgo !== null || !support || isMissing || (kind !== 'invasive' && kind !== 'mask'))
    return [];
  return [
    {
      model: support.id === 'hfov' ? OSCILLATOR : '',
      class: kind === 'mask' ? 'noninvasive' : 'adult-icu',
      state: 'in-use',
      bed: { unitKey: stay.unitKey, bedLabel: stay.bedLabel },
      words: null,
      sinceMinutesAgo: support.sinceMinutesAgo,
    },
  ];
}

function idleMachine(machineClass: VentilatorClass, { state, words, hoursAgo }: Idle): Machine {
  return {
    model: '',
    class: machineClass,
    state,
    bed: null,
    words,
    sinceMinutesAgo: Math.round(hoursAgo * 60),
  };
}

/** A machine in use mostly stands in the unit that it belongs to; some were borrowed from next door. */
function withHome(machine: Machine, index: number): Omit<DemoVentilator, 'assetNumber'> {
  const turn = HOMES[index % HOMES.length] ?? HOMES[0];
  const home = machine.bed && index % 6 !== 5 ? machine.bed.unitKey : turn;
  const models = MODELS[machine.class];
  return {
    ...machine,
    model: machine.model || (models[index % models.length] ?? models[0]),
    homeUnitKey: machine.class === 'neonatal' ? null : home,
    words:
      machine.state === 'ready'
        ? machine.class === 'neonatal'
          ? 'Equipment library'
          : (STORES[home] ?? null)
        : machine.words,
  };
}
