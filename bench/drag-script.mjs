// What the page's scripts cost for each frame while the end of a bench is pulled, and while the bench is carried, twelve
// people at table.
import { chromium } from 'playwright-core';
import { dragFrom } from './lib/drag.mjs';
import { openProduct } from './lib/product.mjs';
import { roomOfTwelve } from './lib/room-of-twelve.mjs';

const SITTERS = 12;
/** Bodies come one by one from a worker: nothing of that is to fall into the figures. */
const SETTLE_MS = 15_000;
const PAUSE_MS = 3000;

const middleOf = ({ x, y, width, height }) => ({ x: x + width / 2, y: y + height / 2 });

const grip = (page, name) =>
  page.getByRole('button', { name: new RegExp(`^Bench .*${name}.*arrows change it$`) });

const isBare = (page, { x, y }) =>
  page.evaluate(
    ([x, y]) => {
      const there = document.elementFromPoint(x, y);
      return !there?.closest('button') && !!there?.closest('[data-scene]');
    },
    [x, y],
  );

/** Takes hold of the selected bench on the plan, wherever it can be had beside its right end, and carries it. */
async function carry(page) {
  for (const asidePx of [-60, -110, -160]) {
    for (const downPx of [8, 16, 24, 32]) {
      const right = middleOf(await grip(page, 'length, right end').boundingBox());
      const spot = { x: right.x + asidePx, y: right.y + downPx };
      const carried = (await isBare(page, spot)) && (await dragFrom(page, spot));
      if (carried) return carried;
      // A press beside the bench has moved the sheet.
      await page.getByRole('button', { name: 'Fit the set into the sheet' }).click();
      await page.waitForTimeout(PAUSE_MS);
    }
  }
  throw new Error('The bench cannot be taken hold of.');
}

export async function run() {
  const product = await openProduct();
  const base = `/workshops/${product.workshopId}/productions`;
  const production = await product.call('POST', base, {
    name: 'In the hand',
    summary: '',
    units: 'feet-inches',
    roundTo: 8,
  });
  const document = roomOfTwelve();
  const set = await product.call('POST', `${base}/${production.id}/sets`, { name: 'Twelve', document });
  const browser = await chromium.launch({
    executablePath: '/usr/bin/chromium',
    args: [
      '--no-sandbox',
      '--enable-unsafe-swiftshader',
      '--disable-background-networking',
      '--disable-quic',
    ],
  });
  const page = await browser.newPage({ baseURL: product.address, viewport: { width: 1120, height: 640 } });
  await page.goto('/sign-in');
  await page.getByLabel('E-mail').fill(product.email);
  await page.getByLabel('Password', { exact: true }).fill(product.password);
  await page.getByRole('button', { name: 'Sign in' }).click();
  await page.waitForURL(/\/w\//);
  const bench = document.pieces.find(({ kind }) => kind === 'bench');
  await page.goto(`/w/${product.workshopId}/p/${production.id}/sets/${set.id}?piece=${bench.id}&view=D`);
  const scene = page.locator(`[data-scene-sitters="${SITTERS}"][data-scene-calls]`);
  await scene.waitFor({ state: 'attached', timeout: 60_000 });
  await page.waitForTimeout(SETTLE_MS);
  const end = grip(page, 'length, right end');
  await end.waitFor();
  const pulled = await dragFrom(page, middleOf(await end.boundingBox()));
  if (!pulled) throw new Error('The end of the bench cannot be pulled.');
  await page.waitForTimeout(PAUSE_MS);
  const carried = await carry(page);
  await browser.close();
  await product.close();
  return [
    { name: 'drag-script', value: pulled.frame, unit: 'ms a frame', aim: 8, reference: null },
    { name: 'drag-script-first', value: pulled.first, unit: 'ms', aim: null, reference: null },
    { name: 'drag-script-carry', value: carried.frame, unit: 'ms a frame', aim: 8, reference: null },
    { name: 'drag-script-carry-first', value: carried.first, unit: 'ms', aim: null, reference: null },
  ];
}
