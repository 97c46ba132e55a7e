import { once } from 'node:events';
import { readdir } from 'node:fs/promises';
import { createServer } from 'node:http';
import { afterAll, beforeAll, describe, expect, it, jest } from '@jest/globals';
import sharp from 'sharp';
import { FILE_LIMITS } from '../src/cushion-orders/files/clean-file';
import { OrderFiles } from '../src/cushion-orders/files/files.service';
import { createIssuedSet, type IssuedSet } from './factories/orders';
import { as, type Person } from './factories/people';
import { type LifeBody, SentOrders, type SentTo } from './factories/sent-orders';
import { ApiProcess, freePort, startObjects, type StandIn, STORE_KEYS } from './factories/stand-ins';
import { startTestApp, type TestApp } from './test-app';

jest.setTimeout(240_000);

let test: TestApp;
let made: IssuedSet;
let owner: Person;
let orders: SentOrders;
let store: StandIn & { folder: string };

beforeAll(async () => {
  store = await startObjects();
  test = await startTestApp({ objectStore: { ...STORE_KEYS, endpoint: store.url } });
  made = await createIssuedSet(test, 'Wilhelmina Sittersworth');
  owner = made.workshop.owner;
  orders = new SentOrders(test, made);
});
afterAll(async () => {
  await test.close();
  await store.end();
});

/** A photograph taken with the camera on its side, with the place where it was taken. */
const photograph = (width = 60, height = 40) =>
  sharp({ create: { width, height, channels: 3, background: '#883344' } })
    .withExif({
      IFD0: { Make: 'Secret Camera' },
      IFD3: { GPSLatitudeRef: 'N', GPSLatitude: '51/1 30/1 0/1' },
    })
    .withMetadata({ orientation: 6 })
    .jpeg()
    .toBuffer();
const PDF = Buffer.from('%PDF-1.4\n1 0 obj<<>>endobj\ntrailer<<>>\n%%EOF\n');

const byShop = (order: SentTo, content: Buffer, name = 'photo.jpg', mark?: string) => {
  const sent = as(test, owner).post(`${order.path}/files`).attach('file', content, name);
  return mark === undefined ? sent : sent.field('cushionMark', mark);
};
const byLink = (token: string, content: Buffer, name = 'photo.jpg') =>
  as(test, null).post(`/link/${token}/files`).attach('file', content, name);
const filesOf = async ({ path }: SentTo) =>
  ((await as(test, owner).get(`${path}/life`).expect(200)).body as LifeBody).files;
const kept = async () => (await readdir(store.folder)).filter((name) => !name.endsWith('.type')).length;

describe('a photograph', () => {
  it('is turned upright and stripped of the place and the camera, for both sides', async () => {
    const order = await orders.send();
    const { mark } = order.cushion;
    const { body } = await byShop(order, await photograph(), 'seat é.jpeg', mark).expect(200);
    expect((body as LifeBody).files).toMatchObject([
      { name: 'seat é.jpg', type: 'image/jpeg', widthPx: 40, heightPx: 60, cushionMark: mark },
    ]);
    const [file] = await filesOf(order);
    for (const answer of [
      await as(test, owner).get(`${order.path}/files/${file!.id}`).expect(200),
      await as(test, null).get(`/link/${order.token}/files/${file!.id}`).expect(200),
    ]) {
      const bytes = answer.body as Buffer;
      const read = await sharp(bytes).metadata();
      expect(read).toMatchObject({ format: 'jpeg', width: 40, height: 60 });
      expect([read.exif, read.orientation]).toEqual([undefined, undefined]);
      expect(bytes.includes('Secret Camera')).toBe(false);
      expect(answer.headers).toMatchObject({
        'content-type': 'image/jpeg',
        'x-content-type-options': 'nosniff',
        'content-security-policy': "default-src 'none'; sandbox",
        'cache-control': expect.stringContaining('no-store'),
        'content-disposition': expect.stringMatching(/^inline; filename="seat _\.jpg"/),
      });
    }
  });

  it('is made smaller when it is very large', async () => {
    const order = await orders.send();
    const wide = await sharp({ create: { width: 5000, height: 1000, channels: 3, background: '#fff' } })
      .png()
      .toBuffer();
    await byShop(order, wide).expect(200);
    expect(await filesOf(order)).toMatchObject([{ widthPx: FILE_LIMITS.keptPx, heightPx: 600 }]);
  });
});

