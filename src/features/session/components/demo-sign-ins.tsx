import { Notice } from '@/components/ui/notice';
import { messageOf, titleOf } from '@/lib/problem';
import { useSignIn, useSite } from '../api/session';

/** While the demo runs: one press signs in as one of its people. */
export function DemoSignIns({ onSignedIn }: { onSignedIn: () => void }) {
  const { data: site } = useSite();
  const signIn = useSignIn();
  if (!site?.demo || site.demoPeople.length === 0) return null;
  const passwords = new Set(site.demoPeople.map((person) => person.password));
  const shared = passwords.size === 1 ? site.demoPeople[0].password : null;
  return (
    <section className="border-t pt-6">
      <h2 className="section-head mb-2">
        or look around as one of the demo’s people
        {shared && <>, all with the password “{shared}”</>}
      </h2>
      <ul>
        {site.demoPeople.map(({ email, password, role }) => (
          <li key={email} className="border-b last:border-b-0">
            <button
              type="button"
              disabled={signIn.isPending}
              onClick={() => signIn.mutate({ email, password }, { onSuccess: onSignedIn })}
              className="group flex w-full flex-wrap items-baseline justify-between gap-x-4 py-2 text-left hover:bg-wash disabled:opacity-60"
            >
              <span className="font-semibold text-deep underline-offset-4 group-hover:underline">{role}</span>
              <span className="text-small text-stone">{email}</span>
            </button>
          </li>
        ))}
      </ul>
      {signIn.isError && (
        <Notice tone="error" title={`▲ ${titleOf(signIn.error, 'not signed in')}`} className="mt-3">
          {messageOf(signIn.error)}
        </Notice>
      )}
    </section>
  );
}
