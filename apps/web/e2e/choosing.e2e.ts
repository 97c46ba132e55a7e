import { ARRANGEMENTS, type SetDocument } from '@settlewright/geometry';
import type { Browser, Page } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { openOwner, signUp } from './account.ts';
import { expectAccessible, openBrowser, openVisitor } from './browser.ts';
import { startProduction } from './productions.ts';
import { openRoomOf, untilSaved } from './room.ts';

/** Eight people of whom an agency told the height and nothing else. */
const CAST = [
  ['Ada Quill', 'women', 1560],
  ['Berit Lunde', 'women', 1625],
  ['Cleo Marsh', 'women', 1690],
  ['Dorit Vane', 'mixed', 1700],
  ['Emil Stroud', 'mixed', 1760],
  ['Fergus Hale', 'men', 1745],
  ['Gideon Rook', 'men', 1810],
  ['Henrik Sol', 'men', 1905],
] as const;
const PLACES = 4;
/** What a tape finds, by measure; near the middle, so that any of the eight may have it. */
const TAKEN: Record<string, string> = {
  stature: '1700 mm',
  weight_kg: '72 kg',
  sitting_height: '890 mm',
  eye_height_sitting: '780 mm',
  acromial_height_sitting: '585 mm',
  elbow_rest_height: '238 mm',
  popliteal_height: '410 mm',
  knee_height_sitting: '535 mm',
  buttock_popliteal_length: '495 mm',
  buttock_knee_length: '605 mm',
  thigh_clearance: '174 mm',
  hip_breadth_sitting: '388 mm',
  bideltoid_breadth: '480 mm',
  forearm_forearm_breadth: '535 mm',
  abdominal_extension_depth_sitting: '242 mm',
};

/** Two long benches that face each other, everybody seated in the order of the cast. */
function longSaloon(ids: readonly string[]): SetDocument {
  const bay = ARRANGEMENTS.find(({ id }) => id === 'facing-benches')?.build();
  if (!bay) throw new Error('the arrangement of facing benches is gone');
  const benches = bay.pieces.filter(({ kind }) => kind === 'bench').map(({ id }) => id);
  return {
    ...bay,
    pieces: bay.pieces.map((piece) => {
      if (piece.kind === 'bench') {
        const at = { ...piece.at, zMm: 1200 };
        return { ...piece, at, lengthMm: 2400, places: { by: 'count', count: PLACES } };
      }
      return piece.kind === 'table' ? { ...piece, at: { ...piece.at, zMm: 1200 }, lengthMm: 2400 } : piece;
    }),
    seating: ids.map((castId, i) => ({
      pieceId: benches[Math.floor(i / PLACES)] ?? '',
      place: 1 + (i % PLACES),
      sitter: { kind: 'cast', castId },
    })),
  };
}

/** How many cells of the fit page are not known. */
async function notKnown(page: Page): Promise<number> {
  const words =
    (await page
      .getByRole('list')
      .filter({ hasText: /\d+ fit/ })
      .first()
      .textContent()) ?? '';
  return Number(/(\d+) not known/.exec(words)?.[1] ?? 0);
}

