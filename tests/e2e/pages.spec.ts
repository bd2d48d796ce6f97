import AxeBuilder from '@axe-core/playwright';
import { expect, test, type Page } from '@playwright/test';
import { signInAs, type Person } from './people';
import { demoIds, pages, type DemoIds } from './pages';

/*
 * Every page as it is met, light and dark, wide and at 360 px: no violation that axe can find
 * (WCAG 2.2 A and AA), no sideways scroll, nothing refused by the content security policy, no
 * request that fails, no error in the console.
 */
const sights = [
  { name: 'wide, light', width: 1280, height: 900, colorScheme: 'light' as const },
  { name: 'wide, dark', width: 1280, height: 900, colorScheme: 'dark' as const },
  { name: 'narrow, light', width: 360, height: 760, colorScheme: 'light' as const },
  { name: 'narrow, dark', width: 360, height: 760, colorScheme: 'dark' as const },
];

const people = [...new Set(pages.map(({ by }) => by))];

for (const person of people) {
  test(`pages of ${person ?? 'nobody'}`, async ({ page }) => {
    test.setTimeout(180_000);
    const ids = await idsOf(page, person);
    const faults = watch(page);
    for (const met of pages.filter(({ by }) => by === person)) {
      await test.step(met.what, async () => {
        await page.goto(met.address(ids));
        await settled(page);
        for (const sight of sights) {
          await page.emulateMedia({ colorScheme: sight.colorScheme, reducedMotion: 'reduce' });
          await page.setViewportSize({ width: sight.width, height: sight.height });
          const { violations } = await new AxeBuilder({ page })
            .withTags(['wcag2a', 'wcag2aa', 'wcag21a', 'wcag21aa', 'wcag22aa', 'best-practice'])
            .analyze();
          const said = violations.map(
            ({ id, nodes }) =>
              `${id}: ${nodes
                .map(({ html }) => html)
                .slice(0, 3)
                .join(' | ')}`,
          );
          expect.soft(said, `${met.what}, ${sight.name}: axe`).toEqual([]);
          const sideways = await page.evaluate(
            () => document.documentElement.scrollWidth - document.documentElement.clientWidth,
          );
          expect
            .soft(sideways, `${met.what}, ${sight.name}: sideways scroll`)
            .toBeLessThanOrEqual(0);
        }
        const expected = met.what === 'page that is not there';
        const complaints = faults.splice(0).filter((one) => !(expected && one.includes('404')));
        expect.soft(complaints, met.what).toEqual([]);
      });
    }
  });
}

async function idsOf(page: Page, person: Person | null): Promise<DemoIds> {
  await signInAs(page, 'manager');
  const ids = await demoIds(page.request);
  await page.context().clearCookies();
  if (person) await signInAs(page, person);
  return ids;
}

/** Everything that a page complains of: console errors (the policy's among them), failed requests. */
function watch(page: Page): string[] {
  const faults: string[] = [];
  page.on('console', (message) => {
    if (message.type() === 'error') faults.push(message.text());
  });
  page.on('pageerror', (error) => faults.push(String(error)));
  page.on('response', (response) => {
    if (response.status() >= 400) faults.push(`${response.status()} ${response.url()}`);
  });
  return faults;
}

/** Islands are awake and, on a bench, the tank is drawn. */
async function settled(page: Page): Promise<void> {
  await page.waitForLoadState('networkidle');
  await expect(page.locator('astro-island[ssr]')).toHaveCount(0);
  if (page.url().endsWith('/bench')) await expect(page.getByTestId('answer')).toBeVisible();
}
