import { pageQuerySchema } from '@shared/schemas/common.schema';
import { inviteSchema, personQuerySchema, updatePersonSchema } from '@shared/schemas/person.schema';
import { invite, inviteAgain } from '../services/invitation.service';
import { listMail, readMail } from '../services/mail.service';
import { listPeople, updatePerson } from '../services/person.service';
import { created, route } from './route';

export const peopleRoutes = [
  route('get', '/people', {
    access: 'signed-in',
    query: personQuerySchema,
    handle: ({ ctx, query }) => listPeople(ctx, query),
  }),
  route('patch', '/people/:personId', {
    access: 'signed-in',
    body: updatePersonSchema,
    handle: ({ ctx, actor, params, body }) => updatePerson(ctx, actor, params.personId, body),
  }),
  route('post', '/people/:personId/invitation', {
    access: 'signed-in',
    handle: ({ ctx, actor, params }) => inviteAgain(ctx, actor, params.personId),
  }),
  route('post', '/invitations', {
    access: 'signed-in',
    body: inviteSchema,
    handle: async ({ ctx, actor, body }) => created(await invite(ctx, actor, body)),
  }),
  route('get', '/mail', {
    access: 'signed-in',
    query: pageQuerySchema,
    handle: ({ ctx, actor, query }) => listMail(ctx, actor, query),
  }),
  route('get', '/mail/:mailId', {
    access: 'signed-in',
    handle: ({ ctx, actor, params }) => readMail(ctx, actor, params.mailId),
  }),
];
