import { personSchema, type SiteRole } from '@shared/schemas/person.schema';
import { useMutation, useQueryClient } from '@tanstack/react-query';
import { request } from '@/lib/api-client';

interface Change {
  id: string;
  version: number;
  siteRole?: SiteRole;
  disabled?: boolean;
}

/** Changes role or state; the list is fetched anew either way, so that a refusal shows what really stands. */
export function useUpdatePerson() {
  const client = useQueryClient();
  return useMutation({
    mutationFn: ({ id, ...body }: Change) => request('PATCH', `/people/${id}`, personSchema, { body }),
    onSettled: () => client.invalidateQueries({ queryKey: ['people'] }),
  });
}
