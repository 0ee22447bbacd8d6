import { changePasswordSchema, signInSchema } from '@shared/schemas/person.schema';
import { clearSessionCookie, setSessionCookie } from '../middleware/session';
import { changePassword } from '../services/password.service';
import { sessionOf, signIn, signOut, signOutEverywhere } from '../services/session.service';
import { created, done, route } from './route';

export const sessionRoutes = [
  route('post', '/session', {
    access: 'open',
    limit: 'signIn',
    body: signInSchema,
    handle: async ({ ctx, body, res }) => {
      const { token, session } = await signIn(ctx, body.email, body.password);
      setSessionCookie(ctx, res, token, session.expiresAt);
      return created(session);
    },
  }),
  route('get', '/session', {
    access: 'open',
    // Asked on every first visit: that nobody is signed in is an answer, not an error.
    handle: ({ actor }) => (actor ? sessionOf(actor) : null),
  }),
  route('delete', '/session', {
    access: 'open',
    handle: async ({ ctx, actor, res }) => {
      if (actor) await signOut(ctx, actor);
      clearSessionCookie(ctx, res);
      return done();
    },
  }),
  route('delete', '/sessions', {
    access: 'signed-in',
    handle: async ({ ctx, actor, res }) => {
      await signOutEverywhere(ctx, actor.id);
      clearSessionCookie(ctx, res);
      return done();
    },
  }),
  route('put', '/session/password', {
    access: 'signed-in',
    limit: 'password',
    body: changePasswordSchema,
    handle: async ({ ctx, actor, body }) => {
      await changePassword(ctx, actor, body);
      return sessionOf(actor);
    },
  }),
];
