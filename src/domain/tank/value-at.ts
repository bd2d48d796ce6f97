/** The value at a path inside plain data; undefined where the path leads nowhere. */
export function valueAt(data: unknown, path: readonly PropertyKey[]): unknown {
  let at: unknown = data;
  for (const key of path) {
    if (typeof at !== 'object' || at === null || !Object.hasOwn(at, key)) return undefined;
    at = (at as Record<PropertyKey, unknown>)[key];
  }
  return at;
}
