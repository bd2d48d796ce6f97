/** What one workshop may see must not stay in a shared cache, or on a disk. */
const unkept = { 'cache-control': 'no-store' };

export function json(
  value: unknown,
  options: { status?: number; headers?: Readonly<Record<string, string>> } = {},
): Response {
  return new Response(JSON.stringify(value), {
    status: options.status ?? 200,
    headers: { ...unkept, 'content-type': 'application/json; charset=utf-8', ...options.headers },
  });
}

export function created(value: unknown, headers: Readonly<Record<string, string>> = {}): Response {
  return json(value, { status: 201, headers });
}

export function noContent(headers: Readonly<Record<string, string>> = {}): Response {
  return new Response(null, { status: 204, headers: { ...unkept, ...headers } });
}

/** A file to keep. `fileName`: what to offer as its name; every sign that is risky there becomes a hyphen. */
export function file(
  bytes: Uint8Array | string,
  mediaType: string,
  fileName: string,
  disposition: 'attachment' | 'inline' = 'attachment',
): Response {
  const plain = fileName.replaceAll(/[^A-Za-z0-9._-]+/g, '-');
  const full = encodeURIComponent(fileName).replaceAll(
    /['()*]/g,
    (sign) => `%${sign.charCodeAt(0).toString(16)}`,
  );
  return new Response(bytes as BodyInit, {
    headers: {
      ...unkept,
      'content-type': mediaType,
      'content-disposition': `${disposition}; filename="${plain}"; filename*=UTF-8''${full}`,
    },
  });
}
