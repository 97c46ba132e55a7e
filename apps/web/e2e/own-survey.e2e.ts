import type { Browser, Locator, Page } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { openOwner, signUp, unique } from './account.ts';
import { expectAccessible, openBrowser, openVisitor } from './browser.ts';
import { startProduction } from './productions.ts';

const PEOPLE = 120;
const HEADINGS = ['Person', 'Sex', 'Height', 'Weight', 'Seat to knee'];

/** Numbers that spread like bodies do, the same each time. */
function* spread(): Generator<number, never> {
  let state = 11;
  for (;;) {
    let sum = 0;
    for (let n = 0; n < 12; n += 1) {
      state = (state * 16807) % 2147483647;
      sum += state / 2147483647;
    }
    yield sum - 6;
  }
}

/** Invented people in inches and pounds, a quarter of an inch at a time; two rows have a slip. */
function survey(): string {
  const draws = spread();
  const next = () => draws.next().value;
  const rows = Array.from({ length: PEOPLE }, (_, n) => {
    const woman = n % 2 === 0;
    const size = next();
    const inches = (mm: number) => (mm / 25.4).toFixed(2);
    const kg = Math.exp(Math.log(woman ? 70 : 84) + 0.1 * size + 0.15 * next());
    return [
      `P${n + 1}`,
      woman ? 'F' : 'M',
      inches((woman ? 1628 : 1757) + 66 * size),
      (kg / 0.45359237).toFixed(1),
      inches((woman ? 478 : 498) + 20 * size + 14 * next()),
    ];
  });
  (rows[2] as string[])[2] = 'tall';
  (rows[6] as string[])[3] = '';
  return [HEADINGS, ...rows].map((cells) => cells.join(';')).join('\r\n');
}

describe('a survey of one’s own', () => {
  let browser: Browser;
  let page: Page;
  let complaints: string[];
  let room: string;
  const name = unique('The crew');
  const million = (): Locator => page.getByRole('region', { name: 'A million people' });

  beforeAll(async () => {
    browser = await openBrowser();
    ({ page, complaints } = await openVisitor(browser));
    const { email } = await signUp(page, 'surveyor');
    const owner = await openOwner(email);
    const { at, home } = await startProduction(owner, 'The Long Crossing');
    const set = await owner.post<{ id: string }>(`${at}/sets`, {
      name: 'Night train',
      arrangement: 'facing-benches',
    });
    room = `${home}/sets/${set.id}`;
  });
  afterAll(() => browser.close());

  it('is read from a file, its slips named by line, field and what is accepted', async () => {
    await page.goto(`${room}/crowd`);
    await page.getByRole('button', { name: 'Add your own survey' }).click();
    const dialog = page.getByRole('dialog', { name: 'Add your own survey' });
    await dialog.getByLabel('The table as a CSV file').setInputFiles({
      name: 'crew.csv',
      mimeType: 'text/csv',
      buffer: Buffer.from(`\ufeff${survey()}`),
    });
    await dialog.getByText(`58 women and 60 men can be read; 2 of ${PEOPLE} rows have a fault`).waitFor();
    const faults = dialog.getByRole('list', { name: 'Faults' });
    expect(await faults.getByRole('listitem').allTextContents()).toEqual([
      expect.stringMatching(/^Line 4, Height: “tall”; accepted: .* in\.$/),
      expect.stringMatching(/^Line 8, Weight: nothing there; accepted: .* lb\.$/),
    ]);
    await expectAccessible(page);
  });

  it('takes a column that a person points out, by the keyboard, and finds its unit', async () => {
    const dialog = page.getByRole('dialog', { name: 'Add your own survey' });
    const use = dialog.getByRole('button', { name: /^Seat to knee is, / });
    await use.focus();
    await page.keyboard.press('Space');
    await page.getByRole('listbox').waitFor();
    await page.keyboard.type('back to crook');
    await page.keyboard.press('Enter');
    await dialog.getByRole('button', { name: 'Seat to knee is, back to crook of knee' }).waitFor();
    await dialog.getByRole('button', { name: 'in, in' }).nth(1).waitFor();
    await dialog.getByLabel('Name', { exact: true }).fill(name);
    await dialog.getByLabel('Source').fill('Invented for this journey.');
    await dialog.getByRole('button', { name: 'Add these 118 people' }).click();
    await dialog.waitFor({ state: 'detached' });
  });

  it('says who of them fits, with its source', async () => {
    await page.getByText(/ in 100 fit all checks at once/).waitFor({ timeout: 60_000 });
    await page
      .getByRole('region', { name: 'About these people' })
      .getByText('Invented for this journey.')
      .first()
      .waitFor();
    await expectAccessible(page);
  });

  it('is counted a million times on the server, through a reload', async () => {
    await page.getByRole('button', { name: 'Count a million' }).click();
    await million().getByRole('progressbar').waitFor();
    await page.reload();
    await million().getByText('The set as it stands.').waitFor({ timeout: 90_000 });
    expect(await million().textContent()).toContain(`1,000,000 people: ${name}`);
  });

  it('says what stays before it is removed, and is told as removed afterwards', async () => {
    const address = page.url();
    await page.getByRole('button', { name: 'Your own surveys: 1' }).click();
    await page.getByRole('button', { name: `Remove ${name}` }).click();
    const dialog = page.getByRole('dialog', { name: `Remove ${name}?` });
    await dialog.getByText(/^Night train, .*: 1 count$/).waitFor();
    await expectAccessible(page);
    await dialog.getByRole('button', { name: 'Remove' }).click();
    await million().getByText('a survey that was removed since').waitFor({ timeout: 60_000 });
    await page.goto(address);
    await page.getByText(/^This survey was removed from the workshop\./).waitFor();
    expect(complaints).toEqual([]);
  });
});
