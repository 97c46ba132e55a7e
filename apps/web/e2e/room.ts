import type { Locator, Page } from 'playwright-core';

/** Waits until the room of a set stands and its drawing was drawn. */
export async function openRoomOf(page: Page, name: string): Promise<void> {
  await page.getByRole('heading', { name, level: 1, exact: true }).waitFor();
  await page.locator('[data-scene-calls]').waitFor();
}

/** Selects a piece in the schedule, if it is not selected yet. */
export async function choose(page: Page, mark: string): Promise<void> {
  const row = page.locator(`[data-piece="${mark}"]`);
  if ((await row.getAttribute('aria-current')) === null) await row.click();
  await sentence(page).waitFor();
}

export const sentence = (page: Page): Locator => page.getByRole('group', { name: /in words$/ });

/** Seats people at the places of a piece. */
export async function seatAt(page: Page, mark: string, places: Record<number, string>): Promise<void> {
  await choose(page, mark);
  await page.getByRole('button', { name: 'Seat people' }).click();
  const dialog = page.getByRole('dialog', { name: `Who sits on ${mark}` });
  for (const [place, who] of Object.entries(places)) {
    const field = dialog.getByRole('combobox', { name: `Place ${place}` });
    await field.fill(who);
    await page.getByRole('option', { name: who }).click();
  }
  await dialog.getByRole('button', { name: 'Close' }).click();
  await dialog.waitFor({ state: 'hidden' });
}

/** Opens a number of the selected piece's sentence and types into it. */
export async function typeNumber(page: Page, label: string, text: string): Promise<Locator> {
  await sentence(page)
    .getByRole('button', { name: new RegExp(`^${label}, `) })
    .click();
  const field = sentence(page).getByRole('textbox', { name: label });
  await field.fill(text);
  return field;
}

/** Types a number into the sentence and takes it. */
export async function setNumber(page: Page, label: string, text: string): Promise<void> {
  const field = await typeNumber(page, label, text);
  await field.press('Enter');
  await field.waitFor({ state: 'detached' });
}

/** How the sentence says a number now. */
export const numberSaid = (page: Page, label: string): Promise<string | null> =>
  sentence(page)
    .getByRole('button', { name: new RegExp(`^${label}, `) })
    .getAttribute('aria-label');

export const drawer = (page: Page): Locator => page.getByRole('region', { name: 'Fit sheet' });

/** Opens or closes the drawer of the fit sheet. */
export async function toggleFit(page: Page): Promise<void> {
  const wasOpen = await drawer(page).isVisible();
  await page.getByRole('button', { name: /^Fit sheet/ }).click();
  await drawer(page).waitFor({ state: wasOpen ? 'detached' : 'visible' });
}

/** One cell of the sheet in the open drawer. */
export const fitCell = (page: Page, who: string, check: string): Locator =>
  drawer(page).getByRole('button', { name: new RegExp(`^${who}, ${check}, `) });

/** What a cell of the open drawer says. */
export const cellSays = (page: Page, who: string, check: string): Promise<string | null> =>
  fitCell(page, who, check).getAttribute('aria-label');

/** Waits until the title block says that the last change is on the server. */
export async function untilSaved(page: Page): Promise<void> {
  await page.getByText('just now', { exact: true }).waitFor();
}
