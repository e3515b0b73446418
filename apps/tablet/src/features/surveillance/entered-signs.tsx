import { buttonClass } from '@windrow/ui/controls/button';
import type { InfectionSignKind } from '@windrow/ventilation/contract/observations';
import type { Surveillance } from '@windrow/ventilation/contract/surveillance';
import { formatDay } from '@windrow/ventilation/format/clock';
import { Link } from 'react-router-dom';
import { AntimicrobialCourse } from './antimicrobial-course.tsx';

const WAYS: readonly { sign: InfectionSignKind; label: string }[] = [
  { sign: 'temperature', label: 'Temperature' },
  { sign: 'white-cells', label: 'White cells' },
  { sign: 'antimicrobial', label: 'Antimicrobial day' },
  { sign: 'extracorporeal', label: 'Extracorporeal support day' },
];

/** What was entered by hand for the second tier and the exclusions, and the ways to enter more. */
export function EnteredSigns({
  surveillance,
  enterPath,
}: {
  surveillance: Surveillance;
  enterPath: string | null;
}) {
  const { temperatures, whiteCells, antimicrobialDays, extracorporealDays } = surveillance.entered;
  const isNothing =
    temperatures.length + whiteCells.length + antimicrobialDays.length + extracorporealDays.length === 0;
  return (
    <section aria-labelledby="entered-signs" className="flex flex-col gap-3 rounded-xl bg-tile px-4 py-3">
      <h2 id="entered-signs" className="font-bold text-lg">
        Signs of infection and treatment days
      </h2>
      {isNothing && (
        <p>Nothing is entered yet. The second tier of an event is judged by what stands here only.</p>
      )}
      <Entered
        title="Temperature"
        items={temperatures.map(({ day, celsius }) => `${celsius.toFixed(1)} °C on ${formatDay(day)}`)}
      />
      <Entered
        title="White cells"
        items={whiteCells.map(({ day, perMm3 }) => `${perMm3} /mm3 on ${formatDay(day)}`)}
      />
      {antimicrobialDays.map((course) => (
        <AntimicrobialCourse
          key={course.agent}
          course={course}
          surveillance={surveillance}
          mayEnter={enterPath !== null}
        />
      ))}
      <Entered title="Days on extracorporeal support" items={extracorporealDays.map(formatDay)} />
      {enterPath !== null && (
        <div className="flex flex-wrap gap-2">
          {WAYS.map(({ sign, label }) => (
            <Link key={sign} to={`${enterPath}?sign=${sign}`} className={buttonClass('plain')}>
              <span className="sr-only">Enter </span>
              {label}
            </Link>
          ))}
        </div>
      )}
      {enterPath !== null && !isNothing && (
        <p className="text-ink-muted">An entry made in error is amended or struck in the record.</p>
      )}
    </section>
  );
}

function Entered({ title, items }: { title: string; items: readonly string[] }) {
  if (items.length === 0) return null;
  return (
    <div>
      <h3 className="text-ink-muted text-sm">{title}</h3>
      <p>{items.join(' · ')}</p>
    </div>
  );
}
