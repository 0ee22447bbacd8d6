import type { SiteRole } from '@shared/schemas/person.schema';

/** Who makes the request, as the session says. */
export interface Actor {
  id: string;
  name: string;
  email: string;
  siteRole: SiteRole;
  sessionId: string;
  expiresAt: string;
}
