import type { Page, PageQuery } from '@shared/schemas/common.schema';
import type { Mail } from '@shared/schemas/mail.schema';
import type { Context } from '../context';
import { MailEntity } from '../db/entities/mail.entity';
import { notFound } from '../errors/problems';
import type { Actor } from './actor';
import { requireOnSite } from './rights';

function mailView(mail: MailEntity): Mail {
  const { id, recipient, subject, text, html, state, error, createdAt } = mail;
  return { id, to: recipient, subject, text, html, state, error, createdAt };
}

export async function listMail(ctx: Context, actor: Actor, query: PageQuery): Promise<Page<Mail>> {
  requireOnSite(actor, 'read mail');
  const [mails, total] = await ctx.db.manager.findAndCount(MailEntity, {
    order: { createdAt: 'DESC', id: 'DESC' },
    take: query.limit,
    skip: query.offset,
  });
  return { items: mails.map(mailView), total, limit: query.limit, offset: query.offset };
}

export async function readMail(ctx: Context, actor: Actor, id: string): Promise<Mail> {
  requireOnSite(actor, 'read mail');
  const mail = await ctx.db.manager.findOneBy(MailEntity, { id });
  if (!mail) throw notFound('mail');
  return mailView(mail);
}
