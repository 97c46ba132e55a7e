import type { Browser, BrowserContext, Page } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { DEMO, openMember, signIn } from './account.ts';
import { expectAccessible, openBrowser, openVisitor } from './browser.ts';
import { startProduction } from './productions.ts';
import { choose, numberSaid, openRoomOf, setNumber, untilSaved } from './room.ts';

interface Hand {
  context: BrowserContext;
  page: Page;
  complaints: string[];
}

describe('two people at one set', () => {
  let browser: Browser;
  let nell: Hand;
  let joss: Hand;
  let room: string;

  beforeAll(async () => {
    browser = await openBrowser();
    const owner = await openMember(DEMO.owner.email);
    const { at, home } = await startProduction(owner, 'Two hands');
    const set = await owner.post<{ id: string }>(`${at}/sets`, {
      name: 'Night train',
      arrangement: 'facing-benches',
    });
    room = `${home}/sets/${set.id}`;
    const enter = async (email: string): Promise<Hand> => {
      const hand = await openVisitor(browser);
      await signIn(hand.page, email);
      await hand.page.goto(room);
      await openRoomOf(hand.page, 'Night train');
      return hand;
    };
    nell = await enter(DEMO.owner.email);
    joss = await enter(DEMO.designer.email);
  });
  afterAll(() => browser.close());

  it('lets the second choose between two values of one number', async () => {
    await choose(nell.page, 'B1');
    await setNumber(nell.page, 'Seat height', '17 1/2');
    await untilSaved(nell.page);

    await choose(joss.page, 'B1');
    await setNumber(joss.page, 'Seat height', '16 3/4');
    await joss.page.getByRole('heading', { name: 'Night train changed while you were working.' }).waitFor();
    const choice = joss.page.getByRole('radiogroup', { name: 'B1, seat height' });
    const theirs = choice.getByRole('radio', { name: 'Nell’s: 17½″' });
    const mine = choice.getByRole('radio', { name: 'Yours: 16¾″' });
    const save = joss.page.getByRole('button', { name: 'Save these choices' });
    expect(await theirs.isVisible()).toBe(true);
    expect(await save.isDisabled()).toBe(true);
    await expectAccessible(joss.page);

    await mine.click();
    await save.click();
    await openRoomOf(joss.page, 'Night train');
    await untilSaved(joss.page);
    expect(await numberSaid(joss.page, 'Seat height')).toContain('sixteen and three quarters inches');

    await nell.page.reload();
    await openRoomOf(nell.page, 'Night train');
    expect(await numberSaid(nell.page, 'Seat height')).toContain('sixteen and three quarters inches');
  });

  it('keeps what is changed without a line on this device and sends it when the line is back', async () => {
    await joss.context.setOffline(true);
    await setNumber(joss.page, 'Seat height', '17');
    await joss.page.getByText('kept on this computer', { exact: true }).waitFor();
    await joss.page.getByText('The server can’t be reached.').waitFor();

    await joss.context.setOffline(false);
    await untilSaved(joss.page);
    await joss.page.getByText('The server can’t be reached.').waitFor({ state: 'detached' });
    await nell.page.reload();
    await openRoomOf(nell.page, 'Night train');
    expect(await numberSaid(nell.page, 'Seat height')).toContain('seventeen inches');
    expect([...nell.complaints, ...joss.complaints]).toEqual([]);
  });
});
