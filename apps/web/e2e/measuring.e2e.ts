import { readFile } from 'node:fs/promises';
import { createRequire } from 'node:module';
import { ARRANGEMENTS } from '@settlewright/geometry';
import type { Browser, Locator, Page } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { DEMO, openMember, signIn, unique } from './account.ts';
import { expectAccessible, openBrowser, openVisitor } from './browser.ts';
import { startProduction } from './productions.ts';
import { openRoomOf } from './room.ts';

interface Words {
  type: string;
  text?: string;
}

const DxfParser = createRequire(import.meta.url)('dxf-parser') as new () => {
  parseSync: (text: string) => { entities: Words[] };
};

describe('measuring and cutting', () => {
  const setName = unique('Parlour car');
  const document = ARRANGEMENTS.find((one) => one.id === 'facing-benches')!.build();
  const table = document.pieces.find((piece) => piece.kind === 'table')!;
  let browser: Browser;
  let page: Page;
  let complaints: string[];
  const measure = (): Locator => page.getByRole('region', { name: 'Measure', exact: true });
  const pinned = (): Locator => measure().getByRole('list', { name: 'Pinned dimension lines' });

  beforeAll(async () => {
    browser = await openBrowser();
    ({ page, complaints } = await openVisitor(browser));
    await signIn(page, DEMO.owner.email);
    const member = await openMember(DEMO.owner.email);
    const { at, home } = await startProduction(member, 'Measures');
    const { id } = await member.post<{ id: string }>(`${at}/sets`, { name: setName, document });
    await page.goto(`${home}/sets/${id}`);
    await openRoomOf(page, setName);
  });
  afterAll(() => browser.close());

  async function choosePoint(label: 'From' | 'To', point: string) {
    await measure()
      .getByRole('button', { name: new RegExp(`^${label}, piece`) })
      .click();
    await page.getByRole('option', { name: new RegExp(`^${table.mark} `) }).click();
    await measure()
      .getByRole('combobox', { name: `${label}, point` })
      .fill(point);
    await page.getByRole('option', { name: `${point} of ${table.mark} top` }).click();
  }

  it('say what lies between two points that are chosen by name', async () => {
    await measure().getByRole('button', { name: 'Measure by name' }).click();
    await choosePoint('From', 'front left upper corner');
    await choosePoint('To', 'back right upper corner');
    const diagonal = Math.round(Math.hypot(table.lengthMm, table.widthMm));
    await measure()
      .locator('[data-between]')
      .getByText(new RegExp(`\\(${diagonal}\\smm\\)`))
      .waitFor();
    await expectAccessible(page);
  });

  it('pin the tape, and take the pin back', async () => {
    await measure().getByRole('button', { name: 'Lay the tape' }).click();
    await measure().getByRole('button', { name: /^Pin / }).click();
    await pinned().getByRole('listitem').waitFor();
    await page.getByRole('button', { name: /^Undo/ }).click();
    await pinned().waitFor({ state: 'detached' });
    await page.getByRole('button', { name: /^Redo/ }).click();
    await pinned().getByRole('listitem').waitFor();
  });

  async function wordsOfPlan(): Promise<string[]> {
    await page.getByRole('button', { name: 'Save a drawing…' }).click();
    const dialog = page.getByRole('dialog', { name: 'Save a drawing' });
    await dialog.getByRole('button', { name: /^File/ }).click();
    await page.getByRole('option', { name: /DXF/ }).click();
    const arriving = page.waitForEvent('download');
    await dialog.getByRole('button', { name: 'Save', exact: true }).click();
    const text = await readFile(await (await arriving).path(), 'utf8');
    await dialog.getByText('Close', { exact: true }).click();
    await dialog.waitFor({ state: 'hidden' });
    return new DxfParser().parseSync(text).entities.flatMap(({ text: said }) => (said ? [said] : []));
  }

  it('bring the pinned line into the drawing', async () => {
    const withLine = await wordsOfPlan();
    await page.getByRole('button', { name: /^Undo/ }).click();
    await pinned().waitFor({ state: 'detached' });
    const without = await wordsOfPlan();
    const inches = Math.hypot(table.lengthMm, table.widthMm) / 25.4;
    const added = withLine.filter((words) => !without.includes(words));
    expect(added.join(' ')).toMatch(
      new RegExp(String.raw`\b${Math.floor(inches)}\b|\b${Math.floor(inches / 12)}′`),
    );
    await page.getByRole('button', { name: /^Redo/ }).click();
  });

  it('move a cut through the set by key, and type its place', async () => {
    await page.getByRole('switch', { name: 'Cut', exact: true }).click();
    const cut = page.getByRole('group', { name: 'Cut through the set' });
    const slider = cut.getByRole('slider', { name: 'Move the cut' });
    const at = async () => Number(await slider.inputValue());
    const start = await at();
    await slider.press('ArrowRight');
    expect((await at()) - start).toBeCloseTo(3.175, 2);
    await slider.press('Home');
    const first = await at();
    expect(first).toBeLessThan(start);
    await slider.press('PageUp');
    expect((await at()) - first).toBeCloseTo(304.8, 0);
    await cut.getByRole('button', { name: /^Cut/ }).click();
    await page.getByRole('option', { name: 'Level, from above' }).click();
    await cut.getByRole('textbox', { name: /^Height of the cut/ }).fill(`2' 6"`);
    await expect.poll(at).toBeCloseTo(762, 0);
    await expectAccessible(page);
  });

  it('keep the cut in a named view, and bring it back with it', async () => {
    const plan = page.getByRole('region', { name: 'Key plan' });
    const cut = page.getByRole('group', { name: 'Cut through the set' });
    await plan.getByRole('button', { name: 'Keep this view' }).click();
    const view = plan.getByRole('button', { name: /^From the / });
    await view.waitFor();
    await page.getByRole('switch', { name: 'Cut', exact: true }).click();
    await cut.waitFor({ state: 'detached' });
    await plan.getByRole('radio', { name: /^D/ }).click();
    await view.click();
    await cut.waitFor();
    expect(Number(await cut.getByRole('slider').inputValue())).toBeCloseTo(762, 0);
  });

  it('leave nothing in the console', () => {
    expect(complaints).toEqual([]);
  });
});
