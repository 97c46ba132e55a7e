import { ARRANGEMENTS, seatSitter, type SitterRef } from '@settlewright/geometry';
import type { Browser, Page } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { DEMO, openMember, signIn, unique } from './account.ts';
import { expectAccessible, openBrowser, openVisitor, PHONE, sidewaysPx } from './browser.ts';
import { demoProduction } from './productions.ts';
import { openRoomOf } from './room.ts';

const sitter = (percentile: number): SitterRef => ({
  kind: 'mannequin',
  bodyData: 'men',
  measure: 'stature',
  percentile,
});

describe('ways in', () => {
  let browser: Browser;
  let page: Page;
  let putAway: () => Promise<unknown>;
  let path: string;
  const name = unique('Ways');

  beforeAll(async () => {
    browser = await openBrowser();
    const designer = await openMember(DEMO.designer.email);
    const { at, home } = await demoProduction(designer);
    const sets = `${at}/sets`;
    const booth = ARRANGEMENTS.find(({ id }) => id === 'u-booth')?.build();
    if (!booth) throw new Error('The booth is gone.');
    const table = booth.pieces.map((piece) =>
      piece.kind === 'table' ? { ...piece, accessible: true } : piece,
    );
    const document = [
      ['b1', 1, 50],
      ['b2', 1, 95],
      ['b2', 2, 5],
    ].reduce(
      (set, [piece, place, percentile]) =>
        seatSitter(set, String(piece), Number(place), sitter(Number(percentile))),
      { ...booth, pieces: table },
    );
    const { id } = await designer.post<{ id: string }>(sets, { name, document });
    putAway = () => designer.post(`${sets}/${id}/archive`, {});
    path = `${home}/sets/${id}`;
    ({ page } = await openVisitor(browser));
    await signIn(page, DEMO.designer.email);
  });
  afterAll(async () => {
    await putAway();
    await browser.close();
  });

  it('are found by a worker, read in words, drawn in the scene, and fit a phone', async () => {
    await page.goto(path);
    await openRoomOf(page, name);
    await page.getByRole('button', { name: 'Show ways in' }).press('Enter');
    await page.getByText(/gets in/).waitFor();
    await page.locator('[data-way-in] path[d^="M"]').waitFor({ state: 'attached' });
    const order = page.getByRole('heading', { name: 'In which order to sit' }).locator('..');
    expect(await order.getByRole('listitem').first().innerText()).toContain('50th');
    await page.getByText(/^Toe space at T1/).waitFor();
    // Motion is unwelcome here: nothing offers to move.
    expect(await page.getByRole('button', { name: 'Walk the way' }).count()).toBe(0);
    await expectAccessible(page);

    await page.setViewportSize(PHONE);
    // The drawing takes its new size a frame later.
    await expect.poll(() => sidewaysPx(page)).toBeLessThanOrEqual(0);
  });
});