describe('a file', () => {
  it.each([
    ['HEIC', Buffer.from('\0\0\0\x18ftypheic\0\0\0\0mif1heic', 'latin1'), /HEIC.*Send it as JPEG/],
    ['a page', Buffer.from('<html><script>alert(1)</script>'), /none of the kinds/],
    ['a drawing with script', Buffer.from('<svg xmlns="http://www.w3.org/2000/svg"/>'), /none of the kinds/],
    ['a broken picture', Buffer.concat([Buffer.from([0xff, 0xd8, 0xff, 0xe0]), PDF]), /cannot be read/],
    ['nothing', Buffer.of(), /none of the kinds/],
  ])('that is %s is refused in words, whatever its name says', async (_what, content, words) => {
    const order = await orders.send();
    const { body } = await byShop(order, content, 'photo.jpg').expect(400);
    expect((body as { detail: string }).detail).toMatch(words);
    expect(await filesOf(order)).toEqual([]);
  });

  it('that is too large is refused while it arrives', async () => {
    const order = await orders.send();
    const { body } = await byShop(order, Buffer.alloc(FILE_LIMITS.bytes + 1, 1)).expect(413);
    expect(body).toMatchObject({ code: 'file-too-large', detail: expect.stringContaining('15 MB') });
  });

  it('that is a PDF is kept as it came and handed out as a download', async () => {
    const order = await orders.send();
    await byLink(order.token, PDF, '../../quote.exe').expect(200);
    const [file] = await filesOf(order);
    expect(file).toMatchObject({ name: 'quote.pdf', type: 'application/pdf', byName: 'Odile Fennimore' });
    const got = await as(test, null)
      .get(`/link/${order.token}/files/${file!.id}`)
      .responseType('blob')
      .expect(200);
    expect((got.body as Buffer).equals(PDF)).toBe(true);
    expect(got.headers['content-disposition']).toMatch(/^attachment;/);
  });

  it('pinned to a cushion that the order does not have is refused', async () => {
    const order = await orders.send();
    await byShop(order, await photograph(), 'a.jpg', 'C900').expect(400);
    await byShop(order, await photograph(), 'a.jpg', 'lid').expect(400);
    expect(await filesOf(order)).toEqual([]);
  });

  it('is removed by the side that sent it, with its bytes', async () => {
    const order = await orders.send();
    await byShop(order, await photograph()).expect(200);
    const before = await kept();
    const [file] = await filesOf(order);
    await as(test, null).delete(`/link/${order.token}/files/${file!.id}`).expect(404);
    await as(test, owner).delete(`${order.path}/files/${file!.id}`).expect(200);
    expect(await filesOf(order)).toEqual([]);
    expect(await kept()).toBe(before - 1);
    await as(test, owner).get(`${order.path}/files/${file!.id}`).expect(404);
  });

  it('is for one order and its upholsterer alone', async () => {
    const [order, other] = [await orders.send(), await orders.send()];
    await byShop(order, await photograph()).expect(200);
    const [file] = await filesOf(order);
    await as(test, null).get(`/link/${other.token}/files/${file!.id}`).expect(404);
    await as(test, owner).get(`${other.path}/files/${file!.id}`).expect(404);
    const next = await orders.sendOn(order);
    await as(test, null).get(`/link/${next}/files/${file!.id}`).expect(404);
    await byLink(order.token, PDF).expect(410);
    await byLink('A'.repeat(43), PDF).expect(404);
  });

  it('of which a process that was killed left half is never seen, and is swept away', async () => {
    // A store that takes the bytes and never answers.
    const silent = createServer((request) => void request.resume());
    silent.listen(0, '127.0.0.1');
    await once(silent, 'listening');
    const { port } = silent.address() as { port: number };
    const objectStore = { ...STORE_KEYS, endpoint: `http://127.0.0.1:${port}` };
    const api = await ApiProcess.start({ ...test.settings, objectStore }, await freePort());
    const order = await orders.send();
    const asked = once(silent, 'request');
    const form = new FormData();
    form.set('file', new Blob([new Uint8Array(await photograph())]), 'half.jpg');
    const answer = fetch(`${api.url}/link/${order.token}/files`, { method: 'POST', body: form });
    answer.catch(() => undefined);
    await asked;
    await api.kill();
    await expect(answer).rejects.toThrow();
    silent.close();
    const rows = () =>
      test.dataSource.query<{ id: string; state: string }[]>(
        `SELECT id, state FROM order_files WHERE order_id = $1`,
        [order.id],
      );
    const [half] = await rows();
    expect(half).toMatchObject({ state: 'arriving' });
    expect(await filesOf(order)).toEqual([]);
    await as(test, owner).get(`${order.path}/files/${half!.id}`).expect(404);
    const sweeper = test.app.get(OrderFiles);
    expect(await sweeper.sweep(new Date())).toBe(0);
    expect(await sweeper.sweep(new Date(Date.now() + 16 * 60_000))).toBe(1);
    expect(await rows()).toEqual([]);
  });
});
