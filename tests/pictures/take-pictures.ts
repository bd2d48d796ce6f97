import { execFile } from 'node:child_process';
import { mkdtemp, rm, writeFile } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { fileURLToPath } from 'node:url';
import { promisify } from 'node:util';
import { expect, test } from '@playwright/test';
import { demoIds } from '../e2e/pages';
import { signInAs } from '../e2e/people';
import { typeValue } from '../e2e/type-size';

const run = promisify(execFile);
const folder = fileURLToPath(new URL('../../docs/pictures/', import.meta.url));

test.use({ deviceScaleFactor: 1.5 });

test('the bench', async ({ page }) => {
  await page.setViewportSize({ width: 1280, height: 860 });
  await signInAs(page, 'designer');
  const { hull } = await demoIds(page.request);
  await page.goto(`/tanks/${hull}/bench`);
  await expect(page.getByTestId('answer')).toBeVisible();
  await typeValue(page.getByLabel('depth on the stick'), '283');
  await drawn(page);
  await page.screenshot({ path: join(folder, 'bench.png') });
});

test('the tank card', async ({ page }) => {
  await page.setViewportSize({ width: 360, height: 760 });
  await signInAs(page, 'fitter');
  const { cistern } = await demoIds(page.request);
  await page.context().clearCookies();
  await signInAs(page, 'owner');
  await page.goto(`/tanks/${cistern}/card`);
  await page.getByRole('textbox').first().fill('150');
  await expect(page.getByText('55.5').first()).toBeVisible();
  await page.screenshot({ path: join(folder, 'card.png') });
});

test('the chart', async ({ page }) => {
  await signInAs(page, 'fitter');
  const { cistern } = await demoIds(page.request);
  const tank = (await (await page.request.get(`/api/v1/tanks/${cistern}`)).json()) as {
    revision: { id: string };
  };
  const chart = await page.request.get(
    `/api/v1/revisions/${tank.revision.id}/chart.pdf?paper=a4&length=mm&volume=l`,
  );
  const scratch = await mkdtemp(join(tmpdir(), 'dipwright-chart-'));
  try {
    const file = join(scratch, 'chart.pdf');
    await writeFile(file, await chart.body());
    const picture = join(folder, 'chart');
    await run('pdftoppm', ['-r', '90', '-png', '-f', '1', '-l', '1', '-singlefile', file, picture]);
  } finally {
    await rm(scratch, { recursive: true, force: true });
  }
});

/** Until the canvas of the bench holds something else than nothing. */
async function drawn(page: import('@playwright/test').Page): Promise<void> {
  const canvas = page.locator('canvas');
  await expect(canvas).toBeVisible();
  await expect
    .poll(async () => (await canvas.screenshot()).byteLength, { timeout: 30_000 })
    .toBeGreaterThan(20_000);
}
