import { afterAll, beforeAll, beforeEach, describe, expect, it, jest } from '@jest/globals';
import type { SetDocument } from '@settlewright/geometry';
import { AuditEntry } from '../src/audit/entities/audit-entry.entity';
import { HeldPapers } from '../src/cushion-orders/held-papers.service';
import { OutboxAttachment } from '../src/mail/entities/outbox-attachment.entity';
import { OutboxWorker } from '../src/mail/outbox-worker';
import { paperText } from './factories/papers';
import { as, createMember } from './factories/people';
import { createCastMember, createProduction, createSet, type SetPlace } from './factories/productions';
import { surveyBody } from './factories/surveys';
import { startTestApp, type TestApp } from './test-app';

const NAME = 'Ottilie Brandt';
const SAID = 'For OTTILIE  brandt’s sake';
const AFTER = 'For a person erased’s sake';

interface Found {
  places: { where: string; name: string; before: string; after: string; alreadySent: boolean }[];
  placeCount: number;
  parts: { where: string; name: string }[];
}

describe('a name that somebody typed', () => {
  let test: TestApp;
  let place: SetPlace;
  let castId: string;
  let orderPath: string;

  beforeAll(async () => {
    test = await startTestApp();
  });
  afterAll(() => test.close());
  const owner = () => as(test, place.workshop.owner);
  const made = async (path: string, body: object, status = 201) =>
    (await owner().post(path).send(body).expect(status)).body as { id: string };
  const find = async () =>
    (await owner().get(`${place.path}/cast/${castId}/named`).expect(200)).body as Found;
  const erase = () => owner().delete(`${place.path}/cast/${castId}`).expect(204);
  const draftOf = async () => (await owner().get(`${place.setPath}/draft`)).body as Draft;
  const dump = async () => {
    const tables = ['productions', 'cast_members', 'sets', 'set_notes', 'set_drafts', 'set_revisions'];
    const orders = [
      'revision_approvals',
      'cushion_orders',
      'order_events',
      'order_messages',
      'populations',
      'arrangements',
      'studies',
    ];
    const all: unknown[] = [];
    for (const table of [...tables, ...orders, 'outbox_mails', 'audit_entries']) {
      all.push(await test.dataSource.query(`SELECT * FROM ${table}`));
    }
    return JSON.stringify(all);
  };

  /** The name in every text of a production. */
  beforeEach(async () => {
    for (const table of ['productions', 'populations', 'arrangements', 'outbox_mails', 'audit_entries']) {
      await test.dataSource.query(`DELETE FROM ${table}`);
    }
    const production = await createProduction(test, { name: SAID, summary: SAID });
    castId = await createCastMember(test, production, { name: NAME });
    place = await createSet(test, production, { name: SAID });
    const { document } = await draftOf();
    document.pieces.forEach((piece) => Object.assign(piece, { note: SAID, name: SAID }));
    const bench = document.pieces.find(({ kind }) => kind === 'bench')!;
    if (bench.kind === 'bench') bench.seatCushion.foam.grade = SAID;
    document.knownDifferences = [{ id: 'd1', text: SAID, by: NAME }];
    document.seating = [{ pieceId: bench.id, place: 1, sitter: { kind: 'cast', castId } }];
    await owner().put(`${place.setPath}/draft`).send({ baseNumber: 1, document }).expect(200);
    await made(`${place.setPath}/notes`, { kind: 'comment', text: SAID });
    await made(`${place.setPath}/revisions`, { baseNumber: 2, note: SAID });
    await made(`${place.setPath}/revisions/A/approval`, { decision: 'approved', comment: SAID }, 200);
    const measured = { popliteal_height: { mm: 390, takenBy: NAME } };
    await createCastMember(test, place, { name: 'Hetty Vance', role: SAID, notes: SAID, measured });
    const firm = await made(`/workshops/${place.workshop.id}/upholsterers`, {
      name: 'Tuft and Sons',
      email: 'tuft@cushions.test',
    });
    const order = await made(`${place.path}/orders`, {
      setId: place.setId,
      revisionLetter: 'A',
      title: SAID,
      spec: { notes: SAID, cover: SAID },
    });
    orderPath = `${place.path}/orders/${order.id}`;
    await made(`${orderPath}/send`, { upholstererId: firm.id, message: SAID }, 200);
    await made(`${orderPath}/messages`, { text: SAID });
    const survey = surveyBody({ name: SAID, source: SAID });
    const { id: populationId } = await made(`/workshops/${place.workshop.id}/populations`, survey);
    await made(`/workshops/${place.workshop.id}/arrangements`, { name: SAID, document });
    // One is counted at once, the other waits with the whole population in its question.
    for (const people of [200, 50_000]) {
      await made(`${place.setPath}/studies`, { populationId, people, draftNumber: 2 });
    }
  });

  it('is shown at every place before the deed, and nothing is changed by looking', async () => {
    const before = await dump();
    const { places, placeCount, parts } = await find();
    const where = places.map((one) => one.where.replace(`${SAID},`, 'Set,'));
    for (const expected of [
      'This production, its name',
      'This production, its summary',
      'Hetty Vance, part',
      'Hetty Vance, notes',
      'Hetty Vance, taken by',
      'Set, its name',
      'Set, room note',
      'Set, revision A, its note',
      'Set, revision A, known differences',
      'Set, revision A, word on it',
      'Set, revision A, note on B1',
      'Set, draft, name of B1',
      'Set, draft, note on B1',
      'Set, draft, foam of B1',
      'Set, draft, known differences',
      'Order 1, title',
      'Order 1, notes',
      'Order 1, as it was sent, cover',
      'Order 1, letter to the upholsterer',
      'Order 1, letter not sent yet',
      'Set, draft, who said so of known differences',
      'Population, its name',
      'Population, its source',
      'Arrangement, its name',
      'Arrangement, name of B1',
      'Arrangement, note on B1',
      'Arrangement, foam of B1',
      'Study, name of its population',
      'Study, source of its population',
    ]) {
      expect(where).toContain(expected);
    }
    expect(placeCount).toBe(places.length);
    expect(places[0]).toMatchObject({ before: 'For ', name: 'OTTILIE  brandt', after: '’s sake' });
    const sent = places.filter(({ alreadySent }) => alreadySent).map((one) => one.where);
    expect(new Set(sent)).toEqual(
      new Set([
        ...['title', 'notes', 'cover'].map((part) => `Order 1, as it was sent, ${part}`),
        'Order 1, letter to the upholsterer',
      ]),
    );
    expect(parts).toEqual([]);
    expect((await dump()) === before).toBe(true);
  });

  it('is taken out everywhere when the person is erased; only the places are counted', async () => {
    await erase();
    const all = await dump();
    expect([...all.matchAll(/.{80}ottilie\s+brandt/gi)].map(([around]) => around)).toEqual([]);
    expect(all.includes(AFTER)).toBe(true);
    const { document, number } = await draftOf();
    expect(number).toBe(3);
    expect(document.knownDifferences).toEqual([{ id: 'd1', text: AFTER, by: 'a person erased' }]);
    const { body: revision } = await owner().get(`${place.setPath}/revisions/A`).expect(200);
    expect(revision).toMatchObject({ note: AFTER, approvals: [{ comment: AFTER }] });
    const { body: order } = await owner().get(orderPath).expect(200);
    expect(order).toMatchObject({ title: AFTER, spec: { notes: AFTER }, sent: { changedSince: false } });
    const recorded = await test.dataSource.manager.findOneByOrFail(AuditEntry, { subjectId: castId });
    expect(recorded.detail).toEqual({ texts: expect.any(Number), alreadySent: expect.any(Number) });
    expect(Number(recorded.detail?.alreadySent)).toBeGreaterThan(3);
    expect(Number(recorded.detail?.texts)).toBeGreaterThan(20);
  });

  it('leaves the paper that waits in the outbox', async () => {
    const papers = async () => {
      const held = await test.dataSource.manager.find(OutboxAttachment);
      return Promise.all(held.map(({ content }) => paperText(content)));
    };
    expect((await papers()).join()).toMatch(/OTTILIE\s+brandt/);
    await erase();
    expect((await papers()).at(-1)).toContain('a person erased');
    expect((await papers()).at(-1)).not.toMatch(/OTTILIE/);
  });

  it('is on no paper that is sent, should the process end before it is drawn again', async () => {
    const papers = test.app.get(HeldPapers);
    const waiting = () => test.dataSource.manager.find(OutboxAttachment, { relations: { mail: true } });
    const [before] = await waiting();
    const ended = jest.spyOn(papers, 'redraw').mockRejectedValueOnce(new Error('the process ended'));
    await owner().delete(`${place.path}/cast/${castId}`).expect(500);
    ended.mockRestore();
    expect((await waiting()).map(({ id, content }) => [id, content.length])).toEqual([[before?.id, 0]]);
    // It waits, and goes once its paper is there.
    const worker = test.app.get(OutboxWorker);
    await test.dataSource.query(`DELETE FROM outbox_mails WHERE id <> $1`, [before?.mailId]);
    expect(await worker.sendDue()).toBe(0);
    const [held] = await waiting();
    expect(held?.mail).toMatchObject({ state: 'queued', attempts: 0 });
    await papers.redraw();
    const [drawn] = await waiting();
    expect(await paperText(drawn?.content ?? Buffer.of())).toContain('a person erased');
    expect(await worker.sendDue()).toBe(1);
  });

  it('makes a save from before a conflict, as the draft went on', async () => {
    const { document, number } = await draftOf();
    await erase();
    const late = await owner().put(`${place.setPath}/draft`).send({ baseNumber: number, document });
    expect(late.status).toBe(409);
  });

  it('stays in another production, and inside other words', async () => {
    const other = await createProduction(test, { summary: SAID }, place.workshop);
    const short = await createCastMember(test, other, { name: 'Ann' });
    const set = await createSet(test, other);
    const text = 'Annex, Joann, Ann-Marie and Añn: ask Ann, ANN or “ann”.';
    await made(`${set.setPath}/notes`, { kind: 'comment', text });
    await erase();
    expect((await owner().get(other.path)).body.summary).toBe(SAID);
    await owner().delete(`${other.path}/cast/${short}`).expect(204);
    expect((await owner().get(`${set.setPath}/notes`)).body.items[0].text).toBe(
      'Annex, Joann, Ann-Marie and Añn: ask a person erased, a person erased or “a person erased”.',
    );
  });

  it('is looked for by its parts, which are shown and left', async () => {
    await made(`${place.setPath}/notes`, { kind: 'comment', text: 'Brandt’s shoes; of the rest no word' });
    expect((await find()).parts).toMatchObject([{ name: 'Brandt' }]);
    await erase();
    const { items } = (await owner().get(`${place.setPath}/notes?sort=createdAt`)).body;
    expect(items.map((note: { text: string }) => note.text)).toContain('Brandt’s shoes; of the rest no word');
  });

  it('is told to nobody who does not design', async () => {
    const carpenter = await createMember(test, place.workshop.id, 'carpenter');
    await as(test, carpenter).get(`${place.path}/cast/${castId}/named`).expect(403);
  });
});

interface Draft {
  number: number;
  document: SetDocument;
}
