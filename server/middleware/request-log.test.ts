import { expect, it } from 'vitest';
import { withoutSecrets } from './request-log';

it.each([
  ['/api/invitations/abc123?x=1', '/api/invitations/…?x=1'],
  ['/api/invitations', '/api/invitations'],
  ['/api/password-resets/abc123', '/api/password-resets/…'],
  ['/reset/abc123', '/reset/…'],
  ['/invitation/abc123', '/invitation/…'],
  ['/api/boards?token=abc&q=1', '/api/boards?token=…&q=1'],
])('logs %s as %s', (url, logged) => {
  expect(withoutSecrets(url)).toBe(logged);
});
