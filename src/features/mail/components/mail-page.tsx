import type { Mail } from '@shared/schemas/mail.schema';
import { Link, useSearchParams } from 'react-router-dom';
import { Failure } from '@/components/ui/failure';
import { EmptyState, Loading, Page } from '@/components/ui/page';
import { dayAndTime } from '@/lib/time';
import { usePageTitle } from '@/lib/use-page-title';
import { useMails } from '../api/mails';
import { MailText } from './mail-text';

const STATES: Readonly<Record<Mail['state'], readonly [string, string]>> = {
  kept: ['kept here', 'text-stone'],
  sent: ['▽ sent', 'text-reed'],
  failed: ['▲ failed', 'text-kingfisher'],
};

function Entry({ mail, isOpen }: { mail: Mail; isOpen: boolean }) {
  const [word, tone] = STATES[mail.state];
  return (
    <li className="border-b">
      <Link
        to={`?mail=${mail.id}`}
        aria-current={isOpen ? 'true' : undefined}
        className={`block border-l-[3px] py-2 pr-2 pl-3 ${isOpen ? 'border-deep bg-wash' : 'border-transparent hover:bg-wash/60'}`}
      >
        <span className="block truncate font-semibold">{mail.subject}</span>
        <span className="block truncate text-stone">{mail.to}</span>
        <span className="flex justify-between gap-4 text-small">
          <span className="text-stone">{dayAndTime(mail.createdAt)}</span>
          <span className={tone}>{word}</span>
        </span>
      </Link>
    </li>
  );
}

/** What the server mailed: kept here while no mail server is set, else only that it was sent. */
export function MailPage() {
  usePageTitle('Mail');
  const [search] = useSearchParams();
  const mails = useMails();
  if (mails.isPending) return <Loading what="the mail" />;
  if (mails.isError) return <Failure error={mails.error} what="the mail" retry={() => mails.refetch()} />;
  const { items } = mails.data;
  const open = items.find((mail) => mail.id === search.get('mail')) ?? items[0];
  return (
    <Page
      title="Mail"
      lead="What the server wrote to people: invitations and password resets. Without a mail server it stays here."
    >
      {!open ? (
        <EmptyState title="Nothing was mailed yet">
          Invite a person, or let someone ask for a new password, and the mail stands here.
        </EmptyState>
      ) : (
        <div className="grid gap-x-10 gap-y-8 lg:grid-cols-[22rem_minmax(0,1fr)]">
          <ul
            aria-label="mails, newest first"
            className="max-h-[40vh] overflow-y-auto border-t lg:max-h-[70vh]"
          >
            {items.map((mail) => (
              <Entry key={mail.id} mail={mail} isOpen={mail.id === open.id} />
            ))}
          </ul>
          <MailText mail={open} />
        </div>
      )}
    </Page>
  );
}
