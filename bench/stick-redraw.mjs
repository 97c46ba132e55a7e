// Time in script of one move of a story stick's plumb line with twelve people seated.
import { chromium } from 'playwright-core';
import { openProduct } from './lib/product.mjs';
import { roomOfTwelve } from './lib/room-of-twelve.mjs';

const MOVES = 120;
const SWAY_PX = 90;

/** Moves the bob to and fro with the mouse, one move a frame, and answers the mean time in script of a move. */
async function scriptTime(page, devtools) {
  const bob = page.locator('[data-stick-bob]');
  const stood = Number(await bob.getAttribute('aria-valuenow'));
  const box = await bob.boundingBox();
  const [x, y] = [box.x + box.width / 2, box.y + box.height / 2];
  const inScript = async () => {
    const { metrics } = await devtools.send('Performance.getMetrics');
    return 1000 * metrics.find(({ name }) => name === 'ScriptDuration').value;
  };
  await page.mouse.move(x, y);
  await page.mouse.down();
  const before = await inScript();
  for (let n = 1; n <= MOVES; n += 1) {
    await page.mouse.move(x + SWAY_PX * Math.sin((n / MOVES) * 4.5 * Math.PI), y);
    await page.evaluate(() => new Promise((resolve) => globalThis.requestAnimationFrame(resolve)));
  }
  const after = await inScript();
  const held = Number(await bob.getAttribute('aria-valuenow'));
  await page.mouse.up();
  if (Math.abs(held - stood) < 1) throw new Error('The plumb line did not follow the mouse.');
  return (after - before) / MOVES;
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
    args: ['--no-sandbox', '--disable-background-networking', '--disable-quic'],
  });
  const page = await browser.newPage({ baseURL: product.address, viewport: { width: 1440, height: 1400 } });
  await page.goto('/sign-in');
  await page.getByLabel('E-mail').fill(product.email);
  await page.getByLabel('Password', { exact: true }).fill(product.password);
  await page.getByRole('button', { name: 'Sign in' }).click();
  await page.waitForURL(/\/w\//);
  await page.goto(`/w/${product.workshopId}/p/${production.id}/sets/${set.id}/stick?d=seat-and-tables`);
  await page.getByText('Who these people are').waitFor({ timeout: 120_000 });
  const devtools = await page.context().newCDPSession(page);
  await devtools.send('Performance.enable');
  await scriptTime(page, devtools);
  const value = await scriptTime(page, devtools);
  await browser.close();
  await product.close();
  return [{ name: 'stick-redraw-12', value, unit: 'ms', aim: 16, reference: null }];
}
