import { randomUUID } from 'node:crypto';
import { createTransport } from 'nodemailer';
import type { Logger } from 'pino';
import type { Config } from '../config/environment';
import type { Database } from '../db/database';
import { MailEntity } from '../db/entities/mail.entity';
import type { Message } from './templates';

type Outcome = Pick<MailEntity, 'state' | 'error' | 'text' | 'html'>;
const WAIT_MS = 10_000;

/** Hands mail to the configured server; without one, keeps it in the outbox. Never throws for a failed delivery. */
export class Mailer {
  private readonly send: ((message: Message) => Promise<unknown>) | null;

  constructor(
    private readonly db: Database,
    private readonly log: Logger,
    config: Pick<Config, 'smtpUrl' | 'mailFrom'>,
  ) {
    this.send = config.smtpUrl ? smtpSender(config.smtpUrl, config.mailFrom) : null;
  }

  async deliver(message: Message): Promise<void> {
    const outcome = await this.attempt(message);
    await this.db.write((manager) =>
      manager.insert(MailEntity, {
        id: randomUUID(),
        recipient: message.to.address,
        subject: message.subject,
        createdAt: new Date().toISOString(),
        ...outcome,
      }),
    );
  }

  /** Bodies hold links that work: they stay only where there is no other way to read them. */
  private async attempt({ text, html, ...rest }: Message): Promise<Outcome> {
    if (!this.send) return { state: 'kept', error: null, text, html };
    try {
      await this.send({ text, html, ...rest });
      return { state: 'sent', error: null, text: null, html: null };
    } catch (error) {
      this.log.error({ err: error, subject: rest.subject }, 'mail was not delivered');
      const reason = error instanceof Error ? error.message : String(error);
      return { state: 'failed', error: reason.slice(0, 500), text: null, html: null };
    }
  }
}

function smtpSender(smtpUrl: string, from: string) {
  const url = new URL(smtpUrl);
  const secure = url.protocol === 'smtps:';
  const transport = createTransport({
    host: url.hostname,
    port: Number(url.port) || (secure ? 465 : 587),
    secure,
    ...(url.username && {
      auth: { user: decodeURIComponent(url.username), pass: decodeURIComponent(url.password) },
    }),
    connectionTimeout: WAIT_MS,
    greetingTimeout: WAIT_MS,
    socketTimeout: WAIT_MS,
    disableFileAccess: true,
    disableUrlAccess: true,
  });
  return (message: Message) => transport.sendMail({ from, ...message });
}
