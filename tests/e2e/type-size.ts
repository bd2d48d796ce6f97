import { expect, type Locator, type Page } from '@playwright/test';

/** Types a value into a field of the bench and takes it over with Tab. */
export async function typeValue(field: Locator, text: string): Promise<void> {
  await field.fill(text);
  await field.press('Tab');
}

/** Opens a solid of the parts list and types its sizes, by their labels. */
export async function typeSizes(
  page: Page,
  solid: string,
  sizes: Readonly<Record<string, string>>,
): Promise<void> {
  const opener = page.getByRole('button', { name: `${solid}: sizes, place and turn` });
  if ((await opener.getAttribute('aria-expanded')) !== 'true') await opener.click();
  const group = page.getByRole('group', { name: `Sizes of ${solid}` });
  for (const [label, text] of Object.entries(sizes)) {
    await typeValue(group.getByLabel(label, { exact: true }), text);
  }
}

/** Waits until the draft says that it is saved. */
export async function untilSaved(page: Page): Promise<void> {
  await expect(page.getByRole('status').filter({ hasText: /draft/ })).toContainText(
    / saved \d\d:\d\d/,
  );
}
