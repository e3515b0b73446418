import { QueryClientProvider } from '@tanstack/react-query';
import { makeQueryClient } from '@windrow/client/query-client';
import { StrictMode } from 'react';
import { createRoot } from 'react-dom/client';
import { Wall } from './wall.tsx';

const root = document.getElementById('root');
if (!root) throw new Error('index.html has no element with the id root');

createRoot(root).render(
  <StrictMode>
    <QueryClientProvider client={makeQueryClient()}>
      <Wall />
    </QueryClientProvider>
  </StrictMode>,
);
