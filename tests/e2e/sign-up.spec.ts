import { expect, test } from '@playwright/test';

/*
 * A stranger, from the front page to an issued revision in a workshop of their own. The hull: 600
 * wide at the top, 500 deep, 1200 long, so V = 0.00072 h² litres; here 560 wide, V = 0.000672 h².
 */
test('the hull of the front page comes along into a new workshop', async ({ page }) => {
  test.setTimeout(90_000);
  await page.goto('/');
  await expect(page.getByText('45.0').first()).toBeVisible();
  const width = page.getByLabel('Width at the top');
  await width.fill('560');
  await width.press('Tab');
  await expect(page.getByText('42.0').first()).toBeVisible();
  await page.getByText('Model your own').click();
  await page.waitForURL('**/sign-up*');

  const name = `Skerry Tanks ${Date.now()}`;
  await page.getByRole('textbox', { name: 'Workshop' }).fill(name);
  await page.getByLabel('Your name').fill('Ada Moor');
  await page.getByLabel('E-mail').fill(`ada.${Date.now()}@skerry.example`);
  await page.getByLabel('Password').fill('wet line and stick');
  await page.getByRole('button', { name: 'Open the workshop' }).click();
  await expect(page.getByText('Name the vehicle, boat or place.').first()).toBeVisible();
  await page.getByLabel('Boat that the tank is fitted in').fill('Gig Erne');
  await page.getByRole('button', { name: 'Open the workshop' }).click();

  await page.waitForURL('**/bench', { timeout: 30_000 });
  const block = page.getByRole('region', { name: 'Title block' });
  await expect(block.getByText(/^168\.0\s±\s.*\sL$/)).toBeVisible();
  await page.getByRole('button', { name: 'Issue A' }).click();
  await page
    .getByRole('region', { name: 'Issue revision A' })
    .getByRole('button', { name: 'Issue A' })
    .click();
  await expect(page.getByText('Revision A is issued.')).toBeVisible();

  await page.goto('/home');
  await expect(page.getByRole('heading', { level: 1, name })).toBeVisible();
  await expect(page.getByText('A issued')).toBeVisible();
});
