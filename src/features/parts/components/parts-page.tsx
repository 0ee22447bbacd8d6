import { useCallback, useState } from 'react';
import { useSearchParams } from 'react-router-dom';
import { Button, ButtonLink } from '@/components/ui/button';
import { Failure } from '@/components/ui/failure';
import { EmptyState, Loading, Page } from '@/components/ui/page';
import { paths } from '@/config/paths';
import { usePageTitle } from '@/lib/use-page-title';
import { useFacets } from '../api/facets';
import { PARTS_PER_PAGE, useParts } from '../api/parts';
import { isFiltered, type PartFilter, readFilter, writeFilter } from '../lib/part-filter';
import { Pager } from './pager';
import { PartsFilter } from './parts-filter';
import { PartsTable } from './parts-table';

/** The shared library: filtered, sorted and paged by the server, all of it kept in the address. */
export function PartsPage({ mayAdd }: { mayAdd: boolean }) {
  usePageTitle('Parts');
  const [search, setSearch] = useSearchParams();
  const filter = readFilter(search);
  const parts = useParts(filter);
  const facets = useFacets();
  const change = useCallback(
    (next: Partial<PartFilter>) =>
      setSearch((now) => writeFilter({ ...readFilter(now), page: 1, ...next }), { replace: true }),
    [setSearch],
  );
  const [clearings, setClearings] = useState(0);
  const clear = () => {
    setClearings((n) => n + 1);
    setSearch({}, { replace: true });
  };
  const sort = (by: PartFilter['sort']) => {
    const isSame = filter.sort === by;
    change({ sort: by, order: isSame && filter.order === 'asc' ? 'desc' : 'asc' });
  };
  return (
    <Page
      title="Parts"
      lead="Catalogue values; the curves of Class II dielectrics fall with bias, temperature and age."
      actions={mayAdd && <ButtonLink to={paths.newPart()}>New part</ButtonLink>}
    >
      <PartsFilter key={clearings} filter={filter} facets={facets.data} onChange={change} onClear={clear} />
      <div className="-mx-6 empty:hidden">
        {parts.isPending && <Loading what="the parts" />}
        {parts.isError && <Failure error={parts.error} what="the parts" retry={() => parts.refetch()} />}
      </div>
      {parts.data && parts.data.items.length === 0 && (
        <EmptyState
          title={
            isFiltered(filter) || filter.page > 1 ? 'No part fits these filters' : 'The library is empty'
          }
          action={
            (isFiltered(filter) || filter.page > 1) && <Button onClick={clear}>Clear the filters</Button>
          }
        >
          {isFiltered(filter) || filter.page > 1
            ? 'Widen a range or leave one of them out.'
            : 'Parts that are added here can be used in the bank of every rail.'}
        </EmptyState>
      )}
      {parts.data && parts.data.items.length > 0 && (
        <div
          className={parts.isPlaceholderData ? 'opacity-60' : undefined}
          aria-busy={parts.isPlaceholderData}
        >
          <PartsTable parts={parts.data.items} filter={filter} onSort={sort} />
          <div className="mt-4">
            <Pager
              page={filter.page}
              perPage={PARTS_PER_PAGE}
              total={parts.data.total}
              onPage={(page) => change({ page })}
            />
          </div>
        </div>
      )}
    </Page>
  );
}
