import { ARRANGEMENTS } from '@settlewright/geometry';
import type { Browser, Page } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { openOwner, signUp } from './account.ts';
import { expectAccessible, openBrowser, openVisitor, PHONE, sidewaysPx } from './browser.ts';
import { startProduction } from './productions.ts';
import { choose, openRoomOf, untilSaved } from './room.ts';

const marks = (page: Page): Promise<string[]> =>
  page.locator('[data-piece]').evaluateAll((rows) => rows.map((row) => row.getAttribute('data-piece') ?? ''));

/** Chooses two pieces of the list together. */
async function chooseTwo(page: Page, one: string, other: string): Promise<void> {
  await page.locator(`[data-piece="${one}"]`).click();
  await page.locator(`[data-piece="${other}"]`).click({ modifiers: ['Shift'] });
  await page.getByRole('heading', { name: '2 pieces chosen' }).waitFor();
}

describe('pieces handled together', () => {
  let browser: Browser;
  let page: Page;
  let complaints: string[];
  let first: string;
  let second: string;

  beforeAll(async () => {
    browser = await openBrowser();
    ({ page, complaints } = await openVisitor(browser));
    const { email } = await signUp(page, 'together');
    const owner = await openOwner(email);
    const { at, home } = await startProduction(owner, 'Two Saloons');
    const build = ARRANGEMENTS.find(({ id }) => id === 'banquette')?.build;
    if (!build) throw new Error('The banquette is gone.');
    const make = async (name: string): Promise<string> =>
      `${home}/sets/${(await owner.post<{ id: string }>(`${at}/sets`, { name, document: build() })).id}`;
    first = await make('First saloon');
    second = await make('Second saloon');
  });
  afterAll(() => browser.close());

  it('are mirrored as one step, seen before it is taken, and brought back', async () => {
    await page.goto(first);
    await openRoomOf(page, 'First saloon');
    await chooseTwo(page, 'T1', 'L1');
    await page.getByRole('button', { name: 'Mirror', exact: true }).click();
    const form = page.getByRole('form', { name: 'Mirror T1 and L1' });
    await form.waitFor();
    await expectAccessible(page);
    await form.getByRole('button', { name: 'Mirror', exact: true }).press('Enter');
    await page.getByRole('button', { name: /^Undo Mirror T1 and L1 about their middle/ }).click();
    await page.getByRole('button', { name: /^Redo Mirror T1 and L1/ }).waitFor();
  });

  it('stand in a row on whole boards', async () => {
    const before = (await marks(page)).length;
    await chooseTwo(page, 'T2', 'L3');
    await page.getByRole('button', { name: 'Repeat in a row' }).click();
    const form = page.getByRole('form', { name: /^Repeat T2 and L3/ });
    await form.getByRole('textbox', { name: 'How many in all' }).fill('3');
    await form.getByRole('button', { name: /whole boards of W1/ }).click();
    await expectAccessible(page);
    await form.getByRole('button', { name: 'Set the row' }).click();
    await expect.poll(async () => (await marks(page)).length).toBe(before + 4);
    await page.getByRole('button', { name: /^Undo Row of 3 of T2 and L3/ }).click();
    await expect.poll(async () => (await marks(page)).length).toBe(before);
  });

  it('are hidden from the drawing, and still measured', async () => {
    await chooseTwo(page, 'T1', 'L1');
    await page.getByRole('button', { name: 'Hide', exact: true }).click();
    await page.getByText('2 pieces hidden, still measured: T1 and L1.').waitFor();
    await expectAccessible(page);
    await page.getByRole('button', { name: 'Show them' }).click();
    await page.locator('[data-hidden-note]').waitFor({ state: 'detached' });
  });

  it('are locked, and then neither moved nor taken out by the keys', async () => {
    await choose(page, 'T2');
    await page.getByRole('button', { name: 'More of T2, menu' }).click();
    await page.getByRole('menuitem', { name: /^Lock/ }).click();
    await page.locator('[data-scene]').focus();
    await page.keyboard.press('Delete');
    await page.getByText('T2 is locked; unlock it to change it.').first().waitFor();
    expect(await marks(page)).toContain('T2');
  });

  it('are copied by the keys and pasted into another set, with new marks', async () => {
    await chooseTwo(page, 'T1', 'L1');
    await page.locator('[data-scene]').focus();
    await page.keyboard.press('Control+c');
    await page.getByText('T1 and L1 copied. Paste here or in another set.').waitFor();
    await untilSaved(page);
    await page.goto(second);
    await openRoomOf(page, 'Second saloon');
    await page.getByRole('button', { name: 'Paste T1 and L1 from First saloon' }).waitFor();
    await page.locator('[data-scene]').focus();
    await page.keyboard.press('Control+v');
    await page.getByRole('button', { name: /^Undo Paste T1 and L1/ }).waitFor();
    expect(await marks(page)).toEqual(expect.arrayContaining(['T3', 'L5']));
    await expectAccessible(page);
    await untilSaved(page);
  });

  it('fit a phone', async () => {
    await page.setViewportSize(PHONE);
    await expect.poll(() => sidewaysPx(page)).toBeLessThanOrEqual(0);
    expect(complaints).toEqual([]);
  });
});
