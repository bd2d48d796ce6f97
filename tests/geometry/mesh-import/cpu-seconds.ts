/** Seconds of processor that `work` took: unlike a clock, not longer when the machine is busy with others. */
export async function cpuSeconds(work: () => unknown): Promise<number> {
  const before = process.cpuUsage();
  await work();
  const { user, system } = process.cpuUsage(before);
  return (user + system) / 1e6;
}
