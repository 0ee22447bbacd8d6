import { type Part, partSchema } from '@shared/schemas/part.schema';
import { type QueryClient, queryOptions, useQuery } from '@tanstack/react-query';
import { request } from '@/lib/api-client';

export const partQuery = (partId: string) =>
  queryOptions({
    queryKey: ['parts', 'one', partId],
    queryFn: ({ signal }) => request('GET', `/parts/${partId}`, partSchema, { signal }),
  });
export const usePart = (partId: string) => useQuery(partQuery(partId));

/** Shows a part as it was just saved; lists, facets and the rails that use it are fetched anew. */
export async function takePart(client: QueryClient, part: Part): Promise<void> {
  client.setQueryData(partQuery(part.id).queryKey, part);
  await Promise.all([
    client.invalidateQueries({ queryKey: ['parts', 'list'] }),
    client.invalidateQueries({ queryKey: ['parts', 'facets'] }),
    client.invalidateQueries({ queryKey: ['boards'] }),
  ]);
}
