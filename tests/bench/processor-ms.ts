/** Processor time of some work, ms: what other processes take does not count. */
export function processorMs(work: () => void): number {
  const start = process.cpuUsage();
  work();
  const { user, system } = process.cpuUsage(start);
  return (user + system) / 1000;
}

/** Median of so many runs of the same work, ms of processor time, after some to warm up. */
export function medianMs(work: () => void, runs: number, warm = 3): number {
  for (let run = 0; run < warm; run += 1) work();
  return median(Array.from({ length: runs }, () => processorMs(work)));
}

export function median(values: readonly number[]): number {
  const sorted = [...values].sort((one, other) => one - other);
  return sorted[sorted.length >> 1]!;
}
