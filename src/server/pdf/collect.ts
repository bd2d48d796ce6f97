import type { Readable } from 'node:stream';

/** All bytes of a stream that is read to its end. Rejects when it fails. */
export function collect(stream: Readable): Promise<Buffer> {
  return new Promise((resolve, reject) => {
    const pieces: Buffer[] = [];
    stream.on('data', (piece: Buffer) => pieces.push(piece));
    stream.on('end', () => resolve(Buffer.concat(pieces)));
    stream.on('error', reject);
  });
}
