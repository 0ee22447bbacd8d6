import { personPageSchema } from '@shared/schemas/person.schema';
import { keepPreviousData, queryOptions, useQuery } from '@tanstack/react-query';
import { queryString, request } from '@/lib/api-client';

/** People of the site by name; `q` looks in names and addresses. */
export const peopleQuery = (q: string) =>
  queryOptions({
    queryKey: ['people', 'list', q],
    queryFn: ({ signal }) =>
      request('GET', `/people${queryString({ q, limit: 500 })}`, personPageSchema, { signal }),
    placeholderData: keepPreviousData,
  });
export const usePeople = (q: string) => useQuery(peopleQuery(q));
