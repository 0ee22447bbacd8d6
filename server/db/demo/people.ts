import type { BoardRole } from '@shared/schemas/board.schema';
import type { SiteRole } from '@shared/schemas/person.schema';
import { demoId } from './demo-id';

/** Shown to everyone while demo mode is on; accounts that still have it are closed when it is off. */
export const DEMO_PASSWORD = 'still water at dusk';

interface DemoPerson {
  id: string;
  name: string;
  email: string;
  siteRole: SiteRole;
  boardRole: BoardRole | null;
}

const person = (name: string, role: string, siteRole: SiteRole, boardRole: BoardRole | null): DemoPerson => {
  const email = `${role}@alderbrook.example`;
  return { id: demoId('person', email), name, email, siteRole, boardRole };
};

export const demoPeople = [
  person('Ilse Varga', 'engineer', 'member', 'engineer'),
  person('Tomas Renn', 'reviewer', 'member', 'reviewer'),
  person('Mina Okoro', 'layout', 'member', 'layout'),
  person('Edda Lindqvist', 'librarian', 'librarian', null),
  person('Paul Harrow', 'admin', 'admin', null),
];

/** What to call each of them on the sign-in page. */
export const demoRoles: ReadonlyMap<string, string> = new Map(
  demoPeople.map(({ email, siteRole, boardRole }) => [email, boardRole ?? siteRole]),
);
