import { randomUUID } from 'node:crypto';
import { deriveParts, type SetDocument } from '@settlewright/geometry';
import sharp from 'sharp';
import type { Role } from '../../src/common/access.decorator';
import type { TestApp } from '../test-app';
import { mailedToken } from './mails';
import { surveyBody } from './surveys';
import { as, createMember, createWorkshop, type Person } from './people';

/** Numbers and words that stand nowhere else, so that they are found wherever they leak. */
export const PRIVATE = {
  name: 'Wilhelmina Quist',
  notes: 'asks for a footstool',
  statureMm: 1871.5,
  weightKg: 83.25,
  poplitealMm: 457.5,
  shoeMm: 31.5,
  /** Of a test sit. */
  sitKg: 91.375,
  sitNote: 'rocked to and fro',
};

/** Somebody of no cast sat on a foam. */
export const testSitBody = () => ({
  name: 'Somebody Heavy',
  ...{ satOn: '2026-11-03', grade: 'firm seat', ifd25N: 222.4, supportFactor: 2.2, thicknessMm: 95.25 },
  ...{ weightKg: PRIVATE.sitKg, measuredMm: 21.5, note: PRIVATE.sitNote },
});

/** A workshop with one of everything, made through its own routes by its owner. */
export interface Shop {
  people: Record<Role, Person> & { spare: Person };
  /** what stands in the braces of the paths */
  parameters: Record<string, string>;
  /** a seated document, as saved */
  document: SetDocument;
  draftNumber: number;
  partId: string;
  linkToken: string;
}

interface DraftBody {
  number: number;
  document: SetDocument;
}

