import { QueryClientProvider } from '@tanstack/react-query';
import { makeQueryClient } from '@windrow/client/query-client';
import { RouterProvider } from 'react-router-dom';
import { router } from './router.tsx';
import { holdSession } from './session-state.ts';

const queryClient = makeQueryClient();
holdSession(queryClient);

export function App() {
  return (
    <QueryClientProvider client={queryClient}>
      <RouterProvider router={router} />
    </QueryClientProvider>
  );
}
