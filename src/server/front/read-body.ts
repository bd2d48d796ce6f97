import type { IncomingMessage } from 'node:http';

/** What came of reading a body: its bytes, too many of them, or a client that went away. */
export type ReadBody = { bytes: Buffer } | 'too-large' | 'gone';

/**
 * Reads a body of at most `cap` bytes. A length announced beyond the cap is refused before a byte
 * is read; a body without a length is refused as soon as it passes the cap.
 */
export function readBody(request: IncomingMessage, cap: number): Promise<ReadBody> {
  const announced = Number(request.headers['content-length'] ?? 0);
  if (announced > cap) return Promise.resolve('too-large');
  return new Promise((resolve) => {
    const parts: Buffer[] = [];
    let length = 0;
    const end = (result: ReadBody) => {
      request.off('data', onData).off('end', onEnd).off('close', onGone).off('error', onGone);
      resolve(result);
    };
    const onData = (part: Buffer) => {
      length += part.length;
      if (length > cap) end('too-large');
      else parts.push(part);
    };
    const onEnd = () => end({ bytes: Buffer.concat(parts) });
    const onGone = () => end('gone');
    request.on('data', onData).on('end', onEnd).on('close', onGone).on('error', onGone);
  });
}

/**
 * A body of at most `cap` bytes as it comes, for whoever reads it piece by piece. A length announced beyond the cap is
 * refused before a byte is read; the piece that passes the cap is the last.
 */
export function streamBody(
  request: IncomingMessage,
  cap: number,
): { pieces: AsyncIterable<Uint8Array> } | 'too-large' {
  if (Number(request.headers['content-length'] ?? 0) > cap) return 'too-large';
  return { pieces: pieces() };

  async function* pieces() {
    let length = 0;
    for await (const piece of request.iterator({
      destroyOnReturn: false,
    }) as AsyncIterable<Buffer>) {
      length += piece.length;
      yield piece;
      if (length > cap) return;
    }
  }
}

/**
 * Lets the rest of a refused body run into nothing for a moment, so that the client gets to read
 * the answer, then ends the connection.
 */
export function discardRest(request: IncomingMessage, afterMs = 2_000): void {
  request.on('error', () => undefined);
  request.resume();
  const timer = setTimeout(() => request.socket.destroy(), afterMs);
  timer.unref();
  request.once('end', () => clearTimeout(timer));
  request.once('close', () => clearTimeout(timer));
}
