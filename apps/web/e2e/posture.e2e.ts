import { ARRANGEMENTS, seatSitter, type SitterRef } from '@settlewright/geometry';
import type { Browser, Page } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { DEMO, openMember, signIn, unique } from './account.ts';
import { expectAccessible, openBrowser, openVisitor, PHONE, sidewaysPx } from './browser.ts';
import { demoProduction } from './productions.ts';
import { openRoomOf } from './room.ts';

const SITTER: SitterRef = { kind: 'mannequin', bodyData: 'men', measure: 'stature', percentile: 50 };

describe('how somebody sits', () => {
  let browser: Browser;
  let page: Page;
  let putAway: () => Promise<unknown>;
  let path: string;
  const name = unique('Posture');

  beforeAll(async () => {
    browser = await openBrowser();
    const designer = await openMember(DEMO.designer.email);
    const { at, home } = await demoProduction(designer);
    const bench = ARRANGEMENTS.find(({ id }) => id === 'bench-window')?.build();
    if (!bench) throw new Error('The arrangement is gone.');
    const document = seatSitter(bench, 'b1', 2, SITTER);
    const { id } = await designer.post<{ id: string }>(`${at}/sets`, { name, document });
    putAway = () => designer.post(`${at}/sets/${id}/archive`, {});
    path = `${home}/sets/${id}`;
    ({ page } = await openVisitor(browser));
    await signIn(page, DEMO.designer.email);
  });
  afterAll(async () => {
    await putAway();
    await browser.close();
  });

  const words = () => page.locator('[data-sitting]').innerText();
  async function chooseOf(label: string, words: RegExp) {
    await page.getByRole('button', { name: new RegExp(`^${label}, `) }).click();
    await page.getByRole('option', { name: words }).click();
  }

  it('is read in words, chosen, undone, and refused where it cannot be had', async () => {
    await page.goto(path);
    await openRoomOf(page, name);
    await page.getByRole('button', { name: 'Show sitting' }).press('Enter');
    await page.locator('[data-sitting]').waitFor();
    const before = await words();
    await chooseOf('Trunk', /^Upright/);
    await page.getByText(/^Measured in the standard posture; shown upright/).waitFor();
    expect(await words()).not.toBe(before);
    await page.getByRole('button', { name: /^Undo/ }).click();
    await expect.poll(words).toBe(before);
    // The window is on one side of the bench alone.
    await chooseOf('Arms', /forearm on the sill no sill in reach/);
    await page
      .getByText(/^Not chosen for .*no sill in reach/)
      .first()
      .waitFor();
    expect(await words()).toBe(before);
    await chooseOf('Arms', /^(Left|Right) forearm on the sill$/);
    await expect.poll(words).toMatch(/(left|right) forearm on the sill/);
    await page.getByRole('button', { name: /^Undo/ }).click();
    await expect.poll(words).toBe(before);
  });

  it('crosses knees where the table leaves room for it', async () => {
    const before = await words();
    await chooseOf('Feet', /^Knees crossed the table leaves no room/);
    await page
      .getByText(/^Not chosen for .*the table leaves no room/)
      .first()
      .waitFor();
    expect(await words()).toBe(before);
    await page.locator('[data-piece="T1"]').click();
    await page.locator('[data-scene][aria-label*="T1 selected"]').press('Delete');
    await page.locator('[data-piece="T1"]').waitFor({ state: 'detached' });
    await chooseOf('Feet', /^Knees crossed$/);
    await expect.poll(words).toMatch(/knees crossed/);
    for (let i = 0; i < 2; i++) await page.getByRole('button', { name: /^Undo/ }).click();
    await expect.poll(words).toBe(before);
  });

  it('comes with the room round each sitter, and fits a phone', async () => {
    const list = page.getByRole('heading', { name: 'Room round each sitter' }).locator('..');
    const gap = list.getByRole('button', { name: /between|overlap|touch/ }).first();
    await gap.focus();
    await page.locator('[data-gap-line][d^="M"]').waitFor({ state: 'attached' });
    await list.getByRole('switch', { name: 'What elbows and knees sweep' }).click();
    await page.locator('[data-envelope][d^="M"]').first().waitFor({ state: 'attached' });
    await expectAccessible(page);
    await page.setViewportSize(PHONE);
    await expect.poll(() => sidewaysPx(page)).toBeLessThanOrEqual(0);
  });
});
