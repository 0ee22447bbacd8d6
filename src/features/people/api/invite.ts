import { personSchema, type SiteRole } from '@shared/schemas/person.schema';
import { useMutation, useQueryClient } from '@tanstack/react-query';
import { request } from '@/lib/api-client';

export function useInvite() {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (body: { email: string; name: string; siteRole: SiteRole }) =>
      request('POST', '/invitations', personSchema, { body }),
    onSettled: () =>
      Promise.all([
        client.invalidateQueries({ queryKey: ['people'] }),
        client.invalidateQueries({ queryKey: ['mail'] }),
      ]),
  });
}

/** Sends a new link; the old one stops working. */
export function useInviteAgain() {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (personId: string) =>
      request('POST', `/people/${personId}/invitation`, personSchema, { body: {} }),
    onSuccess: () => client.invalidateQueries({ queryKey: ['mail'] }),
  });
}
