import { z } from 'zod';
import { idSchema, isoDateSchema, nameSchema, pageOf, pageQuerySchema, versionSchema } from './common.schema';

export const siteRoleSchema = z.enum(['admin', 'librarian', 'member']);
export type SiteRole = z.infer<typeof siteRoleSchema>;

export const emailSchema = z.string().trim().toLowerCase().max(200).pipe(z.email('is not an e-mail address'));

/** At least 12 characters; bcrypt reads 72 bytes, so more is refused instead of silently cut. */
export const passwordSchema = z
  .string()
  .min(12, 'at least 12 characters')
  .refine((text) => new TextEncoder().encode(text).length <= 72, 'at most 72 bytes');

/** A person as everyone who is signed in may see them (to choose people for a board). */
export const personSchema = z.object({
  id: idSchema,
  name: z.string(),
  email: z.string(),
  siteRole: siteRoleSchema,
  disabled: z.boolean(),
  /** An invitation is out and has not been accepted. */
  invited: z.boolean(),
  version: versionSchema,
  createdAt: isoDateSchema,
});
export type Person = z.infer<typeof personSchema>;
export const personPageSchema = pageOf(personSchema);
export const personQuerySchema = pageQuerySchema.extend({ q: z.string().trim().max(80).optional() });

export const updatePersonSchema = z.strictObject({
  version: versionSchema,
  name: nameSchema.optional(),
  siteRole: siteRoleSchema.optional(),
  disabled: z.boolean().optional(),
});
export const inviteSchema = z.strictObject({
  email: emailSchema,
  name: nameSchema,
  siteRole: siteRoleSchema.default('member'),
});

export const signInSchema = z.strictObject({
  email: z.string().trim().toLowerCase().min(1, 'must not be empty').max(200),
  password: z.string().min(1, 'must not be empty').max(200),
});
export const sessionSchema = z.object({
  person: z.object({ id: idSchema, name: z.string(), email: z.string(), siteRole: siteRoleSchema }),
  expiresAt: isoDateSchema,
});
export type Session = z.infer<typeof sessionSchema>;
/** null: nobody is signed in. */
export const currentSessionSchema = sessionSchema.nullable();

/** Open to all: what the sign-in page must know. `demo` lists the demo sign-ins while demo mode is on. */
export const siteSchema = z.object({
  demo: z.boolean(),
  demoPeople: z.array(z.object({ email: z.string(), password: z.string(), role: z.string() })),
  version: z.string(),
});
export type Site = z.infer<typeof siteSchema>;

export const healthSchema = z.object({
  status: z.enum(['ok', 'failing']),
  database: z.enum(['ok', 'failing']),
  version: z.string(),
  engineVersion: z.string(),
});
export type Health = z.infer<typeof healthSchema>;

export const requestResetSchema = z.strictObject({ email: z.string().trim().toLowerCase().min(1).max(200) });
export const tokenSchema = z.string().regex(/^[A-Za-z0-9_-]{20,100}$/, 'is not a valid token');
export const tokenInfoSchema = z.object({ email: z.string(), name: z.string(), expiresAt: isoDateSchema });
export type TokenInfo = z.infer<typeof tokenInfoSchema>;
export const acceptInvitationSchema = z.strictObject({ name: nameSchema, password: passwordSchema });
export const setPasswordSchema = z.strictObject({ password: passwordSchema });
export const changePasswordSchema = z.strictObject({
  currentPassword: z.string().min(1, 'must not be empty').max(200),
  password: passwordSchema,
});