export async function createShop(test: TestApp, name: string): Promise<Shop> {
  const { id: workshopId, owner } = await createWorkshop(test, name);
  const people = {
    owner,
    designer: await createMember(test, workshopId, 'designer'),
    carpenter: await createMember(test, workshopId, 'carpenter'),
    reviewer: await createMember(test, workshopId, 'reviewer'),
    spare: await createMember(test, workshopId, 'reviewer'),
  };
  const make = async <T = { id: string }>(path: string, body: object, status = 201): Promise<T> => {
    const made = await as(test, owner).post(path).send(body);
    if (made.status !== status) throw new Error(`POST ${path}: ${made.status} ${made.text}`);
    return made.body as T;
  };
  const W = `/workshops/${workshopId}`;
  const production = await make(`${W}/productions`, { name: 'The night train' });
  const P = `${W}/productions/${production.id}`;
  const { statureMm, weightKg, poplitealMm, shoeMm, notes } = PRIVATE;
  const person = await make(`${P}/cast`, {
    name: PRIVATE.name,
    role: 'the conductor',
    bodyData: 'women',
    statureMm,
    statureSource: 'measured',
    weightKg,
    measured: { popliteal_height: { mm: poplitealMm } },
    shoeMm,
    notes,
  });
  const set = await make(`${P}/sets`, { name: 'Compartment', arrangement: 'bench-window' });
  const S = `${P}/sets/${set.id}`;
  const draft = await seat(test, owner, S, person.id);
  const revision = await make<{ letter: string }>(`${S}/revisions`, {
    baseNumber: draft.number,
    note: 'to sit in',
  });
  const note = await make(`${S}/notes`, { text: 'Mind the sill', kind: 'comment' });
  const arrangement = await make(`${W}/arrangements`, { name: 'Booth of four', document: draft.document });
  const sit = await make(`${S}/test-sits`, testSitBody());
  const email = `upholsterer-${workshopId}@cushions.test`;
  const upholsterer = await make(`${W}/upholsterers`, { name: 'Cushions and Sons', email });
  const order = await make(`${P}/orders`, {
    setId: set.id,
    revisionLetter: revision.letter,
    title: 'Seats and backs',
  });
  await make(`${P}/orders/${order.id}/send`, { upholstererId: upholsterer.id }, 200);
  const token = await mailedToken(test, email, 'cushion-order');
  const { sentAt } = (await as(test, null).get(`/link/${token}`).expect(200)).body as { sentAt: string };
  const answered = async (path: string, body: object) => {
    const answer = await as(test, null).post(`/link/${token}/${path}`).send(body).expect(200);
    return answer.body as { quotes: { id: string }[]; questions: { id: string }[] };
  };
  await answered('questions', { text: 'Which day does the cloth come?' });
  const { quotes, questions } = await answered('quote', {
    ...{ name: 'Tuft', sentAt, currency: 'USD', validUntil: '2099-12-31' },
    lines: [{ text: 'Cushions', quantity: 2, unitMinor: 20_000 }],
  });
  const O = `${P}/orders/${order.id}`;
  const paid = { kind: 'deposit', amountMinor: 5000, currency: 'USD', note: 'by cheque' };
  const { payments, mails } = await make<{ payments: { id: string }[]; mails: { id: string }[] }>(
    `${O}/payments`,
    paid,
    200,
  );
  const population = await make(`${W}/populations`, surveyBody({ keepRows: true }));
  const study = await make(`${S}/studies`, {
    populationId: population.id,
    people: 200,
    draftNumber: draft.number,
  });
  const suggestion = await make(
    `${S}/suggestions`,
    { free: [{ dimensionId: 'seat-height', tolerance: 50 }], draftNumber: draft.number },
    202,
  );
  const invitation = await make(`${W}/invitations`, {
    email: `guest-${workshopId}@people.test`,
    role: 'reviewer',
  });
  const bench = draft.document.pieces.find(({ kind }) => kind === 'bench');
  return {
    people,
    parameters: {
      workshopId,
      userId: people.spare.id,
      invitationId: invitation.id,
      productionId: production.id,
      castId: person.id,
      setId: set.id,
      letter: revision.letter,
      noteId: note.id,
      sitId: sit.id,
      studyId: study.id,
      suggestionId: suggestion.id,
      populationId: population.id,
      upholstererId: upholsterer.id,
      arrangementId: arrangement.id,
      orderId: order.id,
      quoteId: quotes[0]?.id ?? '',
      questionId: questions[0]?.id ?? '',
      paymentId: payments[0]?.id ?? '',
      mailId: mails[0]?.id ?? '',
      fileId: await keepFile(test, owner, O),
    },
    document: draft.document,
    draftNumber: draft.number,
    partId: firstPartOf(draft.document, bench?.id ?? ''),
    linkToken: token,
  };
}

/** A photograph of the order; where no store is set up, the id of none. */
async function keepFile(test: TestApp, owner: Person, O: string): Promise<string> {
  if (test.settings.objectStore === null) return randomUUID();
  const photograph = await sharp({ create: { width: 8, height: 8, channels: 3, background: '#843' } })
    .jpeg()
    .toBuffer();
  const kept = await as(test, owner).post(`${O}/files`).attach('file', photograph, 'seat.jpg');
  if (kept.status !== 200) throw new Error(`POST ${O}/files: ${kept.status} ${kept.text}`);
  return (kept.body as { files: { id: string }[] }).files[0]?.id ?? '';
}

async function seat(test: TestApp, owner: Person, S: string, castId: string): Promise<DraftBody> {
  const { number, document } = (await as(test, owner).get(`${S}/draft`).expect(200)).body as DraftBody;
  const bench = document.pieces.find(({ kind }) => kind === 'bench');
  if (!bench) throw new Error('the arrangement has no bench to sit on');
  document.seating = [{ pieceId: bench.id, place: 1, sitter: { kind: 'cast', castId } }];
  const saved = await as(test, owner).put(`${S}/draft`).send({ baseNumber: number, document });
  if (saved.status !== 200) throw new Error(`PUT ${S}/draft: ${saved.status} ${saved.text}`);
  return { number: (saved.body as { number: number }).number, document };
}

function firstPartOf(document: SetDocument, pieceId: string): string {
  const part = deriveParts(document).find((one) => one.pieceId === pieceId);
  if (!part) throw new Error('the bench has no parts');
  return part.id;
}
