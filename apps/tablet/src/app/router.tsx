import { LoadingState } from '@windrow/ui/controls/states';
import { createBrowserRouter, Navigate } from 'react-router-dom';
import { Home } from './home.tsx';
import { NotFound } from './not-found.tsx';
import { RootLayout } from './root-layout.tsx';
import { RouteError } from './route-error.tsx';

/** Every page by its address. Each part is fetched when it is first opened. */
export const router = createBrowserRouter([
  {
    path: '/',
    element: <RootLayout />,
    errorElement: <RouteError />,
    hydrateFallbackElement: <LoadingState what="Windrow" />,
    children: [
      {
        // Faults of one page are shown in its place; the bar around it stays.
        errorElement: <RouteError />,
        children: [
          { index: true, element: <Home /> },
          {
            path: 'round/:unitId',
            lazy: async () => ({ Component: (await import('../features/round/round-page.tsx')).RoundPage }),
          },
          {
            path: 'beds/:unitId/:bedId',
            lazy: async () => ({ Component: (await import('../features/bed/bed-page.tsx')).BedPage }),
            children: [
              { index: true, element: <Navigate to="now" replace /> },
              {
                path: 'now',
                lazy: async () => ({ Component: (await import('../features/bed/now/now-tab.tsx')).NowTab }),
              },
              {
                path: 'check',
                lazy: async () => ({ Component: (await import('../features/bed/check-tab.tsx')).CheckTab }),
              },
              {
                path: 'airway',
                lazy: async () => ({ Component: (await import('../features/bed/airway-tab.tsx')).AirwayTab }),
              },
              {
                path: 'gas',
                lazy: async () => ({ Component: (await import('../features/bed/gas-tab.tsx')).GasTab }),
              },
              {
                path: 'happening',
                lazy: async () => ({
                  Component: (await import('../features/bed/happening-tab.tsx')).HappeningTab,
                }),
              },
              {
                path: 'transfer',
                lazy: async () => ({
                  Component: (await import('../features/bed/place/transfer-tab.tsx')).TransferTab,
                }),
              },
              {
                path: 'end',
                lazy: async () => ({ Component: (await import('../features/bed/place/end-tab.tsx')).EndTab }),
              },
              {
                path: 'record',
                lazy: async () => ({
                  Component: (await import('../features/record/record-tab.tsx')).RecordTab,
                }),
              },
              {
                path: 'record/amend',
                lazy: async () => ({
                  Component: (await import('../features/bed/amend/amend-tab.tsx')).AmendTab,
                }),
              },
              {
                path: 'details',
                lazy: async () => ({
                  Component: (await import('../features/admission/correct-tab.tsx')).CorrectTab,
                }),
              },
            ],
          },
          {
            path: 'admit/:unitId/:bedId',
            lazy: async () => ({
              Component: (await import('../features/admission/admit-page.tsx')).AdmitPage,
            }),
          },
          {
            path: 'assignment/:unitId',
            lazy: async () => ({
              Component: (await import('../features/assignment/assignment-page.tsx')).AssignmentPage,
            }),
          },
          {
            path: 'capacity',
            lazy: async () => ({
              Component: (await import('../features/capacity/capacity-page.tsx')).CapacityPage,
            }),
          },
          {
            path: 'setup',
            lazy: async () => ({ Component: (await import('../features/setup/setup-page.tsx')).SetupPage }),
          },
          { path: '*', element: <NotFound /> },
        ],
      },
    ],
  },
]);
