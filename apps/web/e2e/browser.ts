import { AxeBuilder } from '@axe-core/playwright';
import { chromium, type Browser, type BrowserContext, type Page } from 'playwright-core';
import { expect } from 'vitest';

const ARGS = [
  '--no-sandbox',
  '--enable-unsafe-swiftshader',
  '--disable-quic',
  '--no-first-run',
  '--disable-background-networking',
  '--disable-component-update',
  '--disable-sync',
];

/** Warnings of the libraries that say nothing about the product. */
const KNOWN_WARNINGS = [/GPU stall due to ReadPixels/, /THREE\.Clock/, /PCFSoftShadowMap/];

export const DESK = { width: 1440, height: 900 };
export const PHONE = { width: 390, height: 844 };

export function environment(name: 'PRODUCT_URL' | 'MAIL_URL'): string {
  const value = process.env[name];
  if (value === undefined) throw new Error(`${name} is not set: run the journeys with npm test -- journeys.`);
  return value;
}

export const openBrowser = (): Promise<Browser> =>
  chromium.launch({ executablePath: '/usr/bin/chromium', headless: true, args: ARGS });

/** A visitor with an own context; what the console complains of is collected in `complaints`. */
export async function openVisitor(
  browser: Browser,
  viewport: { width: number; height: number } = DESK,
): Promise<{ context: BrowserContext; page: Page; complaints: string[] }> {
  const context = await browser.newContext({
    viewport,
    baseURL: environment('PRODUCT_URL'),
    reducedMotion: 'reduce',
    acceptDownloads: true,
  });
  context.setDefaultTimeout(15_000);
  const page = await context.newPage();
  const complaints: string[] = [];
  page.on('console', (message) => {
    const text = message.text();
    if (message.type() !== 'error' && message.type() !== 'warning') return;
    if (KNOWN_WARNINGS.some((known) => known.test(text))) return;
    // A refused request is told to the person; the browser's own line about it is no fault.
    if (/Failed to load resource/.test(text)) return;
    complaints.push(text);
  });
  page.on('pageerror', (error) => complaints.push(error.message));
  return { context, page, complaints };
}

/** How many pixels of the page stand beyond the right edge of the window; none is 0 or less. */
export const sidewaysPx = (page: Page): Promise<number> =>
  page.evaluate(() => document.documentElement.scrollWidth - innerWidth);

/** No serious or critical finding on the page as it stands. */
export async function expectAccessible(page: Page): Promise<void> {
  const { violations } = await new AxeBuilder({ page }).options({ resultTypes: ['violations'] }).analyze();
  const grave = violations
    .filter(({ impact }) => impact === 'serious' || impact === 'critical')
    .map(
      ({ id, nodes }) =>
        `${id}: ${nodes.map(({ html, failureSummary }) => `${html} ${failureSummary ?? ''}`).join(' | ')}`,
    );
  expect(grave).toEqual([]);
}

interface Mail {
  subject: string;
  to: string;
  text: string;
  attachments: { filename: string; contentType: string; size: number }[];
}

/** The newest mail to an address whose subject matches; waits for the outbox. */
export async function mailTo(address: string, subject: RegExp): Promise<Mail> {
  const deadline = Date.now() + 20_000;
  while (Date.now() < deadline) {
    const mails = (await (await fetch(`${environment('MAIL_URL')}mails.json`)).json()) as Mail[];
    const found = mails.find((mail) => mail.to.includes(address) && subject.test(mail.subject));
    if (found !== undefined) return found;
    await new Promise((resolve) => setTimeout(resolve, 200));
  }
  throw new Error(`No mail to ${address} with a subject like ${subject.source} came within 20 s.`);
}

/** First address in a text that leads to the product. */
export function linkIn(text: string, path: RegExp): string {
  const found = text.match(/https?:\/\/\S+/g)?.find((address) => path.test(address));
  if (found === undefined) throw new Error(`The text has no link like ${path.source}.`);
  return found;
}
