import { readFile } from 'node:fs/promises';
import type { Browser, Page } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { DEMO, openMember, signIn } from './account.ts';
import { expectAccessible, openBrowser, openVisitor } from './browser.ts';
import { demoProduction } from './productions.ts';
import { openRoomOf } from './room.ts';

/** How each kind of file begins. */
const FILES = [
  { option: /PDF/, ending: 'pdf', begins: '%PDF' },
  { option: /SVG/, ending: 'svg', begins: '<svg' },
  { option: /DXF/, ending: 'dxf', begins: '0\nSECTION' },
  { option: /PNG/, ending: 'png', begins: '\u0089PNG' },
  { option: /glTF/, ending: 'glb', begins: 'glTF' },
] as const;

/** More than an empty canvas of one colour packs into. */
const DRAWN_BYTES = 20_000;

describe('drawings', () => {
  let browser: Browser;
  let page: Page;
  let complaints: string[];

  beforeAll(async () => {
    browser = await openBrowser();
    ({ page, complaints } = await openVisitor(browser));
    await signIn(page, DEMO.reviewer.email);
    const member = await openMember(DEMO.reviewer.email);
    const { at, home } = await demoProduction(member);
    const { items } = await member.get<{ items: { id: string; name: string }[] }>(`${at}/sets`);
    const set = items.find(({ name }) => name === 'Dining car');
    await page.goto(`${home}/sets/${set?.id}`);
    await openRoomOf(page, 'Dining car');
  });
  afterAll(() => browser.close());

  it('are shown before they are saved, and the dialog reads well', async () => {
    await page.getByRole('button', { name: 'Save a drawing…' }).click();
    const dialog = page.getByRole('dialog', { name: 'Save a drawing' });
    await dialog.getByRole('img', { name: /^Dining car: Plan\./ }).waitFor();
    await dialog.getByRole('switch', { name: 'Cut the set' }).click();
    await dialog.getByRole('img', { name: /^Dining car: Plan, cut 4′.0″ above the floor\./ }).waitFor();
    await expectAccessible(page);
  });

  it.each(FILES)('are saved as $ending', async ({ option, ending, begins }) => {
    const dialog = page.getByRole('dialog', { name: 'Save a drawing' });
    await dialog.getByRole('button', { name: /^File/ }).click();
    await page.getByRole('option', { name: option }).click();
    const arriving = page.waitForEvent('download');
    await dialog.getByRole('button', { name: 'Save', exact: true }).click();
    const download = await arriving;
    expect(download.suggestedFilename()).toMatch(new RegExp(`^dining-car.*\\.${ending}$`));
    const bytes = await readFile(await download.path());
    expect(bytes.toString('latin1').trimStart().startsWith(begins)).toBe(true);
    if (ending === 'png') expect(bytes.length).toBeGreaterThan(DRAWN_BYTES);
  });

  it('leave nothing in the console', () => {
    expect(complaints).toEqual([]);
  });
});
