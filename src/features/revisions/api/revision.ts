import { revisionDetailSchema } from '@shared/schemas/revision.schema';
import { queryOptions, useQuery } from '@tanstack/react-query';
import { request } from '@/lib/api-client';

/** One revision with its whole snapshot; it never changes once cut. */
export const revisionQuery = (boardId: string, letter: string) =>
  queryOptions({
    queryKey: ['boards', boardId, 'revisions', letter],
    queryFn: ({ signal }) =>
      request('GET', `/boards/${boardId}/revisions/${letter}`, revisionDetailSchema, { signal }),
    staleTime: Number.POSITIVE_INFINITY,
  });
export const useRevision = (boardId: string, letter: string | undefined) =>
  useQuery({ ...revisionQuery(boardId, letter ?? ''), enabled: letter !== undefined });
