import { QueryCache, QueryClient } from '@tanstack/react-query';
import { ProblemError } from './http.ts';
import { SESSION_KEY } from './session/session.ts';

const RETRIES = 2;

/**
 * The cache that both apps use. A 401 to anything means that the session is over, whatever was asked;
 * a refusal is not asked again, a lost network is.
 */
export function makeQueryClient(): QueryClient {
  const client: QueryClient = new QueryClient({
    queryCache: new QueryCache({
      onError: (error) => {
        if (isRefusal(error) && error.problem.status === 401) client.setQueryData(SESSION_KEY, null);
      },
    }),
    defaultOptions: {
      queries: {
        // A hospital network without the internet is still a network.
        networkMode: 'always',
        staleTime: 30_000,
        retry: (failures, error) => !isRefusal(error) && failures < RETRIES,
      },
      mutations: { networkMode: 'always' },
    },
  });
  return client;
}

function isRefusal(error: unknown): error is ProblemError {
  return error instanceof ProblemError;
}
