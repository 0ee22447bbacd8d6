import { tokenInfoSchema } from '@shared/schemas/person.schema';
import { queryOptions, useMutation, useQuery, useQueryClient } from '@tanstack/react-query';
import { command, request } from '@/lib/api-client';

export const useRequestReset = () =>
  useMutation({ mutationFn: (body: { email: string }) => command('POST', '/password-resets', { body }) });

export const resetQuery = (token: string) =>
  queryOptions({
    queryKey: ['reset', token],
    queryFn: ({ signal }) => request('GET', `/password-resets/${token}`, tokenInfoSchema, { signal }),
    staleTime: Number.POSITIVE_INFINITY,
  });
export const useReset = (token: string) => useQuery(resetQuery(token));

/** Sets the new password; all sessions of that person end by it. */
export function useSetPassword(token: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (body: { password: string }) =>
      command('POST', `/password-resets/${token}`, { body, quietUnauthorised: true }),
    // All but this link's own query: its page is still open and would ask for a link that is used up.
    onSuccess: () => client.removeQueries({ predicate: ({ queryKey }) => queryKey[0] !== 'reset' }),
  });
}
