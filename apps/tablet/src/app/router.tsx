import { LoadingState } from '@windrow/ui/controls/states';
import type { ComponentType } from 'react';
import { createBrowserRouter, Navigate, type RouteObject } from 'react-router-dom';
import { BEDSIDE } from './bedside-pages.ts';
import { Home } from './home.tsx';
import { NotFound } from './not-found.tsx';
import { RootLayout } from './root-layout.tsx';
import { RouteError } from './route-error.tsx';

/** A page that is fetched when it is first opened. */
function fetched(
  path: string,
  page: () => Promise<ComponentType>,
  children: RouteObject[] = [],
): RouteObject {
  return { path, children, lazy: async () => ({ Component: await page() }) };
}

const bedTabs: RouteObject[] = [
  { index: true, element: <Navigate to="now" replace /> },
  fetched('now', BEDSIDE.now),
  fetched('check', BEDSIDE.check),
  fetched('airway', BEDSIDE.airway),
  fetched('gas', BEDSIDE.gas),
  fetched('happening', BEDSIDE.happening),
  fetched('readiness', BEDSIDE.readiness),
  fetched('aids', BEDSIDE.aids),
  fetched('record', BEDSIDE.record),
  fetched('record/amend', BEDSIDE.amend),
  fetched('surveillance', BEDSIDE.surveillance),
  fetched('surveillance/enter', BEDSIDE.infectionSign),
  fetched('details', BEDSIDE.details),
  fetched('transfer', BEDSIDE.transfer),
  fetched('end', BEDSIDE.end),
];

const pages: RouteObject[] = [
  { index: true, element: <Home /> },
  fetched('round/:unitId', BEDSIDE.round),
  fetched('beds/:unitId/:bedId', BEDSIDE.bed, bedTabs),
  fetched('admit/:unitId/:bedId', BEDSIDE.admit),
  fetched('assignment/:unitId', () =>
    import('../features/assignment/assignment-page.tsx').then(({ AssignmentPage }) => AssignmentPage),
  ),
  fetched('surveillance/:stayId', () =>
    import('../features/surveillance/surveillance-page.tsx').then(({ SurveillancePage }) => SurveillancePage),
  ),
  fetched('capacity', () =>
    import('../features/capacity/capacity-page.tsx').then(({ CapacityPage }) => CapacityPage),
  ),
  fetched('setup', () => import('../features/setup/setup-page.tsx').then(({ SetupPage }) => SetupPage)),
  fetched('notes', () => import('../features/notes/notes-page.tsx').then(({ NotesPage }) => NotesPage)),
  fetched('notes/:name', () => import('../features/notes/note-page.tsx').then(({ NotePage }) => NotePage)),
  { path: '*', element: <NotFound /> },
];

/** Every page by its address. */
export const router = createBrowserRouter([
  {
    path: '/',
    element: <RootLayout />,
    errorElement: <RouteError />,
    hydrateFallbackElement: <LoadingState what="Windrow" />,
    // Faults of one page are shown in its place; the bar around it stays.
    children: [{ errorElement: <RouteError />, children: pages }],
  },
]);
