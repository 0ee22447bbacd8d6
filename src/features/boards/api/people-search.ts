import { personPageSchema } from '@shared/schemas/person.schema';
import { keepPreviousData, useQuery } from '@tanstack/react-query';
import { queryString, request } from '@/lib/api-client';

const MOST = 8;

/** People of the site whose name or address contains `q`, to choose from. */
export const usePeopleSearch = (q: string) =>
  useQuery({
    queryKey: ['people', 'search', q],
    queryFn: ({ signal }) =>
      request('GET', `/people${queryString({ q, limit: MOST })}`, personPageSchema, { signal }),
    enabled: q.trim().length > 0,
    placeholderData: keepPreviousData,
  });
