import { DEMO_BOARD, type PersonKey, partId, people, railId } from './people';
import { railBody } from './rail-body';

export type Role = PersonKey | 'nobody';

export const roles: Role[] = [
  'nobody',
  'stranger',
  'outsider',
  'owner',
  'engineer',
  'reviewer',
  'layout',
  'librarian',
  'librarianOn',
  'admin',
  'adminOn',
];

type Who = readonly Role[];

export interface RightsRow {
  method: 'get' | 'post' | 'put' | 'patch' | 'delete';
  /** As registered. */
  path: string;
  /** Path parameters to fill in. */
  at?: Record<string, string>;
  query?: string;
  body?: unknown;
  /** Who may, and what they are answered. */
  may: Who;
  ok: number;
  /** Who gets 404 instead of 403: for them it does not exist. */
  hidden?: Who;
  /** Distinguishes rows of one route. */
  note?: string;
}

const everyone = roles;
const signedIn = roles.filter((role) => role !== 'nobody');
const onBoard: Who = ['owner', 'engineer', 'reviewer', 'layout', 'librarianOn', 'adminOn'];
const engineers: Who = ['owner', 'engineer', 'librarianOn'];
const admins: Who = ['admin', 'adminOn'];
const librarians: Who = ['librarian', 'librarianOn'];
const offBoard: Who = ['stranger', 'outsider', 'librarian'];
const partMakers: Who = ['owner', 'engineer', 'outsider', 'librarian', 'librarianOn', 'admin', 'adminOn'];

const demo = { boardId: DEMO_BOARD };
const rail = { ...demo, railId: railId('VDD_IO') };
const core = { ...demo, railId: railId('VDD_CORE') };
const revision = { ...demo, letter: 'A' };
const draft = { partId: partId('AB-C0402-X7S-4U7-4') };
const approved = { partId: partId('AB-C0402-X7R-100N-16') };
const retired = { partId: partId('AB-C0805-X7R-2U2-16') };
const token = { token: 'x'.repeat(43) };
const newPassword = 'a long new password';

const seeBoard = { may: [...onBoard, 'admin'] as Who, hidden: offBoard };
const editBoard = { may: engineers, hidden: offBoard };
const manageBoard = { may: ['owner'] as Who, hidden: offBoard };

