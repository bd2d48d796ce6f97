import { execFile } from 'node:child_process';
import { promisify } from 'node:util';
import { expect, test } from '@playwright/test';
import { signInAs, signOut } from './people';
import { typeSizes, typeValue, untilSaved } from './type-size';

const run = promisify(execFile);

/*
 * The main job, end to end, by four hands. The tank: inside 900 × 500 × 300, flat floor for 100 mm,
 * then rising 60 over 800 mm; worked by hand: V = 0.05 h + h²/300 up to 60 mm, then 15 + 0.45 (h − 60)
 * litres, so 30 → 4.5, 60 → 15.0, 150 → 55.5, 300 → 123.0.
 */
test('a sloped water tank is modelled, issued, printed, handed over and dipped', async ({
  page,
}) => {
  test.setTimeout(120_000);
  const name = `Fresh water ${Date.now()}`;

  await test.step('the designer models it on the bench', async () => {
    await signInAs(page, 'designer');
    const form = page.getByRole('form', { name: 'Add a tank' });
    await form.getByLabel('Fitted in').selectOption({ label: 'Service van 3' });
    await form.getByLabel('Name').fill(name);
    await form.getByLabel(/^Box with sloped floor/).check();
    await form.getByRole('button', { name: /Add the tank/ }).click();
    await page.waitForURL('**/bench');

    await typeSizes(page, 'body', { length: '900', width: '50 cm', height: '2*150' });
    await typeSizes(page, 'ramp', { length: '800', width: '500', height: '60' });
    const place = page.getByRole('group', { name: /^Place of ramp/ });
    await typeValue(place.getByLabel('at x'), '100');
    const block = page.getByRole('region', { name: 'Title block' });
    await typeValue(block.getByLabel('at x'), '50');
    await typeValue(block.getByLabel('y', { exact: true }), '250');
    await typeValue(page.getByLabel('depth on the stick'), '150');

    const read = page.getByTestId('read-row');
    await expect(read.getByRole('cell').nth(0)).toHaveText('150');
    await expect(read.getByRole('cell').nth(1)).toHaveText('55.5');
    await expect(page.getByTestId('answer')).toHaveText('55.5 L');
    await untilSaved(page);
  });

  const tankAddress = page.url().replace(/\/bench$/, '');

  await test.step('and issues revision A', async () => {
    await page.getByRole('button', { name: 'Issue A' }).click();
    const panel = page.getByRole('region', { name: 'Issue revision A' });
    await panel.getByLabel(/step of the table/).fill('10');
    await panel.getByRole('button', { name: 'Issue A' }).click();
    await expect(page.getByText('Revision A is issued.')).toBeVisible();
    await page.goto('/home');
    await signOut(page);
  });

  await test.step('the fitter prints its chart and hands it over', async () => {
    await signInAs(page, 'fitter');
    await page.goto(tankAddress);
    await expect(page.getByRole('heading', { level: 1 })).toContainText(name);
    const download = page.waitForEvent('download');
    await page.getByRole('link', { name: /chart/i }).first().click();
    const path = await (await download).path();
    const { stdout } = await run('pdftotext', ['-layout', path, '-']);
    for (const [depth, litres] of [
      ['30', '4.5'],
      ['60', '15.0'],
      ['150', '55.5'],
      ['300', '123.0'],
    ]) {
      expect(stdout).toMatch(
        new RegExp(`(^|\\s)${depth}\\s+${litres!.replace('.', '\\.')}\\s`, 'm'),
      );
    }
    expect(stdout).toContain('Not for trade');

    const handOver = page.locator('#hand-over');
    await handOver.getByLabel(/owner/i).selectOption({ label: 'Callum Reyes' });
    await handOver.getByRole('button', { name: /Hand over/ }).click();
    await expect(handOver.getByText('Callum Reyes').last()).toBeVisible();
    await page.goto('/home');
    await signOut(page);
  });

  await test.step('the owner dips it, on a phone', async () => {
    await page.setViewportSize({ width: 360, height: 760 });
    await signInAs(page, 'owner');
    await page.getByRole('link', { name: new RegExp(name) }).click();
    await page.waitForURL('**/card');
    const field = page.getByRole('textbox').first();
    await field.fill('150');
    await expect(page.getByTestId('answer')).toContainText('55.5');
    await field.fill('301');
    await expect(page.getByText(/above the brim/)).toBeVisible();
    await field.fill('15 cm');
    await expect(page.getByTestId('answer')).toContainText('55.5');
    await page.getByRole('button', { name: 'Keep this reading' }).click();
    await expect(page.getByText(/Kept/).first()).toBeVisible();
  });
});
