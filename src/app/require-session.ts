import { type LoaderFunctionArgs, redirect } from 'react-router-dom';
import { paths } from '@/config/paths';
import { sessionQuery } from '@/features/session/api/session';
import { queryClient } from '@/lib/query-client';

/** Sends whoever is not signed in to the sign-in page, and remembers where they wanted to go. */
export async function requireSession({ request }: LoaderFunctionArgs): Promise<Response | null> {
  const session = await queryClient.ensureQueryData(sessionQuery);
  if (session) return null;
  const url = new URL(request.url);
  const to = url.pathname + url.search;
  return redirect(to === '/' ? paths.signIn() : `${paths.signIn()}?to=${encodeURIComponent(to)}`);
}
