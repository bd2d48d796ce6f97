import { expect, it } from 'vitest';
import { sumUp } from '../../src/commands/suites/sum-up.mjs';

const suite = (name: string, passed: number, failed = 0, skipped = 0) => ({
  name,
  passed,
  failed,
  skipped,
});

it('ends with the sum alone on its line', () => {
  const { lines, failed } = sumUp([suite('unit', 40), suite('server', 12, 2)]);
  expect(lines.at(-1)).toBe('52 passed, 2 failed');
  expect(failed).toBe(2);
});

it('counts a suite that ran nothing as failed', () => {
  const { lines, failed } = sumUp([suite('unit', 40), suite('browser', 0)]);
  expect(failed).toBe(1);
  expect(lines).toContain('✗ browser: 0 passed, 1 failed (ran nothing)');
});

it('shows what was skipped', () => {
  expect(sumUp([suite('unit', 3, 0, 1)]).lines[0]).toBe('✓ unit: 3 passed, 0 failed, 1 skipped');
});
