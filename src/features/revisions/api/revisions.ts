import { revisionPageSchema } from '@shared/schemas/revision.schema';
import { queryOptions, useQuery } from '@tanstack/react-query';
import { request } from '@/lib/api-client';

/** All revisions of a board, newest first. */
export const revisionsQuery = (boardId: string) =>
  queryOptions({
    queryKey: ['boards', boardId, 'revisions'],
    queryFn: ({ signal }) =>
      request('GET', `/boards/${boardId}/revisions?limit=500`, revisionPageSchema, { signal }),
  });
export const useRevisions = (boardId: string) => useQuery(revisionsQuery(boardId));
