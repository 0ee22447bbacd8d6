import { boardDetailSchema, boardPageSchema, type boardRoleSchema } from '@shared/schemas/board.schema';
import { queryOptions, useMutation, useQuery, useQueryClient } from '@tanstack/react-query';
import type { z } from 'zod';
import { command, request } from '@/lib/api-client';

type Role = z.infer<typeof boardRoleSchema>;

export const boardsQuery = queryOptions({
  queryKey: ['boards'],
  queryFn: ({ signal }) => request('GET', '/boards?limit=500', boardPageSchema, { signal }),
});
export const useBoards = () => useQuery(boardsQuery);

export const boardQuery = (boardId: string) =>
  queryOptions({
    queryKey: ['boards', boardId],
    queryFn: ({ signal }) => request('GET', `/boards/${boardId}`, boardDetailSchema, { signal }),
  });
export const useBoard = (boardId: string) => useQuery(boardQuery(boardId));

export function useCreateBoard() {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (body: { name: string; description: string }) =>
      request('POST', '/boards', boardDetailSchema, { body }),
    onSuccess: (board) => {
      client.setQueryData(boardQuery(board.id).queryKey, board);
      return client.invalidateQueries({ queryKey: boardsQuery.queryKey, exact: true });
    },
  });
}

export function useUpdateBoard(boardId: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (body: { version: number; name?: string; description?: string }) =>
      request('PATCH', `/boards/${boardId}`, boardDetailSchema, { body }),
    onSuccess: (board) => {
      client.setQueryData(boardQuery(boardId).queryKey, board);
      return client.invalidateQueries({ queryKey: boardsQuery.queryKey, exact: true });
    },
  });
}

export function useDeleteBoard(boardId: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (version: number) => command('DELETE', `/boards/${boardId}?version=${version}`),
    // The board itself is left in the cache: its page is still open, and would only ask for what is gone.
    onSuccess: () => client.invalidateQueries({ queryKey: boardsQuery.queryKey, exact: true }),
  });
}

export function useSetMember(boardId: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: ({ personId, role }: { personId: string; role: Role | null }) =>
      role === null
        ? command('DELETE', `/boards/${boardId}/members/${personId}`)
        : command('PUT', `/boards/${boardId}/members/${personId}`, { body: { role } }),
    onSettled: () => client.invalidateQueries({ queryKey: boardQuery(boardId).queryKey }),
  });
}
