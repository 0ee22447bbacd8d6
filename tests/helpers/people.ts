import type { BoardRole } from '@shared/schemas/board.schema';
import type { SiteRole } from '@shared/schemas/person.schema';
import { demoId } from '../../server/db/demo/demo-id';

export interface TestPerson {
  id: string;
  email: string;
  name: string;
  siteRole: SiteRole;
  /** Role on the demo board; null: not on it. */
  onBoard: BoardRole | null;
}

const demo = (role: string, name: string, siteRole: SiteRole, onBoard: BoardRole | null): TestPerson => {
  const email = `${role}@alderbrook.example`;
  return { id: demoId('person', email), email, name, siteRole, onBoard };
};

const extra = demo;

/** The demo people, and those that the rights table needs besides. */
export const people = {
  owner: demo('engineer', 'Ilse Varga', 'member', 'engineer'),
  reviewer: demo('reviewer', 'Tomas Renn', 'member', 'reviewer'),
  layout: demo('layout', 'Mina Okoro', 'member', 'layout'),
  librarian: demo('librarian', 'Edda Lindqvist', 'librarian', null),
  admin: demo('admin', 'Paul Harrow', 'admin', null),
  engineer: extra('second-engineer', 'Second Engineer', 'member', 'engineer'),
  stranger: extra('stranger', 'Some Stranger', 'member', null),
  outsider: extra('outsider', 'Engineer Elsewhere', 'member', null),
  librarianOn: extra('librarian-on', 'Librarian On Board', 'librarian', 'engineer'),
  adminOn: extra('admin-on', 'Admin On Board', 'admin', 'reviewer'),
} satisfies Record<string, TestPerson>;

export type PersonKey = keyof typeof people;

export const extraKeys = ['engineer', 'stranger', 'outsider', 'librarianOn', 'adminOn'] as const;

export const DEMO_BOARD = demoId('board', 'Tide gateway');
export const OTHER_BOARD = demoId('board', 'Other board');
export const railId = (name: string): string => demoId('rail', name);
export const partId = (partNumber: string): string => demoId('part', partNumber);
