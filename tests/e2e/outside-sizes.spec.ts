import { expect, test } from '@playwright/test';
import { signInAs } from './people';
import { typeValue, untilSaved } from './type-size';

test('the bench asks inside or outside, and takes the wall off outside sizes', async ({ page }) => {
  await signInAs(page, 'designer');
  const form = page.getByRole('form', { name: 'Add a tank' });
  await form.getByLabel('Fitted in').selectOption({ label: 'Service van 3' });
  await form.getByLabel('Name').fill(`Outside sizes ${Date.now()}`);
  await form.getByLabel(/^Box with sloped floor/).check();
  await form.getByRole('button', { name: /Add the tank/ }).click();
  await page.waitForURL('**/bench');
  await expect(page.getByTestId('answer')).toBeVisible();

  const block = page.getByRole('region', { name: 'Title block' });
  const brim = block.getByText(/±\s.*\sL$/);
  // 1000 · 450 · 320 less the ramp's ½ · 850 · 70 · 450
  await expect(brim).toHaveText(/^13[01](\.\d)?\D/);
  await expect(block.getByText('Not told: sizes count as inside.')).toBeVisible();

  await block.getByLabel('Sizes are').selectOption('outside');
  await expect(block.getByText(/until then sizes count as inside/)).toBeVisible();
  await typeValue(block.getByLabel('wall'), '6');
  // 988 · 438 · 308 less what stands of the ramp inside the wall: ½ · 771.1 · 63.5 · 438
  await expect(brim).toHaveText(/^12[23](\.\d)?\D/);
  await untilSaved(page);
  await page.reload();
  await expect(brim).toHaveText(/^12[23](\.\d)?\D/);
  await expect(block.getByLabel('wall')).toHaveValue('6');

  await typeValue(block.getByLabel('wall'), '230');
  await expect(block.getByRole('alert')).toHaveText(/the wall leaves no space inside/);
});
