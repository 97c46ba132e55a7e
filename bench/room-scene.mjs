// What the 3D room asks of the graphics card with twelve people seated.
import { addPiece, emptySetDocument, seatSitter, setParameter } from '@settlewright/geometry';
import { chromium } from 'playwright-core';
import { openProduct } from './lib/product.mjs';

const PERCENTILES = [5, 25, 50, 75, 95, 99];

/** Three benches of four places in a row, a table before each, a wall behind. */
function roomOfTwelve() {
  let document = emptySetDocument();
  const add = (kind, xMm, zMm) => {
    const added = addPiece(document, kind, { xMm, zMm, turnDeg: 0 });
    document = added.document;
    return added.pieceId;
  };
  const change = (pieceId, key, value) => {
    const changed = setParameter(document, pieceId, key, value);
    if (!changed.ok) throw new Error(changed.error.message);
    document = changed.value;
  };
  const wall = add('bulkhead', 0, 0);
  change(wall, 'lengthMm', 8400);
  for (const [row, xMm] of [-2700, 0, 2700].entries()) {
    const bench = add('bench', xMm, 0);
    change(bench, 'lengthMm', 2600);
    change(bench, 'places.count', 4);
    add('table', xMm, 900);
    for (let place = 1; place <= 4; place += 1) {
      const n = row * 4 + place;
      document = seatSitter(document, bench, place, {
        kind: 'mannequin',
        bodyData: n % 2 === 0 ? 'men' : 'women',
        measure: 'stature',
        percentile: PERCENTILES[n % PERCENTILES.length],
      });
    }
  }
  return document;
}

export async function run() {
  const product = await openProduct();
  const base = `/workshops/${product.workshopId}/productions`;
  const production = await product.call('POST', base, {
    name: 'Twelve at table',
    summary: '',
    units: 'feet-inches',
    roundTo: 8,
  });
  const set = await product.call('POST', `${base}/${production.id}/sets`, {
    name: 'Long room',
    document: roomOfTwelve(),
  });
  const browser = await chromium.launch({
    executablePath: '/usr/bin/chromium',
    args: [
      '--no-sandbox',
      '--enable-unsafe-swiftshader',
      '--disable-background-networking',
      '--disable-quic',
    ],
  });
  const page = await browser.newPage({ baseURL: product.address, viewport: { width: 960, height: 600 } });
  await page.goto('/sign-in');
  await page.getByLabel('E-mail').fill(product.email);
  await page.getByLabel('Password', { exact: true }).fill(product.password);
  await page.getByRole('button', { name: 'Sign in' }).click();
  await page.waitForURL(/\/w\//);
  await page.goto(`/w/${product.workshopId}/p/${production.id}/sets/${set.id}`);
  const scene = page.locator('[data-scene-sitters="12"][data-scene-calls]');
  await scene.waitFor({ state: 'attached', timeout: 60_000 });
  await page.waitForFunction(
    () =>
      Number(document.querySelector('[data-scene-calls]')?.getAttribute('data-scene-triangles')) > 100_000,
  );
  const read = async (name) => Number(await scene.getAttribute(`data-scene-${name}`));
  const [calls, triangles] = [await read('calls'), await read('triangles')];
  await browser.close();
  await product.close();
  return [
    { name: 'room-draw-calls-12', value: calls, unit: 'calls', aim: 60, reference: null },
    { name: 'room-triangles-12', value: triangles, unit: 'triangles', aim: 250_000, reference: null },
  ];
}