describe('choosing dimensions for people known by their height alone', () => {
  let browser: Browser;
  let page: Page;
  let complaints: string[];
  let room: string;

  beforeAll(async () => {
    browser = await openBrowser();
    ({ page, complaints } = await openVisitor(browser));
    const { email } = await signUp(page, 'chooser');
    const owner = await openOwner(email);
    const { at, home } = await startProduction(owner, 'The Long Crossing');
    const ids: string[] = [];
    for (const [name, bodyData, statureMm] of CAST) {
      const body = { name, bodyData, statureMm, statureSource: 'told' };
      ids.push((await owner.post<{ id: string }>(`${at}/cast`, body)).id);
    }
    const document = longSaloon(ids);
    const set = await owner.post<{ id: string }>(`${at}/sets`, { name: 'Long saloon', document });
    room = `${home}/sets/${set.id}`;
  });
  afterAll(() => browser.close());

  it('does not know several verdicts, and names the tape that would settle most', async () => {
    await page.goto(`${room}/fit`);
    await page.getByRole('heading', { name: 'Fit sheet', level: 1 }).waitFor();
    await page.getByRole('heading', { name: 'Measure next' }).waitFor();
    expect(await notKnown(page)).toBeGreaterThan(3);
    await page
      .getByRole('link', { name: /, enter it for / })
      .first()
      .waitFor();
  });

  it('settles verdicts once the suggested measurements are entered', async () => {
    const before = await notKnown(page);
    const link = page.getByRole('link', { name: /, enter it for / }).first();
    const measure =
      new URL((await link.getAttribute('href')) ?? '', page.url()).searchParams.get('field') ?? '';
    await link.click();
    const dialog = page.getByRole('dialog');
    await dialog.getByRole('button', { name: 'Save' }).waitFor();
    const field = dialog.locator('input:focus');
    await field.waitFor();
    await field.fill(TAKEN[measure] ?? '');
    await dialog.getByRole('button', { name: 'Save' }).click();
    await dialog.waitFor({ state: 'detached' });
    await page.goto(`${room}/fit`);
    await page.getByRole('heading', { name: 'Measure next' }).waitFor();
    await expect.poll(() => notKnown(page)).toBeLessThan(before);
  });

  it('issues revision A as it stands', async () => {
    await page.goto(room);
    await openRoomOf(page, 'Long saloon');
    await page.getByRole('button', { name: 'Issue revision A' }).click();
    const dialog = page.getByRole('dialog');
    await dialog.getByRole('button', { name: 'Issue revision A' }).click();
    await page.getByRole('article', { name: 'Revision A' }).waitFor();
  });

  it('shows on a story stick who fits where, by the keyboard too', async () => {
    await page.goto(`${room}/stick?d=seat-height`);
    const bob = page.getByRole('slider', { name: 'Seat height, pressed' });
    await bob.waitFor();
    await expect.poll(() => page.getByText(/in 100/).count()).toBeGreaterThan(0);
    const said = await bob.getAttribute('aria-valuetext');
    await bob.focus();
    await page.keyboard.press('ArrowLeft');
    expect(await bob.getAttribute('aria-valuetext')).not.toBe(said);
    await expectAccessible(page);
  });

  it('takes a value that was tried on the stick as one step', async () => {
    await page.goto(`${room}/stick?d=seat-height`);
    await page.getByRole('slider', { name: 'Seat height, pressed' }).focus();
    await page.keyboard.press('ArrowLeft');
    await page.getByRole('button', { name: /^Back to / }).waitFor();
    await page.getByRole('button', { name: /^Take / }).click();
    await page.getByRole('button', { name: /^Undo Seat height, pressed / }).waitFor();
    await untilSaved(page);
  });

  it('keeps a look knowingly, with its reason', async () => {
    await page.goto(`${room}/stick?d=seat-depth`);
    await page.getByLabel('Why it is kept').fill('As deep as in the photograph.');
    await page.getByRole('button', { name: /^Keep .* with this note$/ }).click();
    await untilSaved(page);
    await page.goto(room);
    await openRoomOf(page, 'Long saloon');
    await page.getByRole('button', { name: /known differences, open the list/ }).click();
    await page.getByRole('dialog').getByText('Because: As deep as in the photograph.').waitFor();
    await page.getByRole('dialog').getByRole('button', { name: 'Close' }).click();
  });

  it('takes a suggestion for everyone named', async () => {
    await page.goto(`${room}/suggest`);
    await page.getByRole('button', { name: 'Search' }).click();
    const best = page.getByRole('region', { name: 'Best found' });
    await best.waitFor();
    const take = best.getByRole('button', { name: /^Take it/ });
    await take.waitFor({ timeout: 90_000 });
    await expectAccessible(page);
    await take.click();
    await page.getByRole('button', { name: /^Undo Suggested: / }).waitFor();
    await untilSaved(page);
  });

  it('tells what share of the public fits, and who is lost', async () => {
    await page.goto(`${room}/crowd`);
    await page.getByText(/in 100 fit all checks at once/).waitFor({ timeout: 60_000 });
    expect(await page.getByText(/^Lost: /).count()).toBeGreaterThan(0);
    await expectAccessible(page);
  });

  it('compares the draft with revision A: who gains, who loses', async () => {
    await page.goto(`${room}/compare?from=A`);
    await page
      .getByRole('region', { name: 'What changed' })
      .getByRole('row', { name: /seat height/i })
      .first()
      .waitFor();
    const gains = page.getByRole('region', { name: 'Who gains' });
    expect(await gains.getByRole('heading', { level: 3 }).count()).toBeGreaterThan(0);
    await expectAccessible(page);
    expect(complaints).toEqual([]);
  });
});
