import { ARRANGEMENTS } from '@settlewright/geometry';
import type { Browser, CDPSession, Page } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { openOwner, signUp } from './account.ts';
import { DESK, openBrowser, openVisitor } from './browser.ts';
import { startProduction } from './productions.ts';
import { choose, openRoomOf, seatAt } from './room.ts';

const SET = 'Reading saloon';
/** More than are kept to be undone, so that nothing is owed to their history. */
const FIRST_EDITS = 220;
const EDITS = 500;
/** So many up, so many down: what is measured is the set as it was. */
const WAY = 10;
const EDITS_A_FRAME = 20;
/** Now and then a rest, at the one or the other height, so that what waits for one is made as well. */
const EDITS_A_REST = 50;
const REST_MS = 300;
/** Nothing comes any more when so many looks find the same. */
const STILL_SAMPLES = 10;
const SAMPLE_MS = 200;
/** About nine in a hundred are code that the browser makes of scripts which run often; objects are the rest. */
const MOST_HEAP_GROWTH = 0.14;
/** Points and pixels, which are kept beside the objects. Skins of bodies are kept for a while, and by how often the hand rests more or fewer of them. */
const MOST_BACKING_GROWTH = 0.5;
/** Small, as the machine draws without a graphics card. */
const WINDOW = { width: 480, height: 360 };
const TIMEOUT_MS = 300_000;

/** Pulls the height of the seat up and down by the keyboard. */
const edit = (page: Page, times: number): Promise<void> =>
  page.evaluate(
    async ([times, way, aFrame, aRest, restMs]) => {
      const handle = document.querySelector<HTMLElement>('button[aria-label^="Bench B1 seat height,"]');
      if (!handle) throw new Error('The handle is not there.');
      handle.focus();
      for (let n = 0; n < times; n++) {
        const said = handle.ariaLabel;
        const key = Math.floor(n / way) % 2 === 0 ? 'ArrowUp' : 'ArrowDown';
        handle.dispatchEvent(new KeyboardEvent('keydown', { key, bubbles: true, cancelable: true }));
        // The page takes in one before the next.
        await Promise.resolve();
        if (handle.ariaLabel === said) throw new Error(`Edit ${n} changed nothing.`);
        if ((n + 1) % aFrame !== 0 && (n + 1) % aRest !== 0) continue;
        const waitMs = (n + 1) % aRest === 0 ? restMs : 0;
        await new Promise((done) => requestAnimationFrame(() => setTimeout(done, waitMs)));
      }
    },
    [times, WAY, EDITS_A_FRAME, EDITS_A_REST, REST_MS] as const,
  );

const geometriesOf = async (page: Page): Promise<number> =>
  Number(await page.locator('[data-scene]').getAttribute('data-scene-geometries'));

/** What is held once the skins of the bodies, which come from a worker, are there as well. */
async function held(page: Page, client: CDPSession) {
  let geometries = await geometriesOf(page);
  for (let still = 0; still < STILL_SAMPLES; still++) {
    await page.waitForTimeout(SAMPLE_MS);
    const now = await geometriesOf(page);
    if (now !== geometries) still = 0;
    geometries = now;
  }
  await client.send('HeapProfiler.collectGarbage');
  const { usedSize, backingStorageSize } = await client.send('Runtime.getHeapUsage');
  return { geometries, heapBytes: usedSize, backingBytes: backingStorageSize };
}

describe('a long day at one set', () => {
  let browser: Browser;
  let page: Page;
  let complaints: string[];

  beforeAll(async () => {
    browser = await openBrowser();
    ({ page, complaints } = await openVisitor(browser, DESK));
    const { email } = await signUp(page, 'reader');
    const owner = await openOwner(email);
    const { at, home } = await startProduction(owner, 'The Long Day');
    const document = ARRANGEMENTS.find(({ id }) => id === 'facing-benches')?.build();
    const set = await owner.post<{ id: string }>(`${at}/sets`, { name: SET, document });
    await page.goto(`${home}/sets/${set.id}`);
    await openRoomOf(page, SET);
    await seatAt(page, 'B1', { 1: 'Woman, 5th in stature', 2: 'Man, 95th in stature' });
    await choose(page, 'B1');
    await page.setViewportSize(WINDOW);
  });
  afterAll(() => browser.close());

  it(
    `takes no more memory after ${EDITS} edits than before them`,
    async () => {
      const client = await page.context().newCDPSession(page);
      await edit(page, FIRST_EDITS);
      const before = await held(page, client);
      await edit(page, EDITS);
      const after = await held(page, client);
      expect(before.geometries).toBeGreaterThan(0);
      expect(after.geometries).toBeLessThanOrEqual(before.geometries);
      expect(before.backingBytes).toBeGreaterThan(0);
      expect(after.backingBytes / before.backingBytes - 1).toBeLessThanOrEqual(MOST_BACKING_GROWTH);
      expect(after.heapBytes / before.heapBytes - 1).toBeLessThanOrEqual(MOST_HEAP_GROWTH);
      expect(complaints).toEqual([]);
    },
    TIMEOUT_MS,
  );
});
