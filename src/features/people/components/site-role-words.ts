import { type SiteRole, siteRoleSchema } from '@shared/schemas/person.schema';

export const SITE_ROLES = siteRoleSchema.options;

export const SITE_ROLE_RIGHTS: Readonly<Record<SiteRole, string>> = {
  admin: 'Invites and disables people, gives site roles, reads the outbox, sees every board.',
  librarian: 'Approves, edits and retires parts of the shared library.',
  member: 'Works on the boards that they are on; an engineer of any board may add draft parts.',
};

export const asSiteRole = (text: string): SiteRole | undefined => siteRoleSchema.safeParse(text).data;
