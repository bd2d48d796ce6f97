/**
 * The path of a request target, or null when it is no plain path: not starting with one slash, with
 * a backslash or a control character, or with an escape that cannot be decoded. Such a path is how
 * redirects are led off the host and how files outside a folder are asked for.
 */
export function requestPath(target: string | undefined): string | null {
  if (target === undefined || !/^\/(?![/\\])/.test(target)) return null;
  const raw = target.split(/[?#]/, 1)[0] ?? '';
  let path: string;
  try {
    path = decodeURIComponent(raw);
  } catch {
    return null;
  }
  if (/[\\\u0000-\u001f\u007f]/.test(path)) return null;
  return path.split('/').some((part) => part === '..' || part === '.') ? null : path;
}
