/** Names one size of one solid: `body/length`, `tank/ends/0/depth`. `path` as in Size. */
export function sizeKey(solidId: string, path: readonly string[]): string {
  return [solidId, ...path].join('/');
}
