import { expect, it } from '@jest/globals';
import { loggedPath } from './request-log';

it.each([
  ['/api/link/s3cret', '/api/link/[token]'],
  ['/api/link/s3cret/spec.pdf', '/api/link/[token]/spec.pdf'],
  ['/api/invitations/s3cret/accept', '/api/invitations/[token]/accept'],
  ['/order/s3cret', '/order/[token]'],
  ['/reset/s3cret', '/reset/[token]'],
  ['/confirm/s3cret?from=mail', '/confirm/[token]'],
  ['/invitation/s3cret', '/invitation/[token]'],
  ['/api/workshops/1/productions?search=Somebody', '/api/workshops/1/productions'],
  ['/api/workshops/1/invitations/2', '/api/workshops/1/invitations/2'],
  ['//api/link/s3cret', '/api/link/[token]'],
  ['/API/Link/s3cret', '/API/Link/[token]'],
])('logs %s as %s', (url, path) => {
  expect(loggedPath(url)).toBe(path);
});
