import type { Page } from 'playwright-core';
import type { DemoSignIn } from '@/docker-free-scripts/setup/product-database.mjs';

export function signInOf(signIns: readonly DemoSignIn[], role: string): DemoSignIn {
  const found = signIns.find((candidate) => candidate.role === role);
  if (found === undefined) throw new Error(`The demo has no ${role}.`);
  return found;
}

/** Signs in through the form and waits for the first page behind it. */
export async function signIn(page: Page, { email, password }: DemoSignIn): Promise<void> {
  await page.goto('/sign-in');
  await page.getByLabel('E-mail').fill(email);
  await page.getByLabel('Password').fill(password);
  await page.getByRole('button', { name: 'Sign in' }).click();
  await page.waitForURL(/\/plants\//);
}

/** A signed-in session's cookie header for plain requests, made through the same endpoints as the form. */
export async function sessionCookie(
  baseUrl: string,
  { email, password }: DemoSignIn,
): Promise<string> {
  const csrf = await fetch(`${baseUrl}/api/auth/csrf`);
  const { csrfToken } = (await csrf.json()) as { csrfToken: string };
  const answer = await fetch(`${baseUrl}/api/auth/callback/credentials`, {
    method: 'POST',
    redirect: 'manual',
    headers: {
      'content-type': 'application/x-www-form-urlencoded',
      cookie: cookiesOf(csrf),
    },
    body: new URLSearchParams({ csrfToken, email, password, json: 'true' }),
  });
  return `${cookiesOf(csrf)}; ${cookiesOf(answer)}`;
}

const cookiesOf = (response: Response): string =>
  response.headers
    .getSetCookie()
    .map((cookie) => cookie.split(';')[0] ?? '')
    .join('; ');
