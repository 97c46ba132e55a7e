import { execFileSync } from 'node:child_process';
import { readFile } from 'node:fs/promises';
import { createRequire } from 'node:module';
import { ARRANGEMENTS } from '@settlewright/geometry';
import type { Browser, Locator, Page } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { DEMO, openMember, signIn, unique } from './account.ts';
import { expectAccessible, openBrowser, openVisitor } from './browser.ts';
import { startProduction } from './productions.ts';
import { openRoomOf, untilSaved } from './room.ts';

const DxfParser = createRequire(import.meta.url)('dxf-parser') as new () => {
  parseSync: (text: string) => { entities: unknown[] };
};

describe('named views', () => {
  const setName = unique('Tea car');
  let browser: Browser;
  let page: Page;
  let complaints: string[];
  const plan = (): Locator => page.getByRole('region', { name: 'Key plan' });
  const scene = (): Locator => page.locator('[data-scene]');
  const focal = (): Locator => plan().getByRole('combobox', { name: 'Focal length, mm' });

  beforeAll(async () => {
    browser = await openBrowser();
    ({ page, complaints } = await openVisitor(browser));
    await signIn(page, DEMO.owner.email);
    const member = await openMember(DEMO.owner.email);
    const { at, home } = await startProduction(member, 'Views');
    const { id } = await member.post<{ id: string }>(`${at}/sets`, {
      name: setName,
      document: ARRANGEMENTS.find((one) => one.id === 'facing-benches')?.build(),
    });
    await page.goto(`${home}/sets/${id}`);
    await openRoomOf(page, setName);
  });
  afterAll(() => browser.close());

  it('look through a lens of a typed focal length', async () => {
    await plan().getByRole('button', { name: 'Add a lens' }).click();
    await focal().fill('50');
    await focal().press('Enter');
    await page.getByText(/^50 mm on 24\.9 × 18\.7, height 4′.0″/).waitFor();
    expect(await scene().getAttribute('data-scene')).toBe('lens');
    await page.locator('[data-lens-frame]').waitFor();
    expect(await plan().getByRole('status').textContent()).toMatch(/28\.0° across, 15\.3° up/);
    await expectAccessible(page);
  });

  it('take a new name, and give it back', async () => {
    const name = plan().getByRole('textbox', { name: 'Name of the view' });
    await name.fill('Two at the window');
    await name.press('Enter');
    await plan()
      .getByRole('button', { name: /^Two at the window/ })
      .waitFor();
    await page.getByRole('button', { name: /^Undo/ }).click();
    await plan().getByRole('button', { name: /^Lens/ }).waitFor();
    await page.getByRole('button', { name: /^Redo/ }).click();
    await plan()
      .getByRole('button', { name: /^Two at the window/ })
      .waitFor();
  });

  it('are where their address says after the page is loaded again', async () => {
    await untilSaved(page);
    await page.reload();
    await openRoomOf(page, setName);
    expect(await scene().getAttribute('data-scene')).toBe('lens');
    await plan()
      .getByRole('button', { name: /^Two at the window/ })
      .waitFor();
  });

  it('are placed and aimed on the plan with the keyboard', async () => {
    await plan().getByRole('button', { name: 'Show it on the plan' }).click();
    const handle = page.getByRole('button', { name: /^Lens on the plan/ });
    const across = plan().getByRole('textbox', { name: 'Across, from the middle to the right' });
    const drawn = await page.locator('[data-scene]').boundingBox();
    const spot = await handle.boundingBox();
    expect(spot!.y).toBeGreaterThan(drawn!.y + drawn!.height / 2);
    expect(spot!.y).toBeLessThan(drawn!.y + drawn!.height);
    const before = await across.inputValue();
    await handle.press('ArrowRight');
    await expect.poll(() => across.inputValue()).not.toBe(before);
    await page.getByRole('button', { name: /^Aim of the lens/ }).press('Shift+ArrowLeft');
    await expect.poll(() => plan().getByRole('textbox', { name: 'Turned left, °' }).inputValue()).toBe('8');
    await plan().getByRole('button', { name: 'Look through it' }).click();
  });

  it('keep how a lettered view stands', async () => {
    await plan().getByRole('radio', { name: /^E/ }).click();
    await page.getByRole('button', { name: 'Larger' }).click();
    await plan().getByRole('button', { name: 'Keep this view' }).click();
    await plan()
      .getByRole('button', { name: /^From the corner/ })
      .waitFor();
    expect(await scene().getAttribute('data-scene')).toBe('E');
  });

  async function saved(file: RegExp, view: RegExp | null): Promise<Buffer> {
    const dialog = page.getByRole('dialog', { name: 'Save a drawing' });
    await dialog.getByRole('button', { name: /^File/ }).click();
    await page.getByRole('option', { name: file }).click();
    if (view) {
      await dialog.getByRole('button', { name: /^Named view/ }).click();
      await page.getByRole('option', { name: view }).click();
    }
    const arriving = page.waitForEvent('download', { timeout: 60_000 });
    await dialog.getByRole('button', { name: 'Save', exact: true }).click();
    return readFile(await (await arriving).path());
  }

  it('are saved as a picture of the exact frame', async () => {
    await page.getByRole('button', { name: 'Save a drawing…' }).click();
    const png = await saved(/PNG/, /Two at the window/);
    expect([png.readUInt32BE(16), png.readUInt32BE(20)]).toEqual([1920, Math.round(1920 / 1.85)]);
    await expectAccessible(page);
  });

  it('are printed with the line of their lens, all on one paper', async () => {
    const pdf = await saved(/PDF/, /All named views/);
    const words = execFileSync('pdftotext', ['-layout', '-', '-'], { input: pdf }).toString();
    expect(words.replace(/\s+/gu, ' ')).toMatch(/50 mm on 24\.9 × 18\.7, height 4′ 0″/);
    expect(words).toContain('Two at the window');
    expect(words).toContain('From the corner');
    expect(words).toContain('Sheet 2 of 2');
  });

  it('leave the other files as they were', async () => {
    const dxf = await saved(/DXF/, null);
    expect(new DxfParser().parseSync(dxf.toString()).entities.length).toBeGreaterThan(10);
    const glb = await saved(/glTF/, null);
    const json = JSON.parse(glb.subarray(20, 20 + glb.readUInt32LE(12)).toString()) as { meshes: unknown[] };
    expect(json.meshes.length).toBeGreaterThan(0);
  });

  it('leave nothing in the console', () => {
    expect(complaints).toEqual([]);
  });
});
