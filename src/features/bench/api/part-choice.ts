import { type Part, partPageSchema } from '@shared/schemas/part.schema';
import { keepPreviousData, queryOptions, useQuery } from '@tanstack/react-query';
import { queryString, request } from '@/lib/api-client';

/** Parts that fit a rail by rating, for picking one by hand. */
export const usePartChoice = (q: string, voltage_V: number, enabled: boolean) =>
  useQuery({
    queryKey: ['parts', 'choice', q, voltage_V],
    queryFn: ({ signal }) =>
      request('GET', `/parts${queryString({ q, min_rated_V: voltage_V, limit: 200 })}`, partPageSchema, {
        signal,
      }),
    placeholderData: keepPreviousData,
    enabled,
  });

/** Every approved part whose rating fits, page after page: what the mix search chooses from unless told otherwise. */
export const candidatesQuery = (voltage_V: number) =>
  queryOptions({
    queryKey: ['parts', 'candidates', voltage_V],
    queryFn: async ({ signal }) => {
      const parts: Part[] = [];
      for (;;) {
        const page = await request(
          'GET',
          `/parts${queryString({ state: 'approved', min_rated_V: voltage_V, limit: 500, offset: parts.length })}`,
          partPageSchema,
          { signal },
        );
        parts.push(...page.items);
        if (page.items.length === 0 || parts.length >= page.total) return parts;
      }
    },
    staleTime: 60_000,
  });
