import { DipwrightError } from '~/domain/errors';

/** More than any design or list of depths that is accepted. The server in front has caps of its own. */
export const mostBytes = 1024 * 1024;

/** The JSON document of a request. Throws `unsupported-media-type`, `too-large` or `bad-request`. */
export async function readJson(request: Request): Promise<unknown> {
  const [mediaType = ''] = (request.headers.get('content-type') ?? '').split(';');
  if (mediaType.trim().toLowerCase() !== 'application/json') {
    throw new DipwrightError(
      'unsupported-media-type',
      'Send JSON, with the header "Content-Type: application/json".',
    );
  }
  const text = decoded(await bytesOf(request));
  if (text.trim() === '')
    throw new DipwrightError('bad-request', 'The body is empty: send a JSON document.');
  try {
    return JSON.parse(text);
  } catch {
    throw new DipwrightError(
      'bad-request',
      'The body is not JSON: check quotes, commas and brackets.',
    );
  }
}

async function bytesOf(request: Request): Promise<Uint8Array> {
  const chunks: Uint8Array[] = [];
  let length = 0;
  for await (const chunk of (request.body ?? []) as AsyncIterable<Uint8Array>) {
    length += chunk.byteLength;
    if (length > mostBytes) {
      throw new DipwrightError(
        'too-large',
        'The body is larger than 1 MB: send a smaller document.',
      );
    }
    chunks.push(chunk);
  }
  return Buffer.concat(chunks);
}

function decoded(bytes: Uint8Array): string {
  try {
    return new TextDecoder('utf-8', { fatal: true }).decode(bytes);
  } catch {
    throw new DipwrightError('bad-request', 'The body is not UTF-8 text.');
  }
}
