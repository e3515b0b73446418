import { useNow } from '@windrow/client/clock/use-now';
import { useLive } from '@windrow/client/live/use-live';
import { segmentClass } from '@windrow/ui/controls/segmented-tabs';
import { Mark } from '@windrow/ui/mark';
import type { Unit } from '@windrow/ventilation/contract/board';
import type { Session } from '@windrow/ventilation/contract/session';
import { formatTime } from '@windrow/ventilation/format/clock';
import { NavLink } from 'react-router-dom';
import { navLinks } from './nav-links.ts';
import { PersonMenu } from './person-menu.tsx';
import { UnitSwitch } from './unit-switch.tsx';

export function ShellHeader({
  session,
  unit,
  units,
  heardUnitId,
}: {
  session: Session;
  unit: Unit | null;
  units: readonly Unit[];
  heardUnitId: string | undefined;
}) {
  const links = navLinks({ grants: session.grants, unitId: unit?.unitId ?? null });
  return (
    <header className="flex items-center gap-3 px-3 py-2 sm:px-5">
      <Mark />
      <nav aria-label="Parts of Windrow" className="hidden items-center gap-1 md:flex">
        {links.map(({ to, label }) => (
          <NavLink key={to} to={to} className={({ isActive }) => segmentClass(isActive)}>
            {label}
          </NavLink>
        ))}
      </nav>
      <div className="ml-auto flex min-w-0 items-center gap-3">
        <UnitSwitch unit={unit} units={units} />
        {unit && <Clock timeZone={unit.timeZone} />}
        <LiveWord unitId={heardUnitId} />
        <PersonMenu session={session} links={links} />
      </div>
    </header>
  );
}

/** A clock that runs shows that the screen does; it is the server's. */
function Clock({ timeZone }: { timeZone: string }) {
  const now = useNow();
  return <p className="font-bold text-xl tabular-nums">{formatTime(now, timeZone)}</p>;
}

const WORDS = {
  live: 'live',
  connecting: 'connecting',
  'not-live': 'not live',
  withdrawn: 'not live',
} as const;

function LiveWord({ unitId }: { unitId: string | undefined }) {
  const { state } = useLive(unitId);
  return (
    <p className="hidden items-center gap-2 text-ink-muted text-sm sm:flex">
      <span
        aria-hidden="true"
        className={`size-3 rounded-full border-2 border-current ${state === 'live' ? 'bg-current' : 'border-dashed'}`}
      />
      {WORDS[state]}
    </p>
  );
}
