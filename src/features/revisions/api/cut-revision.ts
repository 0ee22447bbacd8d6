import { revisionDetailSchema } from '@shared/schemas/revision.schema';
import { useMutation, useQueryClient } from '@tanstack/react-query';
import { request } from '@/lib/api-client';
import { revisionQuery } from './revision';
import { revisionsQuery } from './revisions';

export function useCutRevision(boardId: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (body: { note: string }) =>
      request('POST', `/boards/${boardId}/revisions`, revisionDetailSchema, { body }),
    onSuccess: async (revision) => {
      client.setQueryData(revisionQuery(boardId, revision.letter).queryKey, revision);
      await Promise.all([
        client.invalidateQueries({ queryKey: revisionsQuery(boardId).queryKey, exact: true }),
        client.invalidateQueries({ queryKey: ['boards', boardId], exact: true }),
        client.invalidateQueries({ queryKey: ['boards'], exact: true }),
      ]);
    },
  });
}
