/**
 * The closing lines of a test run: a line a suite, and last, alone on its line, the sum. A suite
 * that ran nothing counts as failed.
 * @param {import('./vitest-suite.mjs').SuiteResult[]} results
 * @returns {{ lines: string[], failed: number }}
 */
export function sumUp(results) {
  const judged = results.map((result) =>
    result.passed + result.failed === 0 ? { ...result, failed: 1, note: 'ran nothing' } : result,
  );
  const total = (key) => judged.reduce((sum, result) => sum + result[key], 0);
  const lines = judged.map(({ name, passed, failed, skipped, note }) => {
    const parts = [`${passed} passed`, `${failed} failed`];
    if (skipped > 0) parts.push(`${skipped} skipped`);
    return `${failed > 0 ? '✗' : '✓'} ${name}: ${parts.join(', ')}${note ? ` (${note})` : ''}`;
  });
  return {
    lines: [...lines, `${total('passed')} passed, ${total('failed')} failed`],
    failed: total('failed'),
  };
}
