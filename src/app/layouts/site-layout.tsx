import { useState } from 'react';
import { Link, Outlet, useLocation } from 'react-router-dom';
import { Logo } from '@/components/ui/logo';
import { paths } from '@/config/paths';
import { WaitingEdits } from '@/features/bench/components/waiting-edits';
import { useSession } from '@/features/session/api/session';
import { SessionKeeper } from '@/features/session/components/session-keeper';
import { AccountMenu } from './account-menu';
import { Breadcrumbs } from './breadcrumbs';
import { SideNav } from './side-nav';
import { StatusSlot, StatusSlotProvider } from './status-slot';

/** Header with the way here, the list of rails and pages at the side, the page itself. */
export function SiteLayout() {
  const { pathname } = useLocation();
  const { data: session } = useSession();
  const [openAt, setOpenAt] = useState<string | null>(null);
  const open = openAt === pathname;
  return (
    <StatusSlotProvider>
      <div className="flex min-h-screen flex-col">
        <a
          href="#page"
          className="sr-only focus:not-sr-only focus:absolute focus:z-50 focus:bg-paper focus:p-2"
        >
          to the page
        </a>
        <header className="flex h-12 items-center gap-6 border-b px-6">
          <Link to={paths.boards()} className="flex items-center gap-3 text-base font-bold">
            <Logo />
            <span className="hidden sm:inline">Millpond</span>
          </Link>
          <Breadcrumbs />
          <div className="ml-auto flex items-center gap-6 text-stone">
            {session && <WaitingEdits personId={session.person.id} />}
            <StatusSlot />
            <AccountMenu />
            <button
              type="button"
              className="text-deep lg:hidden"
              aria-expanded={open}
              onClick={() => setOpenAt(open ? null : pathname)}
            >
              {open ? 'close' : 'pages'}
            </button>
          </div>
        </header>
        <div className="flex min-w-0 flex-1 flex-col lg:flex-row">
          <div
            className={`${open ? 'block' : 'hidden'} shrink-0 border-b lg:block lg:w-[13rem] lg:border-r lg:border-b-0`}
          >
            <SideNav />
          </div>
          <main id="page" className="min-w-0 flex-1">
            <Outlet />
          </main>
        </div>
      </div>
      <SessionKeeper />
    </StatusSlotProvider>
  );
}
