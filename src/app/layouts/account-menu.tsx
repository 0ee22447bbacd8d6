import { Link } from 'react-router-dom';
import { paths } from '@/config/paths';
import { useSession } from '@/features/session/api/session';
import { setTheme, useTheme } from '@/lib/theme';

/** Who is signed in, and day or night. */
export function AccountMenu() {
  const { data: session } = useSession();
  const theme = useTheme();
  return (
    <>
      <button
        type="button"
        className="hidden underline-offset-4 hover:underline sm:inline"
        onClick={() => setTheme(theme === 'dark' ? 'light' : 'dark')}
      >
        {theme === 'dark' ? 'day' : 'night'}
      </button>
      {session && (
        <Link to={paths.account()} className="whitespace-nowrap underline-offset-4 hover:underline">
          {session.person.name}
        </Link>
      )}
    </>
  );
}
