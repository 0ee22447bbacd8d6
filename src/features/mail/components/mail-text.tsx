import type { Mail } from '@shared/schemas/mail.schema';
import { Facts } from '@/components/ui/facts';
import { Notice } from '@/components/ui/notice';
import { LINK } from '@/components/ui/text-link';
import { dayAndTime } from '@/lib/time';
import { textPieces } from '../lib/text-pieces';

/** One mail as text; its addresses lead where they say. */
export function MailText({ mail }: { mail: Mail }) {
  let offset = 0;
  return (
    <article aria-label={mail.subject} className="flex min-w-0 flex-col gap-4">
      <h2 className="text-large font-semibold">{mail.subject}</h2>
      <Facts
        rows={[
          ['to', mail.to],
          ['when', dayAndTime(mail.createdAt)],
        ]}
      />
      {mail.error && (
        <Notice tone="error" title="▲ not delivered">
          {mail.error}
        </Notice>
      )}
      {mail.text === null ? (
        <p className="text-stone">The text went to the mail server and is not kept here.</p>
      ) : (
        <p className="max-w-prose border-t pt-4 break-words whitespace-pre-wrap">
          {textPieces(mail.text).map(({ text, href }) => {
            const key = offset;
            offset += text.length;
            return href ? (
              <a key={key} href={href} className={`${LINK} break-all`}>
                {text}
              </a>
            ) : (
              <span key={key}>{text}</span>
            );
          })}
        </p>
      )}
    </article>
  );
}
