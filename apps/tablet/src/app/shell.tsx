import { useLive } from '@windrow/client/live/use-live';
import { NoticeHost } from '@windrow/ui/controls/notice-host';
import type { Session } from '@windrow/ventilation/contract/session';
import { Outlet, ScrollRestoration, useLocation, useNavigation } from 'react-router-dom';
import { useBedsidePages } from './bedside-pages.ts';
import { useCurrentUnit } from './current-unit.ts';
import { heardUnit } from './heard-unit.ts';
import { LiveBanner } from './live-banner.tsx';
import { pageTitle } from './page-title.ts';
import { useSessionOver } from './session-state.ts';
import { ShellFooter } from './shell-footer.tsx';
import { ShellHeader } from './shell-header.tsx';
import { SignInAgain } from './sign-in-again.tsx';
import { useTheme } from './theme.ts';

/** What stands around every page of a signed-in person. */
export function Shell({ session }: { session: Session }) {
  const { unit, units } = useCurrentUnit(session);
  const isOver = useSessionOver();
  const isFetching = useNavigation().state === 'loading';
  const heardUnitId = heardUnit({ grants: session.grants, unitId: unit?.unitId ?? null });
  const { state } = useLive(heardUnitId);
  const { pathname } = useLocation();
  useTheme(unit);
  useBedsidePages(session);

  return (
    <>
      <title>{pageTitle({ pathname, unitName: unit?.name ?? null })}</title>
      <div
        inert={isOver}
        data-live={state}
        className={`min-h-dvh flex-col bg-ground text-ink ${isOver ? 'hidden' : 'flex'}`}
      >
        <a href="#page" className="sr-only focus:not-sr-only focus:p-3">
          To the page
        </a>
        <ShellHeader session={session} unit={unit} units={units} heardUnitId={heardUnitId} />
        <LiveBanner unitId={heardUnitId} timeZone={unit?.timeZone ?? null} />
        <main
          id="page"
          tabIndex={-1}
          aria-busy={isFetching}
          className="flex w-full min-w-0 grow flex-col px-3 pb-3 outline-none sm:px-5"
        >
          <Outlet />
          {/* Another page begins at its top, and Back is where one was. */}
          <ScrollRestoration />
        </main>
        <ShellFooter isDemonstration={session.demonstration} />
      </div>
      <NoticeHost />
      {isOver && <SignInAgain session={session} />}
    </>
  );
}
