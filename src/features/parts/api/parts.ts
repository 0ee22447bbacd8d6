import { partPageSchema } from '@shared/schemas/part.schema';
import { keepPreviousData, queryOptions, useQuery } from '@tanstack/react-query';
import { queryString, request } from '@/lib/api-client';
import type { PartFilter } from '../lib/part-filter';

export const PARTS_PER_PAGE = 100;

/** One page of the library, filtered and sorted by the server; the page before stays until the next is there. */
export const partsQuery = ({ page, ...filter }: PartFilter) =>
  queryOptions({
    queryKey: ['parts', 'list', page, filter],
    queryFn: ({ signal }) =>
      request(
        'GET',
        `/parts${queryString({ ...filter, limit: PARTS_PER_PAGE, offset: (page - 1) * PARTS_PER_PAGE })}`,
        partPageSchema,
        { signal },
      ),
    placeholderData: keepPreviousData,
  });
export const useParts = (filter: PartFilter) => useQuery(partsQuery(filter));
