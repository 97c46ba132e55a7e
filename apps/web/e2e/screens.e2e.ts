import type { Browser, Page } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { DEMO, openMember, signIn, signUp, unique } from './account.ts';
import {
  DESK,
  expectAccessible,
  linkIn,
  mailTo,
  openBrowser,
  openVisitor,
  PHONE,
  sidewaysPx,
} from './browser.ts';
import { demoProduction } from './productions.ts';
import { choose, drawer, openRoomOf, sentence, toggleFit } from './room.ts';

const MOST_CALLS = 60;
const MOST_TRIANGLES = 250_000;

interface DemoPlaces {
  workshop: string;
  production: string;
  room: string;
  order: string;
}

async function demoPlaces(): Promise<DemoPlaces> {
  const member = await openMember(DEMO.designer.email);
  const first = async (path: string, named: RegExp): Promise<string> => {
    const { items } = await member.get<{ items: { id: string; name?: string; title?: string }[] }>(path);
    const found = items.find(({ name, title }) => named.test(name ?? title ?? ''));
    if (found === undefined) throw new Error(`${path} lists nothing like ${named.source}.`);
    return found.id;
  };
  const { at, home: production } = await demoProduction(member);
  const setId = await first(`${at}/sets`, /^Dining car$/);
  const orderId = await first(`${at}/orders`, /cushions/i);
  return {
    workshop: `/w/${member.workshopId}`,
    production,
    room: `${production}/sets/${setId}`,
    order: `${production}/orders/${orderId}`,
  };
}

