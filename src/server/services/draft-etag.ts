/** The strong entity tag of a draft's version. */
export function draftEtag(version: number): string {
  return `"${version}"`;
}
