import { z } from 'zod';
import { idSchema, isoDateSchema, pageOf } from './common.schema';

/** A mail as the server sent or kept it. Bodies stay only in the local outbox, never once a mail server delivers. */
export const mailSchema = z.object({
  id: idSchema,
  to: z.string(),
  subject: z.string(),
  text: z.string().nullable(),
  html: z.string().nullable(),
  state: z.enum(['kept', 'sent', 'failed']),
  error: z.string().nullable(),
  createdAt: isoDateSchema,
});
export type Mail = z.infer<typeof mailSchema>;
export const mailPageSchema = pageOf(mailSchema);
