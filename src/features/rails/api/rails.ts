import {
  type RailList,
  type RailSummary,
  type RailWithParts,
  railListSchema,
  railWithPartsSchema,
} from '@shared/schemas/rail.schema';
import type { RailSpecInput } from '@shared/schemas/rail-spec.schema';
import {
  hashKey,
  type QueryClient,
  queryOptions,
  useMutation,
  useQuery,
  useQueryClient,
} from '@tanstack/react-query';
import { command, request } from '@/lib/api-client';

/** All rails of a board with the parts they use: one fetch feeds the table, the side list and the bench. */
export const railsQuery = (boardId: string) =>
  queryOptions({
    queryKey: ['boards', boardId, 'rails'],
    queryFn: ({ signal }) => request('GET', `/boards/${boardId}/rails`, railListSchema, { signal }),
  });
export const useRails = (boardId: string) => useQuery(railsQuery(boardId));

export const railQuery = (boardId: string, railId: string) =>
  queryOptions({
    queryKey: ['boards', boardId, 'rails', railId],
    queryFn: ({ signal }) =>
      request('GET', `/boards/${boardId}/rails/${railId}`, railWithPartsSchema, { signal }),
  });
export const useRail = (boardId: string, railId: string) => useQuery(railQuery(boardId, railId));

/** Puts a rail, as the server or the bench has it now, wherever it is shown. */
export function cacheRail(client: QueryClient, answer: RailWithParts): void {
  const { rail, parts } = answer;
  client.setQueryData(railQuery(rail.boardId, rail.id).queryKey, answer);
  client.setQueryData(railsQuery(rail.boardId).queryKey, (list: RailList | undefined) => {
    if (!list) return list;
    const known = new Map([...list.parts, ...parts].map((part) => [part.id, part]));
    const rails = list.rails.some((one) => one.id === rail.id)
      ? list.rails.map((one) => (one.id === rail.id ? rail : one))
      : [...list.rails, rail];
    return { rails, parts: [...known.values()] };
  });
}

/** Shows a result in the board's lists before the save that brings it has been answered. */
export function cacheResult(
  client: QueryClient,
  boardId: string,
  railId: string,
  result: Pick<RailSummary, 'holds' | 'tightest'>,
): void {
  client.setQueryData(railsQuery(boardId).queryKey, (list: RailList | undefined) => {
    const rail = list?.rails.find((one) => one.id === railId);
    if (!list || !rail) return list;
    const summary = { ...rail.summary, holds: result.holds, tightest: result.tightest, error: null };
    return { ...list, rails: list.rails.map((one) => (one.id === railId ? { ...one, summary } : one)) };
  });
}

export function useCreateRail(boardId: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (spec: RailSpecInput) =>
      request('POST', `/boards/${boardId}/rails`, railWithPartsSchema, { body: { spec } }),
    onSuccess: (answer) => {
      cacheRail(client, answer);
      return client.invalidateQueries({ queryKey: ['boards'], exact: true });
    },
  });
}

export function useUpdateRail(boardId: string, railId: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (body: { version: number; spec: RailSpecInput }) =>
      request('PATCH', `/boards/${boardId}/rails/${railId}`, railWithPartsSchema, { body }),
    onSuccess: (answer) => {
      cacheRail(client, answer);
      return client.invalidateQueries({ queryKey: ['boards'], exact: true });
    },
  });
}

export function useDeleteRail(boardId: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: ({ railId, version }: { railId: string; version: number }) =>
      command('DELETE', `/boards/${boardId}/rails/${railId}?version=${version}`),
    onSuccess: (_, { railId }) => {
      client.setQueryData(railsQuery(boardId).queryKey, (list: RailList | undefined) =>
        list ? { ...list, rails: list.rails.filter((one) => one.id !== railId) } : list,
      );
      const deleted = hashKey(railQuery(boardId, railId).queryKey);
      return client.invalidateQueries({
        queryKey: ['boards'],
        predicate: ({ queryHash }) => queryHash !== deleted,
      });
    },
  });
}

/** A deleted rail leaves the cache; not while a page still shows it, which would ask the server for it again. */
export const forgetRail = (client: QueryClient, boardId: string, railId: string): void =>
  client.removeQueries({ queryKey: railQuery(boardId, railId).queryKey });
