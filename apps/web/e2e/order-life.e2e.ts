import type { Browser, Page } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { DEMO, openMember, signIn, unique } from './account.ts';
import { expectAccessible, linkIn, mailTo, openBrowser, openVisitor, PHONE, sidewaysPx } from './browser.ts';
import { startProduction } from './productions.ts';

const FIRM = {
  name: unique('Bramble Covers'),
  contactName: 'Wim Bramble',
  email: `${unique('wim').replace(' ', '-')}@bramble.example`,
  accountId: 'acct_1Bramble',
};
const PIXEL = Buffer.from(
  'iVBORw0KGgoAAAANSUhEUgAAAAEAAAABCAIAAACQd1PeAAAADElEQVR4nGP4z8AAAAMBAQDJ/pLvAAAAAElFTkSuQmCC',
  'base64',
);

describe('a cushion order from the question to the inspection', () => {
  let browser: Browser;
  let shop: Page;
  let theirs: Page;
  let complaints: string[];
  let title: string;
  let orderAt: string;
  let asked: Record<'widthMm' | 'depthMm' | 'thicknessMm', number>;

  beforeAll(async () => {
    browser = await openBrowser();
    const member = await openMember(DEMO.owner.email);
    const { at, home } = await startProduction(member, 'The Slow Tram');
    const set = await member.post<{ id: string }>(`${at}/sets`, {
      name: 'Tram saloon',
      arrangement: 'facing-benches',
    });
    const sets = `${at}/sets/${set.id}`;
    for (const note of ['first', 'second']) {
      const { number } = await member.get<{ number: number }>(`${sets}/draft`);
      await member.post(`${sets}/revisions`, { baseNumber: number, note });
    }
    const upholsterer = await member.post<{ id: string }>(
      `/workshops/${member.workshopId}/upholsterers`,
      FIRM,
    );
    title = unique('Saloon seats');
    const order = await member.post<{ id: string; cushions: { finishedMm: typeof asked }[] }>(
      `${at}/orders`,
      {
        setId: set.id,
        revisionLetter: 'A',
        title,
        cushionMarks: ['C1'],
        spec: { cover: 'green cord', welt: 'self' },
      },
    );
    await member.post(`${at}/orders/${order.id}/send`, { upholstererId: upholsterer.id });
    asked = order.cushions[0]!.finishedMm;
    orderAt = `${home}/orders/${order.id}`;
    const mail = await mailTo(FIRM.email, new RegExp(title));
    ({ page: shop, complaints } = await openVisitor(browser));
    ({ page: theirs } = await openVisitor(browser, PHONE));
    await signIn(shop, DEMO.owner.email);
    await shop.goto(orderAt);
    await theirs.goto(linkIn(mail.text, /\/order\//));
    await theirs.getByRole('heading', { name: title }).waitFor();
  }, 120_000);
  afterAll(() => browser.close());

  const press = (page: Page, name: string | RegExp) => page.getByRole('button', { name }).click();

  it('takes a question and a photograph pinned to a cushion, on a phone', async () => {
    expect(await sidewaysPx(theirs)).toBeLessThanOrEqual(0);
    const questions = theirs.getByRole('region', { name: 'Questions' });
    await questions.getByRole('button', { name: /^About/ }).click();
    await theirs.getByRole('option', { name: 'Cushion C1' }).click();
    await questions.getByRole('button', { name: 'About, Cushion C1' }).waitFor();
    await questions.getByLabel('Question').fill('Which side does the camera see?');
    await questions.getByRole('button', { name: 'Ask' }).click();
    await questions.getByText('open', { exact: true }).waitFor();
    const files = theirs.getByRole('region', { name: 'Photographs and papers' });
    await files
      .getByLabel('Add a photograph or a PDF')
      .setInputFiles({ name: 'cloth.png', mimeType: 'image/png', buffer: PIXEL });
    await files.getByText('cloth.jpg').first().waitFor();
    await shop.reload();
    await shop.getByText('1 unanswered').waitFor();
    await shop.getByLabel('Answer', { exact: true }).fill('The window side.');
    await press(shop, 'Answer the question');
    await shop.getByText('answered', { exact: true }).waitFor();
  });

  it('takes a quote, and a deposit that is paid on the page of the provider', async () => {
    const price = theirs.getByRole('region', { name: 'Price' });
    await price.getByLabel('For').fill('Seat cushion, foam and labour');
    await price.getByLabel('Each').fill('465');
    await price.getByLabel('Good until').fill('2099-02-19');
    await price.getByLabel('Who quotes, typed').fill('Wim Bramble');
    await price.getByRole('button', { name: 'Send the quote' }).click();
    await price.getByText('Waits for the workshop.').waitFor();
    await shop.reload();
    await press(shop, 'Accept the quote');
    await shop.getByText(/^Accepted by/).waitFor();
    await press(shop, 'Pay a deposit');
    const dialog = shop.getByRole('dialog', { name: 'Pay a deposit' });
    expect(await dialog.getByLabel('Amount, USD').inputValue()).toBe('232.50');
    await dialog.getByRole('button', { name: 'Go to the payment page' }).click();
    await shop.getByText('$232.50').waitFor();
    await press(shop, 'Pay');
    await shop.getByRole('heading', { name: title }).waitFor();
    // The provider tells the server by itself; the page follows in its own time.
    await mailTo(FIRM.email, /a deposit was paid/);
    await shop.reload();
    await shop.getByText(/Deposit \$232\.50/).waitFor();
    expect(await shop.getByRole('region', { name: 'Deposit' }).textContent()).toContain(', paid');
    await expectAccessible(shop);
  });

  it('asks for a new word when a new revision is sent', async () => {
    await press(shop, 'Change the order');
    const change = shop.getByRole('dialog', { name: 'Change the order' });
    await change.getByLabel('Issued revision').fill('B');
    await change.getByLabel('Cover').fill('plum moquette');
    await change.getByRole('button', { name: 'Change the order' }).click();
    await shop.getByText(/was changed after it was sent/).waitFor();
    await press(shop, 'Send again');
    await shop
      .getByRole('dialog', { name: 'Send the order' })
      .getByRole('button', { name: 'Send the order' })
      .click();
    await shop.getByText(/was changed after it was sent/).waitFor({ state: 'detached' });
    await theirs.reload();
    await theirs.getByText('Revision B replaces revision A.').waitFor();
    const changed = theirs.getByRole('region', { name: 'What changed' });
    expect(await changed.getByRole('row', { name: /^Cover/ }).textContent()).toBe(
      'Covergreen cordplum moquette',
    );
    await expectAccessible(theirs);
  });

  it('is agreed once both have said so of the same revision', async () => {
    await theirs.getByRole('button', { name: 'Change my price' }).waitFor({ state: 'detached' });
    const price = theirs.getByRole('region', { name: 'Price' });
    await price.getByLabel('For').fill('Seat cushion, foam and labour');
    await price.getByLabel('Each').fill('480');
    await price.getByLabel('Good until').fill('2099-02-19');
    await price.getByRole('button', { name: 'Send the quote' }).click();
    await price.getByText('Waits for the workshop.').waitFor();
    await shop.reload();
    await press(shop, 'Accept the quote');
    await shop.getByText(/Waits for the upholsterer to say/).waitFor();
    await press(theirs, 'I can make this as drawn');
    await theirs.getByText(/can make revision B as drawn/).waitFor();
    await shop.reload();
    await shop.getByRole('img', { name: /^Agreed, step 4/ }).waitFor();
  });

  it('lets the batch wait for the first article, and is inspected when it arrives', async () => {
    const say = async (words: string) => {
      await theirs.getByLabel('Who says so, typed').fill('Wim Bramble');
      await press(theirs, words);
    };
    await theirs.reload();
    await say('The first article is ready');
    await theirs.getByText(/The batch waits for its word/).waitFor();
    const inspect = async (thing: string) => {
      await shop.reload();
      await press(shop, `Inspect the ${thing}`);
      const dialog = shop.getByRole('dialog', { name: `Inspect the ${thing}` });
      for (const [word, mm] of Object.entries(asked)) {
        const field = dialog.getByLabel(`C1, ${word.replace('Mm', '')}`);
        await field.fill(`${mm.toFixed(1)} mm`);
        await field.press('Tab');
      }
      await dialog.getByRole('button', { name: `Accept the ${thing}` }).click();
      await dialog.waitFor({ state: 'detached' });
    };
    await inspect('first article');
    await theirs.reload();
    await theirs.getByText(/accepted the first article: the batch can begin/).waitFor();
    await say('The batch is in work');
    await theirs.getByRole('button', { name: 'It is shipped' }).waitFor();
    await say('It is shipped');
    await theirs.getByRole('button', { name: 'It is shipped' }).waitFor({ state: 'detached' });
    await inspect('delivery');
    await shop.getByRole('img', { name: /^Received, step 8/ }).waitFor();
    await mailTo(FIRM.email, /the delivery is accepted/);
    await theirs.reload();
    await theirs.getByText(/Delivery of revision B/).waitFor();
    await expectAccessible(theirs);
    expect(await sidewaysPx(theirs)).toBeLessThanOrEqual(0);
    expect(complaints).toEqual([]);
  });
});