describe('every screen', () => {
  let browser: Browser;
  let page: Page;
  let guest: Page;
  let complaints: Record<'guest' | 'member', string[]>;
  let at: DemoPlaces;

  const heading = (name: string | RegExp) => page.getByRole('heading', { level: 1, name }).waitFor();
  const dialogNamed = (name: string) =>
    page.getByRole('dialog', { name }).getByRole('heading', { name }).waitFor();
  const settled = async (of = page) => {
    await of.waitForLoadState('networkidle');
    await of.evaluate(() => document.fonts.ready);
  };
  const expectNoSidewaysScroll = async (of = page) => {
    expect(await sidewaysPx(of), of.url()).toBeLessThanOrEqual(0);
  };
  const openRoom = async (search = '') => {
    await page.goto(`${at.room}${search}`);
    await openRoomOf(page, 'Dining car');
  };

  beforeAll(async () => {
    browser = await openBrowser();
    at = await demoPlaces();
    const visitor = await openVisitor(browser);
    const member = await openVisitor(browser);
    guest = visitor.page;
    page = member.page;
    complaints = { guest: visitor.complaints, member: member.complaints };
    await signIn(page, DEMO.designer.email);
  });
  afterAll(() => browser.close());

  it.each([
    ['/sign-in', 'Know who fits before the first cut.'],
    ['/sign-up', 'Start a workshop'],
    ['/reset', 'Choose a new password'],
    ['/reset/long-gone', /./],
    ['/confirm/long-gone', 'Is this your address?'],
    ['/invitation/long-gone', 'This invitation no longer opens'],
    ['/order/long-gone', /./],
  ])('%s can be used by everybody, also on a phone', async (address, name) => {
    await guest.goto(address);
    await guest.getByRole('heading', { level: 1, name }).waitFor();
    await settled(guest);
    await expectAccessible(guest);
    await guest.setViewportSize(PHONE);
    await expectNoSidewaysScroll(guest);
    await guest.setViewportSize(DESK);
  });

  it('an empty workshop shows the first step', async () => {
    const newcomer = await openVisitor(browser);
    await signUp(newcomer.page, 'newcomer');
    await newcomer.page.getByText('No productions yet').waitFor();
    await expectAccessible(newcomer.page);
    await newcomer.page.getByRole('button', { name: 'Start a production' }).click();
    await newcomer.page.getByRole('dialog').getByLabel('Name').waitFor();
    await expectAccessible(newcomer.page);
    expect(newcomer.complaints).toEqual([]);
    await newcomer.context.close();
  });

  it('the productions of a workshop', async () => {
    await page.getByRole('link', { name: /Supper at Larch Junction/ }).waitFor();
    await expectAccessible(page);
  });

  it.each<[string | RegExp, (at: DemoPlaces) => string]>([
    ['Ropewalk Scenic', ({ workshop }) => `${workshop}/workshop`],
    [/./, () => '/account'],
    ['Supper at Larch Junction', ({ production }) => production],
    ['People', ({ production }) => `${production}/people`],
    [/cushions/i, ({ order }) => order],
    ['Fit sheet', ({ room }) => `${room}/fit`],
    ['Seat height, pressed', ({ room }) => `${room}/stick?d=seat-height`],
    ['Revisions of Dining car', ({ room }) => `${room}/revisions`],
    ['Nobody sits here', () => '/nowhere'],
    ['Nobody sits here', () => '/w/00000000-0000-4000-8000-000000000000'],
  ])('the page headed %s', async (name, address) => {
    await page.goto(address(at));
    await heading(name);
    await settled();
    await expectAccessible(page);
  });

  it('the form of a person and of a set', async () => {
    await page.goto(`${at.production}/people`);
    await page.getByRole('button', { name: 'Edit Ottilie Brandt' }).click();
    await dialogNamed('Ottilie Brandt');
    await expectAccessible(page);
    await page.goto(`${at.production}/people?add=1`);
    await dialogNamed('Add a person');
    await page.goto(at.production);
    await page.getByRole('button', { name: 'Add a set' }).click();
    await dialogNamed('Add a set');
    await expectAccessible(page);
  });

  it('the room, its sentence, its drawer and a slip', async () => {
    await openRoom();
    await expectAccessible(page);
    await choose(page, 'B1');
    await sentence(page)
      .getByRole('button', { name: /^Seat height, / })
      .click();
    await sentence(page).getByRole('textbox', { name: 'Seat height' }).waitFor();
    await expectAccessible(page);
    await page.keyboard.press('Escape');
    await toggleFit(page);
    await drawer(page)
      .getByRole('button', { name: /^Marcus Adeyemi-Rowe, / })
      .first()
      .click();
    await drawer(page).getByText('Why.').waitFor();
    await expectAccessible(page);
    await toggleFit(page);
  });

  it('the story stick with its plumb line, the people behind a share, and a map', async () => {
    await page.goto(`${at.room}/stick?d=seat-height&d2=seat-depth`);
    await page.getByRole('slider', { name: 'Seat height, pressed' }).waitFor();
    await page.getByRole('button', { name: 'Who these people are' }).click();
    await page.getByRole('button', { name: 'The same as a table' }).click();
    await page.getByRole('region', { name: 'Best pairs of values' }).waitFor({ timeout: 60_000 });
    await expectAccessible(page);
  });

  it.each(['A', 'B', 'C', 'D', 'E'])('view %s is drawn within its means', async (letter) => {
    await openRoom(letter === 'A' ? '' : `?view=${letter}`);
    const scene = page.locator(`[data-scene="${letter}"]`);
    const number = async (name: string) => Number(await scene.getAttribute(`data-scene-${name}`));
    if (letter === 'A') expect(await number('sitters')).toBe(6);
    await expect.poll(() => number('triangles')).toBeGreaterThan(1000);
    expect(await number('triangles')).toBeLessThanOrEqual(MOST_TRIANGLES);
    expect(await number('calls')).toBeLessThanOrEqual(MOST_CALLS);
    if (letter !== 'A') await expectAccessible(page);
  });

  it('the room for a client shows no verdicts and changes nothing', async () => {
    await openRoom('?client=yes');
    await expectAccessible(page);
    expect(await page.getByRole('button', { name: /^Fit sheet/ }).count()).toBe(0);
    expect(await page.locator('main').innerText()).not.toMatch(/won’t fit|tight|not known/);
    expect(await page.getByRole('button', { name: /^(Issue revision|Add a piece|Undo)/ }).count()).toBe(0);
  });

  it('the upholsterer’s page', async () => {
    const owner = await openMember(DEMO.owner.email);
    const path = at.order.replace(/^\/w\//, '/workshops/').replace('/p/', '/productions/');
    const book = `/workshops/${owner.workshopId}/upholsterers`;
    const email = `${unique('ruth').replace(' ', '-')}@webbing.example`;
    const shop = {
      name: unique('Webbing & Hessian'),
      contactName: 'Ruth Pell',
      email,
      telephone: '',
      notes: '',
    };
    const { id } = await owner.post<{ id: string }>(book, shop);
    const known = await owner.get<{ setId: string; revisionLetter: string }>(path);
    const order = await owner.post<{ id: string }>(path.replace(/\/[^/]+$/, ''), {
      setId: known.setId,
      revisionLetter: known.revisionLetter,
      title: unique('Spare cushions'),
      neededBy: null,
    });
    const own = path.replace(/[^/]+$/, order.id);
    await owner.post(`${own}/send`, { upholstererId: id, message: 'One for spare.' });
    const link = linkIn((await mailTo(email, /cushion order/i)).text, /\/order\//);
    const visitor = await openVisitor(browser);
    await visitor.page.goto(link);
    await visitor.page.getByRole('heading', { name: /^Spare cushions/ }).waitFor();
    await expectAccessible(visitor.page);
    await visitor.page.setViewportSize(PHONE);
    await expectNoSidewaysScroll(visitor.page);
    expect(visitor.complaints).toEqual([]);
    await visitor.context.close();
  });

  it('the main pages on a phone', async () => {
    await page.setViewportSize(PHONE);
    for (const [address, name] of [
      [at.workshop, 'Productions'],
      [at.production, 'Supper at Larch Junction'],
      [`${at.production}/people`, 'People'],
      [`${at.workshop}/workshop`, 'Ropewalk Scenic'],
      [at.order, /cushions/i],
      [`${at.room}/fit`, 'Fit sheet'],
      [`${at.room}/stick?d=seat-height`, 'Seat height, pressed'],
      [`${at.room}/revisions`, 'Revisions of Dining car'],
      ['/account', /./],
    ] as const) {
      await page.goto(address);
      await heading(name);
      await settled();
      await expectNoSidewaysScroll();
    }
    await openRoom();
    await expectNoSidewaysScroll();
    await choose(page, 'B1');
    await expectNoSidewaysScroll();
    await toggleFit(page);
    await expectNoSidewaysScroll();
    await expectAccessible(page);
    await page.setViewportSize(DESK);
  });

  it('on the dark sheet', async () => {
    await page.goto(at.production);
    await page.getByRole('button', { name: /^Signed in: / }).click();
    await page.getByRole('menuitem', { name: 'Dark sheet' }).click();
    await settled();
    await expectAccessible(page);
    await page.goto(`${at.room}/fit`);
    await heading('Fit sheet');
    await expectAccessible(page);
    await openRoom();
    await choose(page, 'B1');
    await expectAccessible(page);
  });

  it('left nothing to complain of in the console', () => {
    expect(complaints).toEqual({ guest: [], member: [] });
  });
});