/** Every route, with who may use it. A test fails when a route is missing here. */
export const rightsTable: RightsRow[] = [
  { method: 'get', path: '/health', may: everyone, ok: 200 },
  { method: 'get', path: '/site', may: everyone, ok: 200 },
  { method: 'post', path: '/session', body: { email: 'x', password: 'x' }, may: everyone, ok: 401 },
  { method: 'get', path: '/session', may: everyone, ok: 200 },
  { method: 'delete', path: '/session', may: everyone, ok: 204 },
  { method: 'delete', path: '/sessions', may: signedIn, ok: 204 },
  {
    method: 'put',
    path: '/session/password',
    body: { currentPassword: 'x', password: newPassword },
    may: signedIn,
    ok: 422,
  },
  { method: 'post', path: '/password-resets', body: { email: 'x@y.example' }, may: everyone, ok: 202 },
  { method: 'get', path: '/password-resets/:token', at: token, may: everyone, ok: 404 },
  {
    method: 'post',
    path: '/password-resets/:token',
    at: token,
    body: { password: newPassword },
    may: everyone,
    ok: 404,
  },
  { method: 'get', path: '/invitations/:token', at: token, may: everyone, ok: 404 },
  {
    method: 'post',
    path: '/invitations/:token',
    at: token,
    body: { name: 'N', password: newPassword },
    may: everyone,
    ok: 404,
  },
  { method: 'get', path: '/people', may: signedIn, ok: 200 },
  {
    method: 'patch',
    path: '/people/:personId',
    at: { personId: people.layout.id },
    body: { version: 1, siteRole: 'librarian' },
    may: admins,
    ok: 200,
  },
  {
    method: 'post',
    path: '/people/:personId/invitation',
    at: { personId: people.layout.id },
    may: admins,
    ok: 409,
  },
  { method: 'post', path: '/invitations', body: { email: 'n@y.example', name: 'N' }, may: admins, ok: 201 },
  { method: 'get', path: '/mail', may: admins, ok: 200 },
  { method: 'get', path: '/mail/:mailId', at: { mailId: people.layout.id }, may: admins, ok: 404 },

  { method: 'get', path: '/boards', may: signedIn, ok: 200 },
  { method: 'post', path: '/boards', body: { name: 'New' }, may: signedIn, ok: 201 },
  { method: 'get', path: '/boards/:boardId', at: demo, ...seeBoard, ok: 200 },
  {
    method: 'patch',
    path: '/boards/:boardId',
    at: demo,
    body: { version: 1, name: 'Renamed' },
    ...manageBoard,
    ok: 200,
  },
  { method: 'delete', path: '/boards/:boardId', at: demo, query: '?version=1', ...manageBoard, ok: 204 },
  {
    method: 'put',
    path: '/boards/:boardId/setup',
    at: demo,
    body: { version: 99, setup: { stackup: null, recipes: [] } },
    ...editBoard,
    ok: 409,
  },
  {
    method: 'put',
    path: '/boards/:boardId/members/:personId',
    at: { ...demo, personId: people.stranger.id },
    body: { role: 'layout' },
    ...manageBoard,
    ok: 200,
  },
  {
    method: 'delete',
    path: '/boards/:boardId/members/:personId',
    at: { ...demo, personId: people.layout.id },
    ...manageBoard,
    ok: 200,
  },

  { method: 'get', path: '/boards/:boardId/rails', at: demo, ...seeBoard, ok: 200 },
  {
    method: 'post',
    path: '/boards/:boardId/rails',
    at: demo,
    body: railBody('VDD_NEW'),
    ...editBoard,
    ok: 201,
  },
  {
    method: 'put',
    path: '/boards/:boardId/rails/order',
    at: demo,
    body: {
      railIds: ['VDD_IO', 'VDD_CORE', 'VDD_DDR', 'VBUS_72', 'VDD_AUX', 'VDD_SERDES'].map(railId),
    },
    ...editBoard,
    ok: 200,
  },
  { method: 'get', path: '/boards/:boardId/rails/:railId', at: rail, ...seeBoard, ok: 200 },
  {
    method: 'patch',
    path: '/boards/:boardId/rails/:railId',
    at: core,
    body: { version: 2, bank: [] },
    ...editBoard,
    ok: 200,
  },
  {
    method: 'delete',
    path: '/boards/:boardId/rails/:railId',
    at: rail,
    query: '?version=1',
    ...editBoard,
    ok: 204,
  },
  { method: 'get', path: '/boards/:boardId/rails/:railId/document', at: rail, ...seeBoard, ok: 200 },

  { method: 'get', path: '/parts', may: signedIn, ok: 200 },
  { method: 'get', path: '/parts/facets', may: signedIn, ok: 200 },
  { method: 'get', path: '/parts/:partId', at: draft, may: signedIn, ok: 200 },
  {
    method: 'post',
    path: '/parts',
    body: {
      partNumber: 'AB-NEW-1',
      technology: 'ceramic',
      caseSize: '0402',
      capacitance_F: 1e-7,
      tolerance: 'K',
      rated_voltage_V: 16,
      esr_ohm: 0.02,
      esl_H: 3e-10,
      mount_H: 5e-10,
    },
    may: partMakers,
    ok: 201,
  },
  ...[
    { at: draft, may: partMakers, note: 'a draft' },
    { at: approved, may: librarians, note: 'an approved part' },
    { at: retired, may: librarians, note: 'a retired part' },
  ].map(
    (row): RightsRow => ({
      method: 'patch',
      path: '/parts/:partId',
      body: { version: 1, unit_cost: 1 },
      ok: 200,
      ...row,
    }),
  ),
  {
    method: 'put',
    path: '/parts/:partId/state',
    at: draft,
    body: { version: 1, state: 'approved' },
    may: librarians,
    ok: 200,
  },

  { method: 'get', path: '/boards/:boardId/revisions', at: demo, ...seeBoard, ok: 200 },
  {
    method: 'post',
    path: '/boards/:boardId/revisions',
    at: demo,
    body: { note: 'Third' },
    ...editBoard,
    ok: 201,
  },
  { method: 'get', path: '/boards/:boardId/revisions/:letter', at: revision, ...seeBoard, ok: 200 },
  {
    method: 'get',
    path: '/boards/:boardId/revisions/:letter/placement.csv',
    at: revision,
    ...seeBoard,
    ok: 200,
  },
  {
    method: 'get',
    path: '/boards/:boardId/revisions/:letter/document.json',
    at: revision,
    ...seeBoard,
    ok: 200,
  },
];

export function expectedStatus(row: RightsRow, role: Role): number {
  if (row.may.includes(role)) return row.ok;
  if (role === 'nobody') return 401;
  return row.hidden?.includes(role) ? 404 : 403;
}

export function addressOf({ path, at = {}, query = '' }: RightsRow): string {
  return path.replace(/:(\w+)/g, (_, name: string) => at[name]) + query;
}
