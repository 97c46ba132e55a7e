import { randomUUID } from 'node:crypto';
import { type Shop, testSitBody } from '../factories/shop';
import { surveyBody, surveyCsv } from '../factories/surveys';

const W = '/workshops/{workshopId}';
const P = `${W}/productions/{productionId}`;
const S = `${P}/sets/{setId}`;
const O = `${P}/orders/{orderId}`;

/** A body that each changing route accepts; routes that take none are not listed. */
export function bodiesFor(shop: Shop): Record<string, object> {
  const { setId, letter, upholstererId } = shop.parameters;
  const email = `${randomUUID()}@people.test`;
  const csv = 'name,stature (mm)\nSomebody Else,1700\n';
  return {
    'POST /workshops': { name: 'Another' },
    'PATCH /auth/me': { name: 'Renamed' },
    'POST /auth/email/change': { newEmail: email, password: 'not asked again' },
    [`PATCH ${W}`]: { telephone: '555 01 02' },
    [`PUT ${W}/cushion-settings`]: { baseNumber: 0, settings: { allowancesMm: {}, foams: [] } },
    [`POST ${W}/arrangements`]: { name: 'Booth of six', document: shop.document },
    [`PATCH ${W}/members/{userId}`]: { role: 'reviewer' },
    [`POST ${W}/invitations`]: { email, role: 'reviewer' },
    [`POST ${W}/productions`]: { name: 'Another' },
    [`PATCH ${P}`]: { summary: 'Longer' },
    [`POST ${P}/cast`]: { name: 'Somebody' },
    [`PATCH ${P}/cast/{castId}`]: { clothing: 'heavy' },
    [`POST ${P}/cast/import/preview`]: { csv },
    [`POST ${P}/cast/import`]: { csv },
    [`POST ${P}/sets`]: { name: 'Another' },
    [`PATCH ${S}`]: { name: 'Renamed' },
    [`PUT ${S}/draft`]: { baseNumber: shop.draftNumber, document: shop.document },
    [`POST ${S}/revisions`]: { baseNumber: shop.draftNumber, note: '' },
    [`POST ${S}/revisions/{letter}/approval`]: { decision: 'approved', comment: '' },
    [`POST ${S}/test-sits`]: testSitBody(),
    [`POST ${S}/notes`]: { text: 'Looks right', kind: 'comment' },
    [`PATCH ${S}/notes/{noteId}`]: { resolved: true },
    [`PUT ${S}/built`]: { partId: shop.partId, built: true },
    ...choiceBodies(S, shop),
    [`POST ${S}/studies`]: { populationId: 'british', people: 100, revisionLetter: letter },
    [`POST ${S}/suggestions`]: {
      free: [{ dimensionId: 'seat-depth', tolerance: 25 }],
      revisionLetter: letter,
    },
    [`POST ${W}/populations/preview`]: { csv: surveyCsv() },
    [`POST ${W}/populations`]: surveyBody({ name: 'More colleagues' }),
    [`POST ${W}/upholsterers`]: { name: 'Another', email },
    [`PATCH ${W}/upholsterers/{upholstererId}`]: { notes: 'Closed on Mondays' },
    [`POST ${P}/orders`]: { setId, revisionLetter: letter, title: 'More' },
    [`PATCH ${O}`]: { title: 'Other' },
    [`POST ${O}/send`]: { upholstererId },
    [`POST ${O}/state`]: { to: 'agreed' },
    [`POST ${O}/messages`]: { text: 'When?' },
    [`POST ${O}/quotes`]: {
      lines: [{ text: 'Cushions', quantity: 2, unitMinor: 21_000 }],
      currency: 'USD',
      validUntil: '2099-12-31',
      heard: 'by telephone',
    },
    [`POST ${O}/quotes/{quoteId}/decline`]: { reason: 'Too dear' },
    [`POST ${O}/questions`]: { text: 'Which thread?' },
    [`POST ${O}/questions/{questionId}/answer`]: { answer: 'On Friday' },
    [`POST ${O}/payments`]: { kind: 'deposit', amountMinor: 100, currency: 'USD', note: 'by cheque' },
    [`POST ${O}/payments/checkout`]: { amountMinor: 100 },
    [`POST ${O}/mails/{mailId}/bounced`]: { note: 'No such address' },
    [`POST ${O}/inspections`]: {
      kind: 'received',
      outcome: 'rejected',
      note: 'Torn',
      cushions: [{ mark: 'C1' }],
    },
  };
}

/** Questions about choices, the same of the draft and of a revision. */
function choiceBodies(S: string, { document, parameters: { letter } }: Shop): Record<string, object> {
  const [seat] = document.seating;
  const person = { bodyData: 'women', statureMm: 1600 };
  const placeId = `${seat?.pieceId}:${seat?.place}`;
  const asked = {
    'story-stick': { dimension: 'seat-depth' },
    'story-stick.pdf': { dimension: 'seat-depth' },
    'dimension-map': { across: 'seat-depth', up: 'sill-depth' },
    'stand-in': { placeId, person },
  };
  return Object.fromEntries([
    [`POST ${S}/comparison`, { from: { revisionLetter: letter }, to: {} }],
    ...Object.entries(asked).flatMap(([what, body]) => [
      [`POST ${S}/draft/${what}`, body],
      [`POST ${S}/revisions/{letter}/${what}`, body],
    ]),
  ]) as Record<string, object>;
}
