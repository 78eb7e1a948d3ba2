import type { Page } from 'playwright-core';

export async function signIn(page: Page, email: string, password: string): Promise<void> {
  await page.goto('/sign-in');
  await page.getByLabel('E-mail').fill(email);
  await page.getByLabel('Password', { exact: true }).fill(password);
  await page.getByRole('button', { name: 'Sign in' }).click();
  await page.waitForURL((url) => !url.pathname.startsWith('/sign-in'));
}

/** To a place of the study by the rail or the phone's places, as a person would. */
export async function goTo(page: Page, place: string): Promise<void> {
  await page
    .getByRole('link', { name: new RegExp(`^${place}`) })
    .first()
    .click();
}
