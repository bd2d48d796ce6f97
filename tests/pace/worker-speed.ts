import { expect, test, type Page } from '@playwright/test';
import { benchDesigns } from '../bench/bench-designs';
import { signInAs } from '../e2e/people';

/*
 * How long the worker of the bench takes from an edit to its table. The figures are printed; what they should be
 * on two quiet cores is 16 ms for three solids and 50 ms for six with formed ends (95th percentile). What fails
 * here is six times that: a machine that does other things too must not fail for it. Part of npm run test:long.
 */
const runs = 60;

for (const [name, wantedMs] of [
  ['three solids, tilted', 16],
  ['six solids with formed ends, tilted', 50],
] as const) {
  test(`edit to table in the worker: ${name}`, async ({ page }) => {
    await page.addInitScript(timeWorkers);
    await openBench(page, name);
    const times = await edited(page);
    const at = (share: number) => times[Math.floor(share * (times.length - 1))]!;
    console.log(
      `worker, ${name}: median ${at(0.5).toFixed(1)} ms, 95th percentile ${at(0.95).toFixed(1)} ms, wanted ${wantedMs}`,
    );
    expect(at(0.95)).toBeLessThan(6 * wantedMs);
  });
}

/** In the page: notes what every reply of a worker says that it took. */
function timeWorkers(): void {
  const times: number[] = [];
  Object.assign(window, { workerTimes: times });
  const post = Worker.prototype.postMessage as (this: Worker, ...of: unknown[]) => void;
  const known = new WeakSet<Worker>();
  Worker.prototype.postMessage = function (this: Worker, ...of: unknown[]) {
    if (!known.has(this)) {
      known.add(this);
      this.addEventListener('message', ({ data }: MessageEvent<{ tookMs?: number }>) => {
        if (data.tookMs !== undefined) times.push(data.tookMs);
      });
    }
    post.apply(this, of);
  };
}

/** A new tank of this design, on its bench. */
async function openBench(page: Page, name: string): Promise<void> {
  await signInAs(page, 'designer');
  const form = page.getByRole('form', { name: 'Add a tank' });
  await form.getByLabel('Fitted in').selectOption({ label: 'Service van 3' });
  await form.getByLabel('Name').fill(`${name} ${Date.now()}`);
  await form.getByRole('button', { name: /Add the tank/ }).click();
  await page.waitForURL('**/bench');
  const id = new URL(page.url()).pathname.split('/')[2]!;
  const status = await page.evaluate(
    async ([tankId, design]) => {
      const address = `/api/v1/tanks/${tankId}/design`;
      const etag = (await fetch(address)).headers.get('etag')!;
      const answer = await fetch(address, {
        method: 'PUT',
        headers: { 'content-type': 'application/json', 'if-match': etag },
        body: JSON.stringify(design),
      });
      return answer.status;
    },
    [id, benchDesigns[name]!] as const,
  );
  expect(status).toBeLessThan(300);
  await page.reload();
  await expect(page.getByTestId('answer')).toBeVisible();
}

/** Steps the length of the barrel by a key, again and again; the worker's times, ascending. */
async function edited(page: Page): Promise<number[]> {
  const opener = page.getByRole('button', { name: 'barrel: sizes, place and turn' });
  if ((await opener.getAttribute('aria-expanded')) !== 'true') await opener.click();
  const length = page
    .getByRole('group', { name: 'Sizes of barrel' })
    .getByLabel('length', { exact: true });
  await length.focus();
  const count = () =>
    page.evaluate(() => (window as unknown as { workerTimes: number[] }).workerTimes.length);
  for (let run = 0; run < runs + 5; run += 1) {
    const before = await count();
    await length.press('ArrowUp');
    await expect.poll(count, { intervals: [20] }).toBeGreaterThan(before);
  }
  const times = await page.evaluate(
    () => (window as unknown as { workerTimes: number[] }).workerTimes,
  );
  return times.slice(-runs).sort((one, other) => one - other);
}
