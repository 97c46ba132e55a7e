import { ARRANGEMENTS } from '@settlewright/geometry';
import type { Browser, Page } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { DEMO, openMember, signIn, unique } from './account.ts';
import { expectAccessible, openBrowser, openVisitor, PHONE, sidewaysPx } from './browser.ts';
import { demoProduction } from './productions.ts';

describe('what a set asks of its floor', () => {
  let browser: Browser;
  let page: Page;
  let complaints: string[];
  let putAway: () => Promise<unknown>;
  let fitPath: string;

  beforeAll(async () => {
    browser = await openBrowser();
    const designer = await openMember(DEMO.designer.email);
    const { at, home } = await demoProduction(designer);
    const sets = `${at}/sets`;
    const document = ARRANGEMENTS.find(({ id }) => id === 'facing-benches')?.build();
    const { id } = await designer.post<{ id: string }>(sets, { name: unique('Floor'), document });
    putAway = () => designer.post(`${sets}/${id}/archive`, {});
    fitPath = `${home}/sets/${id}/fit`;
    ({ page, complaints } = await openVisitor(browser));
    await signIn(page, DEMO.designer.email);
  });
  afterAll(async () => {
    await putAway();
    await browser.close();
  });

  const undo = () => page.getByRole('button', { name: /^Undo/ });
  const corner = (n: number) => page.getByLabel(`Corner ${n} across`, { exact: true });

  it('is said by rows and on the plan, one step of undo each, and read without a mouse', async () => {
    await page.goto(fitPath);
    await page.getByRole('button', { name: 'What this set asks' }).click();
    await page.getByRole('button', { name: 'From end to end of the plan' }).waitFor();
    await expectAccessible(page);
    await page.getByRole('button', { name: 'From end to end of the plan' }).click();
    await page.getByRole('button', { name: 'Mark a spot' }).click();
    await corner(2).waitFor();
    await expectAccessible(page);

    const plan = page.locator('[data-plan] svg');
    await plan.scrollIntoViewIfNeeded();
    const { width, height } = (await plan.boundingBox()) ?? { width: 0, height: 0 };
    await plan.click({ position: { x: width * 0.6, y: height * 0.9 } });
    await corner(3).waitFor();
    await corner(1).fill('12"');
    await corner(1).press('Tab');
    await expect.poll(() => undo().innerText()).toContain('Route corner 1 moved');
    await undo().click();
    await undo().click();
    await corner(3).waitFor({ state: 'detached' });

    await page.setViewportSize(PHONE);
    // The sheet of the room takes its new width with the next picture.
    await expect.poll(() => sidewaysPx(page)).toBeLessThanOrEqual(0);
    await expectAccessible(page);
    expect(complaints).toEqual([]);
  });
});
