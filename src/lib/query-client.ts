import { QueryClient } from '@tanstack/react-query';
import { ApiError } from './problem';

/** Refusals are final; only what may pass by itself (network, 5xx) is tried again. */
const mayPass = (error: unknown) => !(error instanceof ApiError) || error.status >= 500;

export const queryClient = new QueryClient({
  defaultOptions: {
    queries: {
      staleTime: 10_000,
      retry: (count, error) => mayPass(error) && count < 2,
      networkMode: 'always',
    },
    mutations: { retry: false, networkMode: 'always' },
  },
});
