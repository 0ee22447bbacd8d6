import { useQuery } from '@tanstack/react-query';
import { Link, useLocation, useParams } from 'react-router-dom';
import { paths } from '@/config/paths';
import { boardQuery } from '@/features/boards/api/boards';
import { peoplePageTitle } from '@/features/boards/components/role-words';
import { partQuery } from '@/features/parts/api/part';
import { railsQuery } from '@/features/rails/api/rails';

const PAGES: Record<string, string> = {
  people: 'People',
  revisions: 'Revisions',
  placement: 'Placement',
  parts: 'Parts',
  mail: 'Mail',
  account: 'Account',
  specification: 'Specification',
  'stack-up': 'Stack-up',
};

/** A step before the last: a long name must not push the page's own off. */
const STEP = 'max-w-[24ch] truncate text-stone';

interface Crumb {
  text: string;
  to?: string;
}

/** Boards / Tide gateway / VDD_CORE: the way to this page, its last step in bold. */
export function Breadcrumbs() {
  const { boardId, railId, letter, partId } = useParams();
  const { pathname } = useLocation();
  const board = useQuery({ ...boardQuery(boardId ?? ''), enabled: boardId !== undefined });
  const rails = useQuery({
    ...railsQuery(boardId ?? ''),
    enabled: boardId !== undefined && railId !== undefined,
  });
  const part = useQuery({ ...partQuery(partId ?? ''), enabled: partId !== undefined });
  const crumbs: Crumb[] = [];
  if (pathname === '/' || pathname.startsWith('/boards')) crumbs.push({ text: 'Boards', to: paths.boards() });
  if (boardId) crumbs.push({ text: board.data?.name ?? '…', to: paths.board(boardId) });
  if (boardId && railId) {
    const rail = rails.data?.rails.find((one) => one.id === railId);
    crumbs.push({ text: rail?.spec.name ?? '…', to: paths.bench(boardId, railId) });
  }
  const last = pathname.split('/').filter(Boolean).pop() ?? '';
  if (pathname.startsWith('/parts')) crumbs.push({ text: 'Parts', to: paths.parts() });
  else if (boardId && pathname.includes('/revisions'))
    crumbs.push({ text: 'Revisions', to: paths.revisions(boardId) });
  else if (boardId && last === 'people')
    crumbs.push({ text: peoplePageTitle(board.data?.rights.manage ?? false) });
  else if (PAGES[last]) crumbs.push({ text: PAGES[last] });
  if (letter) crumbs.push({ text: letter });
  if (partId) crumbs.push({ text: part.data?.partNumber ?? '…' });
  if (last === 'new') crumbs.push({ text: 'new' });
  return (
    <nav aria-label="where you are" className="min-w-0 truncate">
      <ol className="flex min-w-0 items-center gap-2">
        {crumbs.map((crumb, i) => {
          const isLast = i === crumbs.length - 1;
          return (
            <li
              key={crumb.to ?? crumb.text}
              className={`items-center gap-2 ${isLast ? 'flex min-w-0' : 'hidden shrink-0 sm:flex'}`}
            >
              {i > 0 && (
                <span aria-hidden className="hidden text-stone sm:inline">
                  /
                </span>
              )}
              {isLast || !crumb.to ? (
                <span
                  aria-current={isLast ? 'page' : undefined}
                  title={crumb.text}
                  className={isLast ? 'truncate font-bold' : STEP}
                >
                  {crumb.text}
                </span>
              ) : (
                <Link
                  to={crumb.to}
                  title={crumb.text}
                  className={`${STEP} underline-offset-4 hover:underline`}
                >
                  {crumb.text}
                </Link>
              )}
            </li>
          );
        })}
      </ol>
    </nav>
  );
}
