import { execFileSync } from 'node:child_process';
import type { Browser, Page } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { signUp, unique } from './account.ts';
import { linkIn, mailTo, openBrowser, openVisitor } from './browser.ts';
import {
  cellSays,
  choose,
  numberSaid,
  openRoomOf,
  seatAt,
  setNumber,
  toggleFit,
  typeNumber,
  untilSaved,
} from './room.ts';

const PRODUCTION = unique('The Late Ferry');
const TABLE = [
  'name,part,height,weight kg,shoe in,back of knee height mm',
  'Cora Winslade,the pilot,1562 mm,55,1,372',
  'Bruno Tallis,the mate,"6\' 1""",88,1,470',
  'Nobody Yet,a stowaway,ninety,,,',
].join('\n');
const UPHOLSTERER = {
  name: unique('Teasel Covers'),
  email: `${unique('wim').replace(' ', '-')}@teasel.example`,
};
const SITTERS = ['Cora', 'Winslade', 'Bruno', 'Tallis', 'Nobody', 'Woman, 5th'];

/** Every mark of a list in words: "C1 to C3, C5". */
const marksOf = (words: string): string[] =>
  words.split(', ').flatMap((part) => {
    const [, letter = '', from, to] = /^(\D+)(\d+) to \1(\d+)$/.exec(part) ?? [];
    if (from === undefined || to === undefined) return part === '' ? [] : [part];
    return Array.from({ length: Number(to) - Number(from) + 1 }, (_, n) => `${letter}${Number(from) + n}`);
  });

