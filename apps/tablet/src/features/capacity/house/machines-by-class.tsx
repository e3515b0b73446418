import { type Capacity, VENTILATOR_STATES, type VentilatorState } from '@windrow/ventilation/contract/fleet';
import { Link } from 'react-router-dom';
import { MachineMark } from '../machine/machine-mark.tsx';

type ClassCounts = Capacity['classes'][number];

const ROWS = [
  { state: 'in-use', count: 'inUse' },
  { state: 'ready', count: 'ready' },
  { state: 'cleaning', count: 'cleaning' },
  { state: 'held', count: 'held' },
  { state: 'on-loan', count: 'onLoan' },
] as const satisfies readonly { state: VentilatorState; count: keyof ClassCounts['counts'] }[];

/** Every machine of the house as one mark, by class and state. A row opens the machines behind it. */
export function MachinesByClass({ classes }: { classes: Capacity['classes'] }) {
  const inHouse = classes.filter(({ counts }) => ROWS.some(({ count }) => counts[count] > 0));
  if (inHouse.length === 0) return <p>The fleet has no machines yet.</p>;
  return (
    <div className="grid gap-x-8 gap-y-4 sm:grid-cols-2 lg:grid-cols-1">
      {inHouse.map((each) => (
        <section key={each.class} aria-labelledby={`class-${each.class}`}>
          <h3 id={`class-${each.class}`} className="font-bold text-lg">
            {each.label}
          </h3>
          <ul>
            {ROWS.filter(({ state, count }) => each.counts[count] > 0 || state === 'ready').map(
              ({ state, count }) => (
                <li key={state}>
                  <Link
                    to={`?part=fleet&class=${each.class}&state=${state}`}
                    className="grid min-h-12 grid-cols-[8.5rem_1fr] items-center gap-2 rounded-md text-ink no-underline"
                  >
                    <span>
                      {VENTILATOR_STATES[state]} <strong className="text-lg">{each.counts[count]}</strong>
                    </span>
                    <span className="flex flex-wrap gap-1 py-1">
                      {marks(each.counts[count]).map((index) => (
                        <MachineMark key={index} state={state} />
                      ))}
                    </span>
                  </Link>
                </li>
              ),
            )}
          </ul>
        </section>
      ))}
    </div>
  );
}

function marks(count: number): number[] {
  return Array.from({ length: count }, (_, index) => index);
}
