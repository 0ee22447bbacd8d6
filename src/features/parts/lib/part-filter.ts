import { type PartQuery, partQuerySchema } from '@shared/schemas/part.schema';

export type PartFilter = Omit<PartQuery, 'limit' | 'offset'> & { page: number };

const FILTERS = [
  'q',
  'technology',
  'dielectric',
  'caseSize',
  'state',
  'min_rated_V',
  'min_F',
  'max_F',
] as const;
const { sort, order } = partQuerySchema.parse({});

/** The filter that an address holds; what is not understood is left out instead of breaking the page. */
export function readFilter(search: URLSearchParams): PartFilter {
  const known = Object.entries(partQuerySchema.shape).flatMap(([key, schema]) => {
    const text = search.get(key);
    if (text === null || text === '' || key === 'limit' || key === 'offset') return [];
    return schema.safeParse(text).success ? [[key, text]] : [];
  });
  const { limit: _limit, offset: _offset, ...filter } = partQuerySchema.parse(Object.fromEntries(known));
  const page = Number(search.get('page') ?? 1);
  return { ...filter, page: Number.isInteger(page) && page > 0 && page < 10_000 ? page : 1 };
}

/** The shortest address that holds a filter: what is as usual is not written. */
export function writeFilter(filter: PartFilter): URLSearchParams {
  const search = new URLSearchParams();
  for (const key of FILTERS) {
    const value = filter[key];
    if (value !== undefined && value !== '') search.set(key, String(value));
  }
  if (filter.sort !== sort || filter.order !== order) {
    search.set('sort', filter.sort);
    search.set('order', filter.order);
  }
  if (filter.page > 1) search.set('page', String(filter.page));
  return search;
}

/** Whether anything is filtered out. */
export const isFiltered = (filter: PartFilter): boolean =>
  FILTERS.some((key) => filter[key] !== undefined && filter[key] !== '');