describe('a set from the first account to the upholsterer’s answer', () => {
  let browser: Browser;
  let page: Page;
  let complaints: string[];
  let email: string;
  let room: string;
  let orderAddress: string;
  let privateLink: string;

  beforeAll(async () => {
    browser = await openBrowser();
    ({ page, complaints } = await openVisitor(browser));
  });
  afterAll(() => browser.close());

  const say = (role: 'button' | 'link' | 'heading', name: string | RegExp) =>
    page.getByRole(role, typeof name === 'string' ? { name, exact: true } : { name });

  it('starts a workshop and confirms the address', async () => {
    ({ email } = await signUp(page, 'ida'));
    await page.getByText('The way to a first fit sheet').waitFor();
    const mail = await mailTo(email, /./);
    await page.goto(linkIn(mail.text, /\/confirm\//));
    await say('button', 'Confirm the address').click();
    await say('heading', 'Address confirmed').waitFor();
    await say('link', 'Go to the workshop').click();
  });

  it('starts a production from the first steps', async () => {
    await say('button', 'Start a production').click();
    await page.getByLabel('Name').fill(PRODUCTION);
    await page.getByLabel('In a sentence').fill('One-act play on a river boat');
    await say('button', 'Start the production').click();
    await say('heading', PRODUCTION).waitFor();
    await page.getByText('No sets yet').waitFor();
    await page.getByText('Nobody yet').waitFor();
  });

  it('takes the good rows of a pasted table and says what is wrong with the third', async () => {
    await page.getByRole('link', { name: 'Edit people' }).click();
    await say('heading', 'People').waitFor();
    await say('button', 'Add from a table').click();
    await page.getByLabel('The table, comma or semicolon separated').fill(TABLE);
    await say('button', 'See how it reads').click();
    await page.getByText('2 of 3 rows can be taken; 1 cannot, and is left out.').waitFor();
    const bad = page.getByRole('row', { name: /left out/ });
    expect(await bad.getByRole('rowheader').textContent()).toBe('4');
    expect(await bad.textContent()).toContain('ninety');
    await say('button', 'Add 2 people').click();
    await page.getByRole('rowheader', { name: /Cora Winslade/ }).waitFor();
    await page.getByRole('rowheader', { name: /Bruno Tallis/ }).waitFor();
    expect(await page.getByRole('rowheader').count()).toBe(2);
  });

  it('adds a set of facing benches', async () => {
    await page.getByRole('button', { name: /^Production: / }).click();
    await page.getByRole('menuitem', { name: 'Sets and orders' }).click();
    await say('button', 'Add a set').first().click();
    const dialog = page.getByRole('dialog');
    await dialog.getByLabel('Name').fill('Saloon');
    await dialog.getByRole('radio', { name: 'Facing benches' }).click();
    await dialog.getByRole('button', { name: 'Add the set' }).click();
    await openRoomOf(page, 'Saloon');
    room = page.url();
  });

  it('seats two people and a mannequin', async () => {
    await seatAt(page, 'B1', { 1: 'Cora Winslade', 2: 'Bruno Tallis' });
    await seatAt(page, 'B2', { 1: 'Woman, 5th in stature' });
    await untilSaved(page);
  });

  it('changes a verdict with the seat height, takes it back and does it again', async () => {
    const says = () => cellSays(page, 'Cora Winslade', 'seat height');
    await choose(page, 'B1');
    await toggleFit(page);
    const before = await says();
    expect(before).toMatch(/won’t fit/);
    await toggleFit(page);
    await setNumber(page, 'Seat height', '17 1/2');
    await toggleFit(page);
    const after = await says();
    expect(after).not.toBe(before);

    await page.getByRole('button', { name: /^Undo B1 seat height 18″ to 17/ }).click();
    await expect.poll(says).toBe(before);
    await page.getByRole('button', { name: /^Redo B1 seat height 18″ to 17/ }).click();
    await expect.poll(says).toBe(after);
    await untilSaved(page);

    await page.reload();
    await openRoomOf(page, 'Saloon');
    expect(await says()).toBe(after);
    await toggleFit(page);
    expect(await numberSaid(page, 'Seat height')).toContain('seventeen and one half inches');
    await page.getByText('Places 1 Cora, 2 Bruno').waitFor();
  });

  it('names the end of the room for a number, and lines two pieces up as one step', async () => {
    await choose(page, 'S1');
    await typeNumber(page, 'Length', '20 ft');
    await page.getByText(/^Longest here is .*\(then it meets B[12]\)/).waitFor();
    await page.keyboard.press('Tab');
    await page.keyboard.press('Enter');
    await page.getByRole('button', { name: /^Undo S1 length / }).click();

    await choose(page, 'B1');
    await page.locator('[data-piece="T1"]').click({ modifiers: ['Shift'] });
    await say('heading', '2 pieces chosen').waitFor();
    const lineUp = page.getByRole('group', { name: 'Line up' });
    await lineUp.getByRole('button', { name: 'Left', exact: true }).click();
    await page.getByRole('button', { name: /^Undo Line up 2 pieces on the left/ }).click();
    await page.getByRole('button', { name: /^Redo Line up 2 pieces on the left/ }).waitFor();
    await say('button', 'Let go of them').click();
    await untilSaved(page);
  });

  it('issues revision A', async () => {
    await say('button', 'Issue revision A').click();
    const dialog = page.getByRole('dialog');
    await dialog.getByLabel(/^What changed/).fill('Seats down half an inch.');
    await dialog.getByRole('button', { name: 'Issue revision A' }).click();
    const revision = page.getByRole('article', { name: 'Revision A' });
    await revision.waitFor();
    await revision.getByText('Seats down half an inch.').waitFor();
  });

  it('begins a cushion order from it and words it', async () => {
    await page.goto(room.replace(/\/sets\/.*$/, ''));
    await say('button', 'New order').click();
    await say('button', 'Begin the order').click();
    await say('heading', 'Saloon, cushions').waitFor();
    await say('button', 'Change the order').click();
    const dialog = page.getByRole('dialog');
    await dialog.getByLabel('Cover', { exact: true }).fill('Bottle-green corduroy, ribs front to back');
    await dialog.getByLabel('Notes, wear and ageing').fill('Rub the front edges down by hand.');
    await dialog.getByRole('button', { name: 'Change the order' }).click();
    await dialog.waitFor({ state: 'detached' });
    await page.getByText('Rub the front edges down by hand.').waitFor();
  });

  it('prints a drawing pack with sizes and marks, and nobody’s name', async () => {
    const [file] = await Promise.all([
      page.waitForEvent('download'),
      say('button', 'Drawing pack, PDF').click(),
    ]);
    // Page and paper part a number from its unit with spaces of different widths.
    const plain = (words: string) => words.replace(/[\s\u202f]+/gu, ' ');
    const text = plain(execFileSync('pdftotext', ['-layout', await file.path(), '-'], { encoding: 'utf8' }));
    const finished = (await page.getByText(/^Finished, seam to seam/).allTextContents()).map(plain);
    expect(finished.length).toBeGreaterThan(0);
    for (const line of finished) {
      const size = /\d+ × \d+ × \d+ mm/.exec(line)?.[0];
      expect(size).toBeDefined();
      expect(text).toContain(size);
    }
    const marks = /(\d+) cushions?, ([^.]*)\./.exec((await page.locator('main').textContent()) ?? '')?.[2];
    const each = marksOf(marks ?? '');
    expect(each.length).toBeGreaterThan(1);
    for (const mark of each) expect(text).toContain(mark);
    expect(text).toContain('Bottle-green corduroy');
    for (const name of SITTERS) expect(text).not.toContain(name);
  });

  it('sends the order to an upholsterer added on the way', async () => {
    await say('button', 'Send the order').click();
    const sending = page.getByRole('dialog', { name: 'Send the order' });
    await sending.getByRole('combobox', { name: 'To' }).fill(UPHOLSTERER.name);
    await page.getByRole('option', { name: /^Add / }).click();
    const adding = page.getByRole('dialog', { name: 'Add an upholsterer' });
    expect(await adding.getByLabel('Business').inputValue()).toBe(UPHOLSTERER.name);
    await adding.getByLabel('Contact').fill('Wim Osterley');
    await adding.getByLabel('E-mail').fill(UPHOLSTERER.email);
    await adding.getByRole('button', { name: 'Add to the address book' }).click();
    await sending.getByLabel(/^Message/).fill('Two seats and two backs. Is the corduroy in stock?');
    await sending.getByRole('button', { name: 'Send the order' }).click();
    await sending.waitFor({ state: 'detached' });
    orderAddress = page.url();

    const mail = await mailTo(UPHOLSTERER.email, /cushion order/i);
    expect(mail.attachments).toHaveLength(1);
    expect(mail.attachments[0]).toMatchObject({ contentType: 'application/pdf' });
    expect(mail.attachments[0]?.size).toBeGreaterThan(10_000);
    for (const name of SITTERS) expect(mail.text).not.toContain(name);
    privateLink = linkIn(mail.text, /\/order\//);
  });

  it('shows the upholsterer that order alone, and takes the answer', async () => {
    const upholsterer = await openVisitor(browser);
    const theirs = upholsterer.page;
    const received: string[] = [];
    theirs.on('response', (response) => {
      if (/\/api\//.test(response.url())) void response.text().then((text) => received.push(text));
    });
    await theirs.goto(privateLink);
    await theirs.getByRole('heading', { name: 'Saloon, cushions' }).waitFor();
    expect(await theirs.locator('body').innerText()).toContain('Bottle-green corduroy');
    expect(await theirs.getByRole('link').allTextContents()).toEqual([
      'Drawing pack, PDF',
      'Schedule (CSV)',
      'Outlines and panels (DXF)',
    ]);

    await theirs.getByRole('button', { name: 'I can make this as drawn' }).click();
    await theirs.getByText('No name was typed.').waitFor();
    await theirs.getByLabel('Your name, typed').fill('Wim Osterley');
    await theirs.getByRole('button', { name: 'I can make this as drawn' }).click();
    await theirs.getByText('Wim Osterley can make revision A as drawn').waitFor();
    await theirs.getByLabel('Ask or answer the workshop').fill('In stock. May the welt be a shade darker?');
    await theirs.getByRole('button', { name: 'Send to the workshop' }).click();
    await theirs.getByRole('listitem').filter({ hasText: 'a shade darker' }).waitFor();
    await expect.poll(() => theirs.getByLabel('Ask or answer the workshop').inputValue()).toBe('');
    expect(received.join(' ')).toContain('Bottle-green corduroy');
    for (const name of SITTERS) expect(received.join(' ')).not.toContain(name);

    // The link opens nothing else: the rest of the product asks who is there.
    await theirs.goto(orderAddress);
    await theirs.getByRole('heading', { name: 'Know who fits before the first cut.' }).waitFor();
    expect(upholsterer.complaints).toEqual([]);
    await upholsterer.context.close();
  });

  it('shows the workshop the acknowledgement and the answer', async () => {
    await mailTo(email, /can make it as drawn/);
    await page.goto(orderAddress);
    await page.getByText('Wim Osterley can make revision A as drawn').waitFor();
    await page.getByRole('listitem').filter({ hasText: 'a shade darker' }).waitFor();
    expect((await mailTo(email, /wrote/)).text).toContain('May the welt be a shade darker?');
    expect(complaints).toEqual([]);
  });
});
