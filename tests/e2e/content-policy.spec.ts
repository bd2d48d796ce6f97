import { expect, test } from '@playwright/test';

/* The policy is tight, and the product lives inside it: nothing on a page runs into it. */

for (const path of ['/', '/sign-in', '/sign-up']) {
  test(`${path} comes alive without a violation`, async ({ page }) => {
    const complaints: string[] = [];
    page.on('console', (message) => {
      if (message.type() === 'error') complaints.push(message.text());
    });
    page.on('pageerror', (error) => complaints.push(error.message));
    await page.addInitScript(() => {
      const seen: string[] = [];
      Object.assign(globalThis, { policyViolations: seen });
      document.addEventListener('securitypolicyviolation', (event) =>
        seen.push(`${event.violatedDirective} ${event.blockedURI}`),
      );
    });
    await page.goto(path);
    // An island drops its `ssr` mark once it is alive.
    await expect(page.locator('astro-island')).not.toHaveCount(0);
    await expect(page.locator('astro-island[ssr]')).toHaveCount(0);
    await page.waitForLoadState('networkidle');
    expect(
      await page.evaluate(
        () => (globalThis as unknown as { policyViolations: string[] }).policyViolations,
      ),
    ).toEqual([]);
    expect(complaints).toEqual([]);
  });
}

test('planted inline code, a foreign script and eval are refused', async ({ page }) => {
  await page.goto('/sign-in');
  const violated = await page.evaluate(
    () =>
      new Promise<string[]>((resolve) => {
        const seen: string[] = [];
        document.addEventListener('securitypolicyviolation', (event) => {
          seen.push(`${event.effectiveDirective} ${event.blockedURI}`);
          if (seen.length === 4) resolve(seen.sort());
        });
        const inline = document.createElement('script');
        inline.textContent = 'globalThis.planted = true';
        const foreign = document.createElement('script');
        foreign.src = 'https://evil.example/x.js';
        const style = document.createElement('p');
        style.setAttribute('style', 'color: red');
        document.body.append(inline, foreign, style);
        // From a timer, since what the test tool itself evaluates stands outside the policy.
        setTimeout('globalThis.planted = true');
      }),
  );
  expect(violated).toEqual([
    'script-src eval',
    'script-src-elem https://evil.example/x.js',
    'script-src-elem inline',
    'style-src-attr inline',
  ]);
  expect(await page.evaluate(() => 'planted' in globalThis)).toBe(false);
});
