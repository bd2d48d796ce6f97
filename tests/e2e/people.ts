import type { Page } from '@playwright/test';

/** The demo's people, as the seed makes them. */
export const password = 'true-litres-2026';
export type Person = 'manager' | 'designer' | 'fitter' | 'owner';

/** Signs in through the form, as a person does. */
export async function signInAs(page: Page, person: Person): Promise<void> {
  await page.goto('/sign-in');
  await page.getByLabel('E-mail').fill(`${person}@tarnside.example`);
  await page.getByLabel('Password').fill(password);
  await page.getByRole('button', { name: 'Sign in' }).click();
  await page.waitForURL('**/home');
}

export async function signOut(page: Page): Promise<void> {
  await page.getByRole('button', { name: 'Sign out' }).click();
  await page.waitForURL((url) => url.pathname === '/' || url.pathname === '/sign-in');
}
