import { useQuery } from '@tanstack/react-query';
import type { ReactNode } from 'react';
import { NavLink, useParams } from 'react-router-dom';
import { HeadroomSign } from '@/components/ui/headroom-sign';
import { paths } from '@/config/paths';
import { boardQuery } from '@/features/boards/api/boards';
import { peoplePageTitle } from '@/features/boards/components/role-words';
import { railsQuery } from '@/features/rails/api/rails';
import { useSession } from '@/features/session/api/session';
import { cx } from '@/lib/class-names';

function Item({ to, end, children }: { to: string; end?: boolean; children: ReactNode }) {
  return (
    <li>
      <NavLink
        to={to}
        end={end}
        className={({ isActive }) =>
          cx(
            'flex items-baseline justify-between gap-2 border-l-[3px] py-1 pr-5 pl-[1.3rem]',
            isActive ? 'border-deep bg-wash' : 'border-transparent hover:bg-wash/60',
          )
        }
      >
        {children}
      </NavLink>
    </li>
  );
}

function Group({ title, children }: { title: string; children: ReactNode }) {
  return (
    <div>
      <h2 className="section-head mb-2 px-6">{title}</h2>
      <ul>{children}</ul>
    </div>
  );
}

/** The board's rails with their state, the board's pages, and what all boards share. */
export function SideNav() {
  const { boardId } = useParams();
  const { data: session } = useSession();
  const board = useQuery({ ...boardQuery(boardId ?? ''), enabled: boardId !== undefined });
  const rails = useQuery({ ...railsQuery(boardId ?? ''), enabled: boardId !== undefined });
  return (
    <nav aria-label="rails and pages" className="flex flex-col gap-6 py-5">
      {boardId && board.data && (
        <>
          <Group title="rails">
            {rails.data?.rails.map((rail) => (
              <Item key={rail.id} to={paths.bench(boardId, rail.id)}>
                <span className="min-w-0 truncate" title={rail.spec.name}>
                  {rail.spec.name}
                </span>
                <HeadroomSign
                  holds={rail.summary.holds}
                  headroom_dB={rail.summary.tightest?.headroom_dB ?? null}
                  className="text-small"
                />
              </Item>
            ))}
            {board.data.rights.edit && (
              <Item to={paths.newRail(boardId)}>
                <span className="text-deep">+ add a rail</span>
              </Item>
            )}
          </Group>
          <Group title="board">
            <Item to={paths.board(boardId)} end>
              Rails
            </Item>
            <Item to={paths.stackup(boardId)}>Stack-up</Item>
            <Item to={paths.revisions(boardId)}>Revisions</Item>
            <Item to={paths.placement(boardId)}>Placement</Item>
            <Item to={paths.boardPeople(boardId)}>{peoplePageTitle(board.data.rights.manage)}</Item>
          </Group>
        </>
      )}
      <Group title="shared">
        <Item to={paths.boards()} end>
          Boards
        </Item>
        <Item to={paths.parts()}>Parts</Item>
        {session?.person.siteRole === 'admin' && (
          <>
            <Item to={paths.people()}>People of the site</Item>
            <Item to={paths.mail()}>Mail</Item>
          </>
        )}
      </Group>
    </nav>
  );
}
