import type { Browser, Page } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { DEMO, openMember, signIn, signUp, unique, type Member } from './account.ts';
import { linkIn, mailTo, openBrowser, openVisitor } from './browser.ts';
import { startProduction } from './productions.ts';
import { choose, numberSaid, openRoomOf, sentence, toggleFit, typeNumber } from './room.ts';

const HOSTILE = '<img src=x onerror=document.title="taken">';

describe('input that should not be taken', () => {
  let browser: Browser;
  let page: Page;
  let complaints: string[];
  let owner: Member;
  let production: string;
  let home: string;

  beforeAll(async () => {
    browser = await openBrowser();
    owner = await openMember(DEMO.owner.email);
    ({ at: production, home } = await startProduction(owner, 'Odd things typed'));
    ({ page, complaints } = await openVisitor(browser));
    await signIn(page, DEMO.owner.email);
  });
  afterAll(() => browser.close());

  it('shows a name with HTML in it as text wherever it stands', async () => {
    await page.goto(`${home}/people?add=1`);
    const dialog = page.getByRole('dialog');
    await dialog.getByLabel('Name', { exact: true }).fill(HOSTILE);
    await dialog.getByLabel(/^Height/).fill('5\' 6"');
    await dialog.getByRole('button', { name: 'Add the person' }).click();
    await page.getByRole('rowheader', { name: HOSTILE }).waitFor();
    const { items } = await owner.get<{ items: { id: string }[] }>(`${production}/cast`);

    const set = await owner.post<{
      id: string;
      draftNumber: number;
      document: { pieces: { id: string; mark: string }[] };
    }>(`${production}/sets`, { name: 'Snug', arrangement: 'facing-benches' });
    const bench = set.document.pieces.find(({ mark }) => mark === 'B1');
    await owner.put(`${production}/sets/${set.id}/draft`, {
      baseNumber: set.draftNumber,
      document: {
        ...set.document,
        seating: [{ pieceId: bench?.id, place: 1, sitter: { kind: 'cast', castId: items[0]?.id } }],
      },
    });

    for (const address of [home, `${home}/people`, `${home}/sets/${set.id}`, `${home}/sets/${set.id}/fit`]) {
      await page.goto(address);
      await page.getByText('<img').first().waitFor();
      expect(await page.locator('img[src="x"]').count()).toBe(0);
    }
    await page.goto(`${home}/sets/${set.id}`);
    await openRoomOf(page, 'Snug');
    await toggleFit(page);
    await page.getByRole('rowheader', { name: HOSTILE }).waitFor();
    await toggleFit(page);
    expect(await page.locator('img[src="x"]').count()).toBe(0);
    expect(await page.title()).not.toBe('taken');
  });

  it.each([
    ['', /Nothing was typed/],
    ['NaN', /“NaN” is not a length/],
    ['-18', /below zero/],
    ['9e99', /not a length|longest/],
    ['40000', /longest length read|Highest possible is|Highest here is/],
    ['0', /Lowest possible is/],
    ['1/0', /can be read in more than one way|not a length/],
  ])('refuses a seat height of “%s” in words and keeps the old one', async (typed, words) => {
    await choose(page, 'B1');
    const before = await numberSaid(page, 'Seat height');
    const field = await typeNumber(page, 'Seat height', typed);
    await field.press('Enter');
    const slip = page.getByRole('alert').filter({ hasText: 'until you choose' });
    await slip.waitFor();
    expect(await slip.textContent()).toMatch(words);
    expect(await slip.textContent()).toContain('It stays at 18″');
    expect(await field.inputValue()).toBe(typed);
    expect(await field.getAttribute('aria-invalid')).toBe('true');
    await field.press('Escape');
    expect(await numberSaid(page, 'Seat height')).toBe(before);
  });

  it('offers both readings of “6 3” and takes the one that is pressed', async () => {
    await choose(page, 'B1');
    const before = await numberSaid(page, 'Length');
    const field = await typeNumber(page, 'Length', '6 3');
    await field.press('Enter');
    const slip = page.getByRole('alert').filter({ hasText: 'more than one way' });
    const offers = slip.getByRole('button');
    expect(await offers.allTextContents()).toEqual([
      expect.stringMatching(/^6′\s3″, 1905\smm$/),
      expect.stringMatching(/^5′\s3″, 1600\.2\smm$/),
    ]);
    await offers.first().click();
    await expect.poll(() => numberSaid(page, 'Length')).toContain('six feet three inches');
    await page.getByRole('button', { name: /^Undo B1 length/ }).click();
    await expect.poll(() => numberSaid(page, 'Length')).toBe(before);
    await sentence(page).waitFor();
  });

  it('says what is wrong with a table and loses nothing of it', async () => {
    await page.goto(`${home}/people`);
    await page.getByRole('button', { name: 'Add from a table' }).click();
    const dialog = page.getByRole('dialog');
    const box = dialog.getByLabel('The table, comma or semicolon separated');
    const read = dialog.getByRole('button', { name: 'See how it reads' });
    expect(await read.isDisabled()).toBe(true);
    const letter = 'Dear all,\nhere are the heights as promised.\nYours, Ada';
    await box.fill(letter);
    await read.click();
    await dialog.getByText('No column is called "name".').waitFor();
    expect(await box.inputValue()).toBe(letter);

    await box.fill('name,height\n');
    await read.click();
    await dialog.getByText('has no row under them').waitFor();
    await dialog.getByRole('button', { name: 'Change the table' }).click();
    expect(await box.inputValue()).toBe('name,height\n');

    const file = dialog.getByLabel('or a file');
    await file.setInputFiles({ name: 'cast.csv', mimeType: 'text/csv', buffer: Buffer.from('') });
    await dialog.getByText('“cast.csv” is empty.').waitFor();
    expect(await box.inputValue()).toBe('name,height\n');
  });

  it('shows another workshop’s pages as not there', async () => {
    const stranger = await openVisitor(browser);
    await signUp(stranger.page, 'stranger');
    for (const address of [home, `${home}/people`, `/w/${owner.workshopId}/workshop`]) {
      await stranger.page.goto(address);
      await stranger.page.getByRole('heading', { name: 'Nobody sits here' }).waitFor();
      expect(await stranger.page.locator('body').innerText()).not.toContain('Odd things');
    }
    expect(stranger.complaints).toEqual([]);
    await stranger.context.close();
  });

  it('says that a revoked link was revoked', async () => {
    const upholsterer = await owner.post<{ id: string }>(`/workshops/${owner.workshopId}/upholsterers`, {
      name: unique('Gimp & Piping'),
      contactName: 'Bea Sarn',
      email: `${unique('bea').replace(' ', '-')}@gimp.example`,
      telephone: '',
      notes: '',
    });
    const { items } = await owner.get<{ items: { id: string; draftNumber: number }[] }>(`${production}/sets`);
    const set = items[0];
    await owner.post(`${production}/sets/${set?.id}/revisions`, { baseNumber: set?.draftNumber, note: '' });
    const order = await owner.post<{ id: string }>(`${production}/orders`, {
      setId: set?.id,
      revisionLetter: 'A',
      title: 'Snug, cushions',
      neededBy: null,
    });
    await owner.post(`${production}/orders/${order.id}/send`, { upholstererId: upholsterer.id, message: '' });
    const { email } = await owner
      .get<{ items: { id: string; email: string }[] }>(`/workshops/${owner.workshopId}/upholsterers`)
      .then((book) => book.items.find(({ id }) => id === upholsterer.id) ?? { email: '' });
    const link = linkIn((await mailTo(email, /cushion order/i)).text, /\/order\//);

    const visitor = await openVisitor(browser);
    await visitor.page.goto(link);
    await visitor.page.getByRole('heading', { name: 'Snug, cushions' }).waitFor();
    await page.goto(`${home}/orders/${order.id}`);
    await page.getByRole('button', { name: 'Revoke the link' }).click();
    await page.getByText('The private link was revoked.').waitFor();
    await visitor.page.reload();
    await visitor.page.getByRole('heading', { name: 'This link was ended by the workshop' }).waitFor();
    expect(await visitor.page.locator('body').innerText()).not.toContain('Snug');
    expect([...complaints, ...visitor.complaints]).toEqual([]);
    await visitor.context.close();
  });
});
