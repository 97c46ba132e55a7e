import type { Browser, Page } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { DEMO, openMember, signIn } from './account.ts';
import { openBrowser, openVisitor } from './browser.ts';
import { startProduction } from './productions.ts';
import { choose, openRoomOf, sentence, toggleFit } from './room.ts';

/** Numbers nobody would meet by chance: each one, found anywhere, was taken from this person. */
const SITTER = {
  name: 'Sib Quarrington',
  role: 'The purser',
  bodyData: 'women',
  statureMm: 1637,
  statureSource: 'measured',
  weightKg: 63.4,
  measured: { popliteal_height: { mm: 417, takenBy: 'Nell Abara', takenOn: '2026-11-20' } },
  shoeMm: 25,
  clothing: 'light',
  notes: 'Sore left knee.',
};
const PRIVATE_JSON =
  /"(statureMm|statureSource|weightKg|measured|bodyData|notes|bodyLedger|why|probability)"\s*:|1637|63\.4|Sore left knee/;
/** Her height, weight and popliteal height as any page would write them. */
const PRIVATE_WORDS = /5′\s4|1637|63\.4|140\s?lb|139[.\d]*\s?lb|16⅜|417\s?mm|Sore left knee/;

describe('what carpenter and reviewer see and may do', () => {
  let browser: Browser;
  let home: string;
  let room: string;

  beforeAll(async () => {
    browser = await openBrowser();
    const owner = await openMember(DEMO.owner.email);
    const production = await startProduction(owner, 'Roles');
    const { at } = production;
    const person = await owner.post<{ id: string }>(`${at}/cast`, SITTER);
    const set = await owner.post<{
      id: string;
      draftNumber: number;
      document: { pieces: { id: string; mark: string }[] };
    }>(`${at}/sets`, { name: 'Purser’s office', arrangement: 'facing-benches' });
    const bench = set.document.pieces.find(({ mark }) => mark === 'B1');
    const draft = await owner.put<{ number: number }>(`${at}/sets/${set.id}/draft`, {
      baseNumber: set.draftNumber,
      document: {
        ...set.document,
        seating: [{ pieceId: bench?.id, place: 1, sitter: { kind: 'cast', castId: person.id } }],
      },
    });
    await owner.post(`${at}/sets/${set.id}/revisions`, { baseNumber: draft.number, note: 'For the floor.' });
    home = production.home;
    room = `${home}/sets/${set.id}`;
  });
  afterAll(() => browser.close());

  /** Signs in and keeps every answer of the server. */
  async function enter(email: string) {
    const visitor = await openVisitor(browser);
    const answers: Promise<string>[] = [];
    visitor.page.on('response', (response) => {
      const json = response.headers()['content-type']?.includes('json') ?? false;
      // An answer that the page left behind has no body any more.
      if (json && response.url().includes('/api/')) answers.push(response.text().catch(() => ''));
    });
    await signIn(visitor.page, email);
    return { ...visitor, answers };
  }

  async function expectNothingPrivate(page: Page, answers: Promise<string>[]): Promise<void> {
    await page.goto(home);
    await page.getByRole('rowheader', { name: SITTER.name }).waitFor();
    expect(await page.locator('body').innerText()).not.toMatch(PRIVATE_WORDS);

    await page.goto(`${home}/people`);
    await page.getByRole('rowheader', { name: SITTER.name }).waitFor();
    expect(await page.getByRole('columnheader').allTextContents()).toEqual(['Name', 'Part']);
    expect(await page.locator('body').innerText()).not.toMatch(PRIVATE_WORDS);
    expect(await page.getByRole('button', { name: /^(Edit|Add|More|All as a table)/ }).count()).toBe(0);

    await page.goto(`${room}/fit`);
    await page.getByRole('rowheader', { name: SITTER.name }).waitFor();
    const cell = page.getByRole('button', { name: new RegExp(`^${SITTER.name}, seat height, `) });
    expect(await cell.getAttribute('aria-label')).toMatch(/fits|tight|won’t fit|not known/);
    await cell.click();
    await page.getByText('Why.').first().waitFor();
    expect(await page.locator('main').innerText()).not.toMatch(PRIVATE_WORDS);
    expect(await page.locator('main').innerText()).not.toContain('The body');

    await page.goto(room);
    await openRoomOf(page, 'Purser’s office');
    await choose(page, 'B1');
    await toggleFit(page);
    await page.getByRole('rowheader', { name: SITTER.name }).waitFor();
    expect(await page.locator('body').innerText()).not.toMatch(PRIVATE_WORDS);
    await toggleFit(page);

    const received = (await Promise.all(answers)).join('\n');
    expect(received).toContain(SITTER.name);
    expect(PRIVATE_JSON.exec(received)?.[0]).toBeUndefined();
    // The body to be drawn comes in steps of 20 mm, too coarse to be somebody's measures.
    const drawn = [...received.matchAll(/"means":\{([^}]*)\}/g)].flatMap(([, means = '']) =>
      [...means.matchAll(/:([\d.]+)/g)].map(([, mm]) => Number(mm) % 20),
    );
    expect(drawn.length).toBeGreaterThan(0);
    expect(new Set(drawn)).toEqual(new Set([0]));
  }

  async function expectNoEditControls(page: Page): Promise<void> {
    expect(await sentence(page).getByRole('button').count()).toBe(0);
    const editing = /^(Undo|Redo|Add a piece|Seat people|More of|Issue revision|Add known)/;
    expect(await page.getByRole('button', { name: editing }).count()).toBe(0);
  }

  it('lets the carpenter tick off what is built and leave a mark, and nothing else', async () => {
    const { page, answers, complaints, context } = await enter(DEMO.carpenter.email);
    await expectNothingPrivate(page, answers);
    await expectNoEditControls(page);

    const parts = page.getByRole('button', { name: /^Parts of B1 built: 0 of / });
    await parts.click();
    await page.getByRole('checkbox').first().click();
    await page.getByRole('button', { name: /^Parts of B1 built: 1 of / }).waitFor();
    await page.getByLabel('A note on B1').fill('Left end scribed to the wall, 1/4 off.');
    await page.getByRole('button', { name: 'Leave the note' }).click();
    await page.getByRole('listitem').filter({ hasText: 'Left end scribed' }).waitFor();

    await page.reload();
    await openRoomOf(page, 'Purser’s office');
    await page.getByRole('button', { name: /^Parts of B1 built: 1 of / }).waitFor();
    await page.getByRole('listitem').filter({ hasText: 'Left end scribed' }).waitFor();
    await page.goto(`${room}/revisions`);
    await page.getByRole('article', { name: 'Revision A' }).waitFor();
    expect(await page.getByRole('button', { name: /^Approve/ }).count()).toBe(0);
    expect(complaints).toEqual([]);
    await context.close();
  });

  it('lets the reviewer comment and approve an issued revision, and nothing else', async () => {
    const { page, answers, complaints, context } = await enter(DEMO.reviewer.email);
    await expectNothingPrivate(page, answers);
    await expectNoEditControls(page);
    expect(await page.getByRole('button', { name: /^Parts of B1 built/ }).count()).toBe(0);

    await page.getByLabel('A note on B1').fill('The camera looks along this bench.');
    await page.getByRole('button', { name: 'Leave the note' }).click();
    await page.getByRole('listitem').filter({ hasText: 'The camera looks' }).waitFor();

    await page.goto(`${room}/revisions`);
    const revision = page.getByRole('article', { name: 'Revision A' });
    await revision.getByRole('button', { name: 'Changes wanted' }).click();
    await revision.getByText('Say what should change.').waitFor();
    await revision.getByLabel(/^Your word on it/).fill('Good from every seat.');
    await revision.getByRole('button', { name: 'Approve revision A' }).click();
    await revision.getByText('approved by Hugo Mbeki-Stone').waitFor();
    // The field that it was written in keeps it for a moment longer.
    await revision.locator('span').filter({ hasText: 'Good from every seat.' }).waitFor();

    const received = (await Promise.all(answers)).join('\n');
    expect(PRIVATE_JSON.exec(received)?.[0]).toBeUndefined();
    expect(complaints).toEqual([]);
    await context.close();
  });
});
