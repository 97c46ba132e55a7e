import type { AccessRule, Role } from '../../src/common/access.decorator';

const EVERY_MEMBER: readonly [Role, ...Role[]] = ['owner', 'designer', 'carpenter', 'reviewer'];
const MAKERS: readonly [Role, ...Role[]] = ['owner', 'designer'];
const OWNER: readonly [Role, ...Role[]] = ['owner'];
const PUBLIC = ['public'] as const;
const SIGNED_IN = ['signed-in'] as const;
const LINK = ['link'] as const;

const W = '/workshops/{workshopId}';
const P = `${W}/productions/{productionId}`;
const S = `${P}/sets/{setId}`;
const O = `${P}/orders/{orderId}`;

/** Who may use what, written down apart from the routes themselves. A route that is not here fails the test. */
export const EXPECTED_ACCESS: Record<string, AccessRule> = {
  'GET /health': PUBLIC,
  'GET /health/live': PUBLIC,
  'GET /health/ready': PUBLIC,

  'POST /auth/sign-up': PUBLIC,
  'POST /auth/sign-in': PUBLIC,
  'POST /auth/refresh': PUBLIC,
  'POST /auth/sign-out': PUBLIC,
  'POST /auth/sign-out-everywhere': SIGNED_IN,
  'GET /auth/me': SIGNED_IN,
  'PATCH /auth/me': SIGNED_IN,
  'POST /auth/password-reset': PUBLIC,
  'POST /auth/password-reset/confirm': PUBLIC,
  'POST /auth/email/confirm': PUBLIC,
  'POST /auth/email/resend': SIGNED_IN,
  'POST /auth/email/change': SIGNED_IN,
  'GET /invitations/{token}': LINK,
  'POST /invitations/{token}/accept': LINK,

  'POST /workshops': SIGNED_IN,
  [`GET ${W}`]: EVERY_MEMBER,
  [`PATCH ${W}`]: OWNER,
  [`GET ${W}/members`]: EVERY_MEMBER,
  [`PATCH ${W}/members/{userId}`]: OWNER,
  [`DELETE ${W}/members/{userId}`]: EVERY_MEMBER,
  [`GET ${W}/invitations`]: OWNER,
  [`POST ${W}/invitations`]: OWNER,
  [`DELETE ${W}/invitations/{invitationId}`]: OWNER,

  [`GET ${W}/productions`]: EVERY_MEMBER,
  [`POST ${W}/productions`]: MAKERS,
  [`GET ${P}`]: EVERY_MEMBER,
  [`PATCH ${P}`]: MAKERS,
  [`POST ${P}/duplicate`]: MAKERS,
  [`POST ${P}/archive`]: MAKERS,
  [`POST ${P}/restore`]: MAKERS,

  [`GET ${P}/cast`]: EVERY_MEMBER,
  [`POST ${P}/cast`]: MAKERS,
  [`PATCH ${P}/cast/{castId}`]: MAKERS,
  [`DELETE ${P}/cast/{castId}`]: MAKERS,
  [`GET ${P}/cast/{castId}/export`]: MAKERS,
  [`GET ${P}/cast/{castId}/named`]: MAKERS,
  [`GET ${P}/cast.csv`]: MAKERS,
  [`GET ${P}/cast/measure-next`]: MAKERS,
  [`GET ${P}/cast/measuring-sheet.pdf`]: MAKERS,
  [`GET ${S}/draft/measure-next`]: MAKERS,
  [`POST ${P}/cast/import/preview`]: MAKERS,
  [`POST ${P}/cast/import`]: MAKERS,

  [`GET ${P}/sets`]: EVERY_MEMBER,
  [`POST ${P}/sets`]: MAKERS,
  [`GET ${S}`]: EVERY_MEMBER,
  [`PATCH ${S}`]: MAKERS,
  [`POST ${S}/duplicate`]: MAKERS,
  [`POST ${S}/archive`]: MAKERS,
  [`POST ${S}/restore`]: MAKERS,
  [`GET ${S}/draft`]: EVERY_MEMBER,
  [`PUT ${S}/draft`]: MAKERS,
  [`GET ${S}/draft/fit-sheet`]: EVERY_MEMBER,
  [`GET ${S}/draft/fit-sheet.csv`]: EVERY_MEMBER,
  [`GET ${S}/draft/fit-sheet.pdf`]: EVERY_MEMBER,
  [`GET ${S}/revisions`]: EVERY_MEMBER,
  [`POST ${S}/revisions`]: MAKERS,
  [`GET ${S}/revisions/{letter}`]: EVERY_MEMBER,
  [`GET ${S}/revisions/{letter}/fit-sheet.csv`]: EVERY_MEMBER,
  [`GET ${S}/revisions/{letter}/fit-sheet.pdf`]: EVERY_MEMBER,
  [`POST ${S}/revisions/{letter}/approval`]: ['owner', 'reviewer'],
  [`GET ${S}/notes`]: EVERY_MEMBER,
  [`POST ${S}/notes`]: EVERY_MEMBER,
  [`PATCH ${S}/notes/{noteId}`]: EVERY_MEMBER,
  [`GET ${S}/built`]: EVERY_MEMBER,
  [`PUT ${S}/built`]: ['owner', 'designer', 'carpenter'],

  [`POST ${S}/draft/story-stick`]: EVERY_MEMBER,
  [`POST ${S}/draft/story-stick.pdf`]: EVERY_MEMBER,
  [`POST ${S}/draft/dimension-map`]: EVERY_MEMBER,
  [`POST ${S}/draft/stand-in`]: MAKERS,
  [`POST ${S}/revisions/{letter}/story-stick`]: EVERY_MEMBER,
  [`POST ${S}/revisions/{letter}/story-stick.pdf`]: EVERY_MEMBER,
  [`POST ${S}/revisions/{letter}/dimension-map`]: EVERY_MEMBER,
  [`POST ${S}/revisions/{letter}/stand-in`]: MAKERS,
  [`POST ${S}/comparison`]: EVERY_MEMBER,

  [`GET ${S}/studies`]: EVERY_MEMBER,
  [`POST ${S}/studies`]: MAKERS,
  [`GET ${S}/studies/{studyId}`]: EVERY_MEMBER,
  [`POST ${S}/studies/{studyId}/cancel`]: MAKERS,
  [`DELETE ${S}/studies/{studyId}`]: MAKERS,

  [`GET ${S}/suggestions`]: EVERY_MEMBER,
  [`POST ${S}/suggestions`]: MAKERS,
  [`GET ${S}/suggestions/{suggestionId}`]: EVERY_MEMBER,
  [`POST ${S}/suggestions/{suggestionId}/cancel`]: MAKERS,
  [`DELETE ${S}/suggestions/{suggestionId}`]: MAKERS,

  [`GET ${W}/populations`]: EVERY_MEMBER,
  [`POST ${W}/populations`]: MAKERS,
  [`POST ${W}/populations/preview`]: MAKERS,
  [`GET ${W}/populations/{populationId}`]: EVERY_MEMBER,
  [`DELETE ${W}/populations/{populationId}`]: MAKERS,
  [`GET ${W}/populations/{populationId}/studies`]: MAKERS,
  [`GET ${W}/populations/{populationId}/rows.csv`]: OWNER,
  [`DELETE ${W}/populations/{populationId}/rows`]: MAKERS,

  [`GET ${W}/upholsterers`]: MAKERS,
  [`POST ${W}/upholsterers`]: MAKERS,
  [`PATCH ${W}/upholsterers/{upholstererId}`]: MAKERS,
  [`DELETE ${W}/upholsterers/{upholstererId}`]: MAKERS,
  [`GET ${P}/orders`]: EVERY_MEMBER,
  [`POST ${P}/orders`]: MAKERS,
  [`GET ${O}`]: EVERY_MEMBER,
  [`PATCH ${O}`]: MAKERS,
  [`GET ${O}/spec.pdf`]: EVERY_MEMBER,
  [`POST ${O}/send`]: MAKERS,
  [`POST ${O}/cancel`]: MAKERS,
  [`POST ${O}/state`]: MAKERS,
  [`GET ${O}/messages`]: MAKERS,
  [`POST ${O}/messages`]: MAKERS,
  [`POST ${O}/mail/send-again`]: MAKERS,
  [`POST ${O}/link/revoke`]: MAKERS,
  [`POST ${O}/link/renew`]: MAKERS,

  'GET /link/{token}': LINK,
  'GET /link/{token}/spec.pdf': LINK,
  'POST /link/{token}/acknowledge': LINK,
  'POST /link/{token}/reply': LINK,
};
