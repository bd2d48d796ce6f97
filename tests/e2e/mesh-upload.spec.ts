import { expect, test, type Page } from '@playwright/test';
import { asBinaryStl, boxMesh } from '../geometry/mesh-import/mesh-files';
import { signInAs } from './people';
import { untilSaved } from './type-size';

/* A mesh from a file on the bench: asked for its unit, told its faults, then one more solid. */

test('a mesh is uploaded, in a unit that is asked, and stands in the tank', async ({
  page,
}, info) => {
  await newTank(page, 'Box with sloped floor');
  const brim = page.getByRole('region', { name: 'Title block' }).getByText(/±\s.*\sL$/);
  const before = await brim.textContent();
  await page.getByRole('button', { name: 'mesh from a file' }).click();
  const form = page.getByRole('form', { name: 'Add a mesh' });
  const add = form.getByRole('button', { name: 'Add the mesh' });

  await add.click();
  await expect(form.getByRole('alert')).toContainText('Choose an STL or OBJ file.');
  await expect(form.getByRole('alert')).toContainText('Choose the unit');

  const box = boxMesh([10, 10, 20], [3, 3, 3]);
  const send = (name: string, mesh: typeof box) =>
    form.getByLabel(/Closed mesh/).setInputFiles({
      name,
      mimeType: 'model/stl',
      buffer: Buffer.from(asBinaryStl(mesh)),
    });
  await send('open.stl', { ...box, triangles: box.triangles.slice(6) });
  await form.getByLabel('centimetre').check();
  await add.click();
  await expect(form.getByRole('alert')).toContainText(
    'The mesh is not closed: 1 hole, near x 8, y 8, z 3 (4 edges).',
  );
  await page.setViewportSize({ width: 1280, height: 900 });
  await form.scrollIntoViewIfNeeded();
  await page.screenshot({ path: info.outputPath('faults-1280.png') });
  await page.setViewportSize({ width: 360, height: 740 });
  await form.scrollIntoViewIfNeeded();
  await page.screenshot({ path: info.outputPath('faults-360.png') });
  const wide = await page.evaluate(() => document.documentElement.scrollWidth);
  expect(wide).toBeLessThanOrEqual(360);
  await page.setViewportSize({ width: 1280, height: 900 });

  await send('box.stl', box);
  await add.click();
  await expect(form).toHaveCount(0);
  const row = page
    .getByRole('row')
    .filter({ has: page.getByRole('button', { name: /^mesh.*: sizes/ }) });
  await expect(row).toContainText('100 × 100 × 200');
  await expect(brim).toHaveText(before!);
  await expect(page.getByRole('alert')).toHaveCount(0);

  // a body that stands inside what holds adds nothing; as it displaces, it takes 2 L
  await page.getByLabel('does', { exact: true }).selectOption('displaces');
  await expect(brim).not.toHaveText(before!);
  await page.screenshot({ path: info.outputPath('tank-1280.png') });

  // the draft keeps it, and the page fetches the mesh again
  await untilSaved(page);
  const after = await brim.textContent();
  await page.reload();
  await expect(brim).toHaveText(after!);
});

async function newTank(page: Page, startingPoint: string): Promise<void> {
  await signInAs(page, 'designer');
  const form = page.getByRole('form', { name: 'Add a tank' });
  await form.getByLabel('Fitted in').selectOption({ label: 'Service van 3' });
  await form.getByLabel('Name').fill(`${startingPoint} ${Date.now()}`);
  await form.getByLabel(new RegExp(`^${startingPoint}`)).check();
  await form.getByRole('button', { name: /Add the tank/ }).click();
  await page.waitForURL('**/bench');
  await expect(page.getByTestId('answer')).toBeVisible();
}
