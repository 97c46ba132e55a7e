import { randomBytes } from 'node:crypto';
import type { Page } from 'playwright-core';
import { environment } from './browser.ts';

/** People of the demonstration workshop, by what they do there. */
export const DEMO = {
  owner: { name: 'Nell Abara', email: 'nell@ropewalk.example' },
  designer: { name: 'Joss Verity', email: 'joss@ropewalk.example' },
  carpenter: { name: 'Petra Olund', email: 'petra@ropewalk.example' },
  reviewer: { name: 'Hugo Mbeki-Stone', email: 'hugo@ropewalk.example' },
} as const;
const DEMO_PASSWORD = 'larch-junction';
const OWN_PASSWORD = 'oak-and-moquette';

/** Nothing that is made here meets what an earlier run made. */
export const unique = (word: string): string => `${word} ${randomBytes(3).toString('hex')}`;
const uniqueEmail = (word: string): string => `${word}-${randomBytes(4).toString('hex')}@settle.example`;

/** Signs a member of the demonstration workshop in and waits for the productions. */
export async function signIn(page: Page, email: string): Promise<void> {
  await page.goto('/sign-in');
  await page.getByLabel('E-mail').fill(email);
  await page.getByLabel('Password', { exact: true }).fill(DEMO_PASSWORD);
  await page.getByRole('button', { name: 'Sign in', exact: true }).click();
  await page.getByRole('heading', { name: 'Productions', level: 1 }).waitFor();
}

/** Starts a workshop of its own on the sign-up page and waits for its empty list. */
export async function signUp(page: Page, word: string): Promise<{ email: string; workshop: string }> {
  const account = { email: uniqueEmail(word), workshop: unique('Bench Yard') };
  await page.goto('/sign-up');
  await page.getByLabel('Your name').fill('Ida Marlowe-Finch');
  await page.getByLabel('Workshop').fill(account.workshop);
  await page.getByLabel('E-mail').fill(account.email);
  await page.getByLabel('Password', { exact: true }).fill(OWN_PASSWORD);
  await page.getByRole('button', { name: 'Start the workshop' }).click();
  await page.getByRole('heading', { name: 'Productions', level: 1 }).waitFor();
  return account;
}

/** Requests of one member, for what a story finds there when it begins. */
export interface Member {
  workshopId: string;
  get: <T>(path: string) => Promise<T>;
  post: <T>(path: string, body: unknown) => Promise<T>;
  put: <T>(path: string, body: unknown) => Promise<T>;
}

/** A session without a browser of somebody who signed up here. */
export const openOwner = (email: string): Promise<Member> => openMember(email, OWN_PASSWORD);

/** A session of a member of the demonstration workshop without a browser. */
export async function openMember(email: string, password = DEMO_PASSWORD): Promise<Member> {
  let token = '';
  async function request<T>(method: 'GET' | 'POST' | 'PUT', path: string, body?: unknown): Promise<T> {
    const response = await fetch(`${environment('PRODUCT_URL')}/api${path}`, {
      method,
      headers: {
        'Content-Type': 'application/json',
        ...(token === '' ? {} : { Authorization: `Bearer ${token}` }),
      },
      body: body === undefined ? undefined : JSON.stringify(body),
    });
    const text = await response.text();
    if (!response.ok) throw new Error(`${method} ${path} answered ${response.status}: ${text}`);
    return (text === '' ? undefined : JSON.parse(text)) as T;
  }
  const session = await request<{ accessToken: string; workshops: { id: string }[] }>(
    'POST',
    '/auth/sign-in',
    {
      email,
      password,
    },
  );
  token = session.accessToken;
  return {
    workshopId: session.workshops[0]?.id ?? '',
    get: (path) => request('GET', path),
    post: (path, body) => request('POST', path, body),
    put: (path, body) => request('PUT', path, body),
  };
}
