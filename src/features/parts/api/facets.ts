import { partFacetsSchema } from '@shared/schemas/part.schema';
import { queryOptions, useQuery } from '@tanstack/react-query';
import { request } from '@/lib/api-client';

/** What the library holds, for the filters. */
export const facetsQuery = queryOptions({
  queryKey: ['parts', 'facets'],
  queryFn: ({ signal }) => request('GET', '/parts/facets', partFacetsSchema, { signal }),
});
export const useFacets = () => useQuery(facetsQuery);
