import { QueryCache, QueryClient } from '@tanstack/react-query';
import { ApiError, NetworkError } from './problem';
import { createReconnect, serverAnswers } from './reconnect';

/** Refusals are final, and without a server one should hear of it at once; a server in trouble is asked again. */
const mayPass = (error: unknown) => error instanceof ApiError && error.status >= 500;

const reconnect = createReconnect({
  isThere: serverAnswers,
  resume: () => {
    void queryClient.refetchQueries({
      type: 'active',
      predicate: (query) => query.state.error instanceof NetworkError,
    });
  },
});
window.addEventListener('online', reconnect.hint);

export const queryClient = new QueryClient({
  queryCache: new QueryCache({ onError: reconnect.failed }),
  defaultOptions: {
    queries: {
      staleTime: 10_000,
      retry: (count, error) => mayPass(error) && count < 2,
      networkMode: 'always',
      // With this network mode it would be off.
      refetchOnReconnect: true,
    },
    mutations: { retry: false, networkMode: 'always' },
  },
});
