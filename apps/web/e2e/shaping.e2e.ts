import { ARRANGEMENTS } from '@settlewright/geometry';
import type { Browser, Locator, Page } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { openOwner, signUp } from './account.ts';
import { expectAccessible, openBrowser, openVisitor, PHONE } from './browser.ts';
import { startProduction } from './productions.ts';
import { choose, numberSaid, openRoomOf, untilSaved } from './room.ts';

const SET = 'Night saloon';

/** The handle of a number, by the end that is pulled. */
const handle = (page: Page, label: string, side = ''): Locator =>
  page.getByRole('button', { name: new RegExp(`^Bench B1 ${label}, ${side}.*arrows change it$`) });

/** Takes hold of the middle of a handle and goes a way on the sheet; the button stays down. */
async function pull(page: Page, held: Locator, byX: number, byY: number): Promise<void> {
  const box = await held.boundingBox();
  if (!box) throw new Error('the handle has no place on the sheet');
  const [x, y] = [box.x + box.width / 2, box.y + box.height / 2];
  await page.mouse.move(x, y);
  await page.mouse.down();
  await page.mouse.move(x + byX / 2, y + byY / 2);
  await page.mouse.move(x + byX, y + byY);
}

describe('shaping a piece by hand', () => {
  let browser: Browser;
  let page: Page;
  let complaints: string[];
  let room: string;

  beforeAll(async () => {
    browser = await openBrowser();
    ({ page, complaints } = await openVisitor(browser));
    const { email } = await signUp(page, 'shaper');
    const owner = await openOwner(email);
    const { at, home } = await startProduction(owner, 'The Night Line');
    const document = ARRANGEMENTS.find(({ id }) => id === 'facing-benches')?.build();
    const set = await owner.post<{ id: string }>(`${at}/sets`, { name: SET, document });
    room = `${home}/sets/${set.id}`;
    await page.goto(room);
    await openRoomOf(page, SET);
    await choose(page, 'B1');
  });
  afterAll(() => browser.close());

  it('pulls a handle, and says the number in both units meanwhile', async () => {
    const before = await numberSaid(page, 'Seat height');
    const seat = handle(page, 'seat height');
    await seat.waitFor();
    await pull(page, seat, 0, -30);
    const flag = page.locator('[data-handle-flag]:visible');
    await flag.waitFor();
    expect(await flag.textContent()).toMatch(/^Seat height .*″.*\smm/);
    await page.mouse.up();
    await page.getByRole('button', { name: /^Undo B1 seat height / }).waitFor();
    expect(await numberSaid(page, 'Seat height')).not.toBe(before);
    await page.getByRole('button', { name: /^Undo B1 seat height / }).click();
    await expect.poll(() => numberSaid(page, 'Seat height')).toBe(before);
  });

  it('takes a number typed while the handle is pulled', async () => {
    const before = await numberSaid(page, 'Seat height');
    await pull(page, handle(page, 'seat height'), 0, -30);
    await page.keyboard.type('16in');
    await page.mouse.up();
    await page.keyboard.press('Enter');
    await expect.poll(() => numberSaid(page, 'Seat height')).toBe('Seat height, sixteen inches, edit');
    await page.getByRole('button', { name: /^Undo B1 seat height .* to 16″/ }).click();
    await expect.poll(() => numberSaid(page, 'Seat height')).toBe(before);
  });

  it('refuses what cannot be read, and restores everything on Escape', async () => {
    const before = await numberSaid(page, 'Seat height');
    await pull(page, handle(page, 'seat height'), 0, -30);
    await page.keyboard.type('1x');
    await page.mouse.up();
    await page.keyboard.press('Enter');
    await page.getByRole('alert').filter({ hasText: '1x' }).waitFor();
    await expectAccessible(page);
    await page.keyboard.press('Escape');
    await expect.poll(() => numberSaid(page, 'Seat height')).toBe(before);
  });

  it('does the same with the keyboard alone', async () => {
    const seat = handle(page, 'seat height');
    await seat.focus();
    const before = await numberSaid(page, 'Seat height');
    await page.keyboard.press('Shift+ArrowUp');
    await expect.poll(() => numberSaid(page, 'Seat height')).not.toBe(before);
    await page.keyboard.press('Shift+ArrowDown');
    await expect.poll(() => numberSaid(page, 'Seat height')).toBe(before);
    await page.keyboard.type('17');
    await page.keyboard.press('Enter');
    await expect.poll(() => numberSaid(page, 'Seat height')).toBe('Seat height, seventeen inches, edit');
    await expectAccessible(page);
    await untilSaved(page);
  });

  it('is pulled with a finger on a phone while the page stays where it is', async () => {
    const phone = await browser.newContext({
      viewport: PHONE,
      hasTouch: true,
      isMobile: true,
      reducedMotion: 'reduce',
      storageState: await page.context().storageState(),
      baseURL: new URL(page.url()).origin,
    });
    const small = await phone.newPage();
    await small.goto(room);
    await openRoomOf(small, SET);
    await choose(small, 'B1');
    const seat = handle(small, 'seat height');
    await seat.scrollIntoViewIfNeeded();
    const box = await seat.boundingBox();
    if (!box) throw new Error('the handle has no place on the sheet');
    const scrolled = await small.evaluate(() => scrollY);
    const before = await numberSaid(small, 'Seat height');
    const touches = await phone.newCDPSession(small);
    const x = box.x + box.width / 2;
    const at = (y: number) => [{ x, y }];
    const y = box.y + box.height / 2;
    await touches.send('Input.dispatchTouchEvent', { type: 'touchStart', touchPoints: at(y) });
    for (const way of [8, 16, 24]) {
      await touches.send('Input.dispatchTouchEvent', { type: 'touchMove', touchPoints: at(y - way) });
    }
    await touches.send('Input.dispatchTouchEvent', { type: 'touchEnd', touchPoints: [] });
    await expect.poll(() => numberSaid(small, 'Seat height')).not.toBe(before);
    expect(await small.evaluate(() => scrollY)).toBe(scrolled);
    await phone.close();
    expect(complaints).toEqual([]);
  });
});
