import { DipwrightError } from '~/domain/errors';

/** The file that a request is, piece by piece. Throws `unsupported-media-type` or `bad-request`. */
export function sentFile(request: Request): AsyncIterable<Uint8Array> {
  const [mediaType = ''] = (request.headers.get('content-type') ?? '').split(';');
  if (mediaType.trim().toLowerCase() !== 'application/octet-stream') {
    throw new DipwrightError(
      'unsupported-media-type',
      'Send the file as it is, with the header "Content-Type: application/octet-stream".',
    );
  }
  if (request.body === null) {
    throw new DipwrightError('bad-request', 'The body is empty: send the file.');
  }
  return request.body as unknown as AsyncIterable<Uint8Array>;
}
