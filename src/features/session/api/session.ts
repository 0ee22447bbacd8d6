import { currentSessionSchema, sessionSchema, siteSchema } from '@shared/schemas/person.schema';
import { queryOptions, useMutation, useQuery, useQueryClient } from '@tanstack/react-query';
import { command, request } from '@/lib/api-client';

/** Who is signed in; null when nobody is. */
export const sessionQuery = queryOptions({
  queryKey: ['session'],
  queryFn: ({ signal }) => request('GET', '/session', currentSessionSchema, { signal }),
  staleTime: 60_000,
});

export const useSession = () => useQuery(sessionQuery);

/** What the sign-in page must know before anyone is signed in. */
export const siteQuery = queryOptions({
  queryKey: ['site'],
  queryFn: ({ signal }) => request('GET', '/site', siteSchema, { signal }),
  staleTime: Number.POSITIVE_INFINITY,
});

export const useSite = () => useQuery(siteQuery);

export function useSignIn() {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (body: { email: string; password: string }) =>
      request('POST', '/session', sessionSchema, { body, quietUnauthorised: true }),
    onSuccess: (session) => client.setQueryData(sessionQuery.queryKey, session),
  });
}

export function useSignOut() {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (everywhere: boolean) => command('DELETE', everywhere ? '/sessions' : '/session'),
    onSuccess: () => {
      client.clear();
      client.setQueryData(sessionQuery.queryKey, null);
    },
  });
}
