// What the 3D room asks of the graphics card with twelve and with forty people seated.
import { chromium } from 'playwright-core';
import { openProduct } from './lib/product.mjs';
import { roomOfForty } from './lib/room-of-forty.mjs';
import { roomOfTwelve } from './lib/room-of-twelve.mjs';

const ROOMS = [
  { sitters: 12, name: 'Twelve at table', document: roomOfTwelve() },
  { sitters: 40, name: 'Forty at table', document: roomOfForty() },
];
/** Bodies come one by one from a worker: the figures count once they have stood still for so long. */
const STILL_MS = 3000;

async function settled(page, scene) {
  const read = async (name) => Number(await scene.getAttribute(`data-scene-${name}`));
  let [calls, triangles] = [0, 0];
  for (;;) {
    const last = [calls, triangles].join();
    [calls, triangles] = [await read('calls'), await read('triangles')];
    if (triangles > 100_000 && last === [calls, triangles].join()) return { calls, triangles };
    await page.waitForTimeout(STILL_MS);
  }
}

export async function run() {
  const product = await openProduct();
  const base = `/workshops/${product.workshopId}/productions`;
  const production = await product.call('POST', base, {
    name: 'Many at table',
    summary: '',
    units: 'feet-inches',
    roundTo: 8,
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
  const figures = [];
  for (const { sitters, name, document } of ROOMS) {
    const set = await product.call('POST', `${base}/${production.id}/sets`, { name, document });
    await page.goto(`/w/${product.workshopId}/p/${production.id}/sets/${set.id}`);
    const scene = page.locator(`[data-scene-sitters="${sitters}"][data-scene-calls]`);
    await scene.waitFor({ state: 'attached', timeout: 60_000 });
    const { calls, triangles } = await settled(page, scene);
    figures.push(
      { name: `room-draw-calls-${sitters}`, value: calls, unit: 'calls', aim: 60, reference: null },
      {
        name: `room-triangles-${sitters}`,
        value: triangles,
        unit: 'triangles',
        aim: sitters === 12 ? 250_000 : null,
        reference: null,
      },
    );
  }
  await browser.close();
  await product.close();
  return figures;
}
