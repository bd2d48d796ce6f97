import { connect } from 'node:net';
import { afterEach, describe, expect, it } from 'vitest';
import type { Handler } from '~/server/front/front';
import { openFrontServer } from '../../support/front-server';

let opened: Awaited<ReturnType<typeof openFrontServer>> | undefined;
afterEach(async () => {
  await opened?.close();
  opened = undefined;
});

const megabyte = 1024 * 1024;

/** Sends a head and then pieces of 1 MB until an answer comes; what the server said and how many pieces were sent. */
function sendUntilAnswered(port: number, head: string[], pieces: number, chunked: boolean) {
  return new Promise<{ answer: string; sent: number }>((resolve) => {
    const socket = connect(port, '127.0.0.1');
    let answer = '';
    let sent = 0;
    const piece = Buffer.alloc(megabyte, 120);
    const done = () => resolve({ answer, sent });
    socket.on('data', (data) => {
      answer += data.toString();
      if (answer.includes('\r\n\r\n')) {
        socket.destroy();
        done();
      }
    });
    socket.on('error', done);
    socket.on('close', done);
    socket.write(
      ['POST /api/v1/meshes?unit=mm HTTP/1.1', 'Host: tarnside.example', ...head, '', ''].join(
        '\r\n',
      ),
    );
    const next = () => {
      if (socket.destroyed || sent === pieces || answer !== '') return;
      sent += 1;
      if (chunked) socket.write(`${megabyte.toString(16)}\r\n`);
      socket.write(piece);
      socket.write(chunked ? '\r\n' : '', () => setImmediate(next));
    };
    setImmediate(next);
  });
}

/** Reads the body as a service would, and counts. */
function reader(seen: { pieces: number; bytes: number }): Handler {
  return async (request, response) => {
    for await (const piece of (request as unknown as { body: AsyncIterable<Uint8Array> }).body) {
      seen.pieces += 1;
      seen.bytes += piece.length;
    }
    response.writeHead(seen.bytes > 64 * megabyte ? 413 : 201);
    response.end();
  };
}

describe('a file that is sent', () => {
  it('is handed on piece by piece', async () => {
    const seen = { pieces: 0, bytes: 0 };
    opened = await openFrontServer(reader(seen));
    const { answer } = await sendUntilAnswered(
      opened.port,
      [`Content-Length: ${8 * megabyte}`],
      8,
      false,
    );
    expect(answer).toMatch(/^HTTP\/1\.1 201/);
    expect(seen.bytes).toBe(8 * megabyte);
    expect(seen.pieces).toBeGreaterThan(8);
  });

  it('of 65 MB is refused before a byte is read', async () => {
    const handler: Handler = () =>
      Promise.reject(new Error('the framework must not see this request'));
    opened = await openFrontServer(handler);
    const { answer, sent } = await sendUntilAnswered(
      opened.port,
      [`Content-Length: ${65 * megabyte}`],
      0,
      false,
    );
    expect(answer).toMatch(/^HTTP\/1\.1 413/);
    expect(sent).toBe(0);
  });

  it('without a length ends with the piece that passes 64 MB, and is answered', async () => {
    const seen = { pieces: 0, bytes: 0 };
    opened = await openFrontServer(reader(seen));
    const { answer } = await sendUntilAnswered(
      opened.port,
      ['Transfer-Encoding: chunked'],
      200,
      true,
    );
    expect(answer).toMatch(/^HTTP\/1\.1 413/);
    expect(seen.bytes).toBeGreaterThan(64 * megabyte);
    expect(seen.bytes).toBeLessThan(66 * megabyte);
  });

  it('is not read when nobody asks for it, as of a stranger', async () => {
    opened = await openFrontServer(async (_request, response) => {
      response.writeHead(401);
      response.end();
    });
    const { answer, sent } = await sendUntilAnswered(
      opened.port,
      [`Content-Length: ${60 * megabyte}`],
      60,
      false,
    );
    expect(answer).toMatch(/^HTTP\/1\.1 401/);
    expect(sent).toBeLessThan(20);
  });
});
