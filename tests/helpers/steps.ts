import type { Page } from 'playwright-core';

/** By the form, as a person does. */
export async function signInByForm(page: Page, email: string, password: string): Promise<void> {
  await page.goto('/sign-in');
  await page.getByLabel('E-mail').fill(email);
  await page.getByLabel('Password', { exact: true }).fill(password);
  await page.getByRole('button', { name: 'Sign in' }).click();
  await page.waitForURL((url) => !url.pathname.startsWith('/sign-in'));
}

/**
 * As one who has signed in already, at `to`, or nowhere yet: the form is seen once by `signInByForm`, and costs seconds each
 * time.
 */
export async function signIn(
  page: Page,
  email: string,
  password: string,
  to: string | null = '/',
): Promise<void> {
  const answer = await page.request.post('/api/auth/sign-in', { data: { email, password } });
  if (!answer.ok()) throw new Error(`${email} was not signed in: ${answer.status()}`);
  if (to !== null) await page.goto(to);
}

/** To a place of the study by the rail or the phone's places, as a person would. */
export async function goTo(page: Page, place: string): Promise<void> {
  await page
    .getByRole('link', { name: new RegExp(`^${place}`) })
    .first()
    .click();
}
