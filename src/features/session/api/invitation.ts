import { sessionSchema, tokenInfoSchema } from '@shared/schemas/person.schema';
import { queryOptions, useMutation, useQuery, useQueryClient } from '@tanstack/react-query';
import { request } from '@/lib/api-client';
import { sessionQuery } from './session';

export const invitationQuery = (token: string) =>
  queryOptions({
    queryKey: ['invitation', token],
    queryFn: ({ signal }) => request('GET', `/invitations/${token}`, tokenInfoSchema, { signal }),
    staleTime: Number.POSITIVE_INFINITY,
  });
export const useInvitation = (token: string) => useQuery(invitationQuery(token));

/** Chooses name and password; whoever accepts is signed in by it. */
export function useAcceptInvitation(token: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (body: { name: string; password: string }) =>
      request('POST', `/invitations/${token}`, sessionSchema, { body, quietUnauthorised: true }),
    onSuccess: (session) => {
      // All but this link's own query: its page is still open and would ask for a link that is used up.
      client.removeQueries({ predicate: ({ queryKey }) => queryKey[0] !== 'invitation' });
      client.setQueryData(sessionQuery.queryKey, session);
    },
  });
}
