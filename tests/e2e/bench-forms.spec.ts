import AxeBuilder from '@axe-core/playwright';
import { expect, test, type Locator, type Page } from '@playwright/test';
import { signInAs } from './people';
import { typeSizes, typeValue, untilSaved } from './type-size';

/* Shapes that are more than three sizes, made on the bench by typing alone. */

test('a lying cylinder with two elliptical ends, from an empty bench', async ({ page }) => {
  await bareTank(page, 'Two ends', 'cylinder');
  await typeSizes(page, 'cylinder', { diameter: '500', length: '1000' });
  for (const name of ['left end (low x)', 'right end (high x)']) {
    const end = page.getByRole('group', { name });
    await end.getByLabel(name).selectOption('elliptical');
    await expect(end.getByLabel('depth')).toHaveValue('125');
    await typeValue(end.getByLabel('depth'), '12.5 cm');
  }
  await expect(page.getByText(/tip to tip 1\s250\s*mm$/)).toBeVisible();
  await stickAt(page, '625', '250');
  // π·250²·1000 + 4/3·π·250²·125 mm³: the barrel and two halves of one spheroid
  await expect(brim(page)).toContainText('Brim 229.1 litres');
  await untilSaved(page);
  await page.reload();
  await expect(brim(page)).toContainText('Brim 229.1 litres');
  await expect(row(page, 'cylinder')).toContainText('⌀ 500 × 1000 along x, elliptical ends 125');
});

test('a V section pasted as columns, its points walked by keys', async ({ page }) => {
  await bareTank(page, 'V section', 'prism');
  await typeSizes(page, 'prism', { width: '1200' });
  const cell = (name: string) => page.getByLabel(`profile, ${name}`, { exact: true });
  await paste(cell('point 1, x'), '300\t0\n600\t500\n0\t500');
  await expect(page.getByRole('img', { name: 'Outline of prism: 3 points' })).toBeVisible();
  await stickAt(page, '300', '600');
  // half of 600 × 500 × 1200 mm³
  await expect(brim(page)).toContainText('Brim 180.0 litres');

  await cell('point 1, x').focus();
  await page.keyboard.press('ArrowDown');
  await expect(cell('point 2, x')).toBeFocused();
  await page.keyboard.press('Enter');
  await page.keyboard.press('Enter');
  await expect(cell('point 2, radius')).toBeFocused();
  await page.keyboard.type('900');
  await page.keyboard.press('Enter');
  await expect(cell('point 3, x')).toBeFocused();
  const fault = page.getByRole('row').filter({ hasText: /^radius: .*does not fit/ });
  await expect(fault).toBeVisible();
  await page.getByRole('button', { name: 'Undo' }).click();
  await expect(fault).toHaveCount(0);
  await expect(brim(page)).toContainText('Brim 180.0 litres');
});

test('one size has a ± of its own, which goes along when its solid is renamed', async ({
  page,
}) => {
  await bareTank(page, 'Own ±', 'box');
  await page.getByRole('button', { name: 'Give a size its own ±' }).click();
  const own = (solid: string) => page.getByRole('group', { name: `Own ± of sizes of ${solid}` });
  await typeValue(own('box').getByLabel('± height'), '0.5');
  await expect(page.getByText(/by tape, 1 with its own/)).toBeVisible();
  await typeValue(page.getByLabel('name', { exact: true }), 'day tank');
  await expect(own('day tank').getByLabel('± height')).toHaveValue('0.5');
  await untilSaved(page);
  await page.reload();
  await expect(page.getByText(/by tape, 1 with its own/)).toBeVisible();
});

test('at 360 px the list scrolls inside itself and the fields stay on the screen', async ({
  page,
}) => {
  await bareTank(page, 'Narrow', 'stations');
  await page.setViewportSize({ width: 360, height: 780 });
  await page.getByLabel('station 2, point 3, y', { exact: true }).focus();
  const wide = await page.evaluate(() => document.documentElement.scrollWidth);
  expect(wide).toBeLessThanOrEqual(360);
  for (const name of ['station 1, point 1, z', 'station 3, point 5, y']) {
    const box = (await page.getByLabel(name, { exact: true }).boundingBox())!;
    expect(box.x).toBeGreaterThanOrEqual(0);
    expect(box.x + box.width).toBeLessThanOrEqual(360);
  }
});

for (const kind of ['cylinder', 'stations']) {
  test(`the fields of a ${kind} have no violation that axe can find`, async ({ page }) => {
    await bareTank(page, `Axe ${kind}`, kind);
    if (kind === 'cylinder') {
      await page
        .getByRole('combobox', { name: 'left end (low x)' })
        .selectOption('dished (ball cap)');
    }
    await page.getByRole('button', { name: 'Give a size its own ±' }).click();
    for (const colorScheme of ['light', 'dark'] as const) {
      await page.emulateMedia({ colorScheme });
      const { violations } = await new AxeBuilder({ page })
        .withTags(['wcag2a', 'wcag2aa', 'wcag21a', 'wcag21aa', 'wcag22aa', 'best-practice'])
        .analyze();
      const said = violations.flatMap(({ id, nodes }) => nodes.map(({ html }) => `${id}: ${html}`));
      expect(said).toEqual([]);
    }
  });
}

/** A tank whose only solid is a new one of a kind: the box that a plain tank begins with is taken away. */
async function bareTank(page: Page, name: string, kind: string): Promise<void> {
  await signInAs(page, 'designer');
  const form = page.getByRole('form', { name: 'Add a tank' });
  await form.getByLabel('Fitted in').selectOption({ label: 'Service van 3' });
  await form.getByLabel('Name').fill(`${name} ${Date.now()}`);
  await form.getByLabel(/^Plain box/).check();
  await form.getByRole('button', { name: /Add the tank/ }).click();
  await page.waitForURL('**/bench');
  await expect(page.getByTestId('answer')).toBeVisible();
  const list = page.getByRole('region', { name: 'Parts list' });
  await list.getByRole('button', { name: kind, exact: true }).click();
  await list.getByRole('button', { name: /^body: sizes/ }).click();
  await list.getByRole('button', { name: 'Remove body' }).click();
  await list.getByRole('button', { name: new RegExp(`^${kind}: sizes`) }).click();
}

async function stickAt(page: Page, x: string, y: string): Promise<void> {
  const place = page.getByRole('group', { name: 'Place of the stick' });
  await typeValue(place.getByLabel('at x'), x);
  await typeValue(place.getByLabel('y', { exact: true }), y);
}

function brim(page: Page): Locator {
  return page.getByRole('status').filter({ hasText: /^Brim/ });
}

function row(page: Page, solid: string): Locator {
  return page
    .getByRole('row')
    .filter({ has: page.getByRole('button', { name: new RegExp(`^${solid}: sizes`) }) })
    .first();
}

/** Ctrl+V without the clipboard of the machine: the event that it makes. */
async function paste(cell: Locator, text: string): Promise<void> {
  await cell.focus();
  await cell.evaluate((input, pasted) => {
    const clipboardData = new DataTransfer();
    clipboardData.setData('text/plain', pasted);
    input.dispatchEvent(
      new ClipboardEvent('paste', { clipboardData, bubbles: true, cancelable: true }),
    );
  }, text);
}
