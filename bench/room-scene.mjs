// What the 3D room asks of the graphics card with twelve people seated.
import { chromium } from 'playwright-core';
import { openProduct } from './lib/product.mjs';
import { roomOfTwelve } from './lib/room-of-twelve.mjs';

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
