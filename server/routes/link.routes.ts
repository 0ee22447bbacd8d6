import { acceptInvitationSchema, requestResetSchema, setPasswordSchema } from '@shared/schemas/person.schema';
import { setSessionCookie } from '../middleware/session';
import { acceptInvitation } from '../services/invitation.service';
import { requestReset, resetPassword } from '../services/password.service';
import { describeToken } from '../services/token.service';
import { accepted, created, done, route } from './route';

/** What the links in mails lead to. */
export const linkRoutes = [
  route('post', '/password-resets', {
    access: 'open',
    limit: 'reset',
    body: requestResetSchema,
    handle: ({ ctx, body }) => {
      requestReset(ctx, body.email);
      return accepted();
    },
  }),
  route('get', '/password-resets/:token', {
    access: 'open',
    limit: 'token',
    handle: ({ ctx, params }) => describeToken(ctx, params.token, 'reset'),
  }),
  route('post', '/password-resets/:token', {
    access: 'open',
    limit: 'token',
    body: setPasswordSchema,
    handle: async ({ ctx, params, body }) => {
      await resetPassword(ctx, params.token, body.password);
      return done();
    },
  }),
  route('get', '/invitations/:token', {
    access: 'open',
    limit: 'token',
    handle: ({ ctx, params }) => describeToken(ctx, params.token, 'invitation'),
  }),
  route('post', '/invitations/:token', {
    access: 'open',
    limit: 'token',
    body: acceptInvitationSchema,
    handle: async ({ ctx, params, body, res }) => {
      const { token, session } = await acceptInvitation(ctx, params.token, body);
      setSessionCookie(ctx, res, token, session.expiresAt);
      return created(session);
    },
  }),
];
