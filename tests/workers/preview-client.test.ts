import { describe, expect, it } from 'vitest';
import { latestWins } from '~/workers/latest-wins';
import { createPreviewClient, type PreviewWorker } from '~/workers/preview-client';
import type { PreviewReply, PreviewRequest } from '~/workers/preview-protocol';
import type { Preview } from '~/domain/table/preview';
import { slopedCistern } from '../domain/table/designs';

function fakeWorker() {
  const sent: PreviewRequest[] = [];
  const worker: PreviewWorker = {
    postMessage: (message) => sent.push(message),
    terminate: () => {},
    onmessage: null,
    onerror: null,
  };
  const reply = (data: PreviewReply) => worker.onmessage!({ data } as MessageEvent<PreviewReply>);
  return { sent, worker, reply };
}

describe('the preview client', () => {
  it('gives the newest preview; a call that was overtaken gets null', async () => {
    const { sent, worker, reply } = fakeWorker();
    const client = createPreviewClient(() => worker);
    const first = client.compute(slopedCistern);
    const second = client.compute(slopedCistern);
    expect(await first).toBeNull();
    // a late answer to the first is not taken for the second's
    reply({ number: sent[0]!.number, preview: { capacityL: 1 } as Preview, tookMs: 1 });
    reply({ number: sent[1]!.number, preview: { capacityL: 2 } as Preview, tookMs: 1 });
    expect((await second)?.capacityL).toBe(2);
  });

  it('rejects with the refusal, its pointers kept', async () => {
    const { worker, reply } = fakeWorker();
    const call = createPreviewClient(() => worker).compute(slopedCistern);
    const faults = [{ pointer: '/stick/at', detail: 'Move the stick.' }];
    reply({ number: 1, refusal: { code: 'invalid', message: 'Move the stick.', faults } });
    await expect(call).rejects.toMatchObject({ code: 'invalid', faults });
  });

  it('rejects when the worker cannot run, and resolves open calls when closed', async () => {
    const { worker } = fakeWorker();
    const client = createPreviewClient(() => worker);
    const failing = client.compute(slopedCistern);
    worker.onerror!({} as ErrorEvent);
    await expect(failing).rejects.toMatchObject({ code: 'unavailable' });
    const open = client.compute(slopedCistern);
    client.close();
    expect(await open).toBeNull();
  });
});

describe('latestWins', () => {
  it('skips what was overtaken while a job ran, and loses no last one', async () => {
    const done: number[] = [];
    let release = () => {};
    const take = latestWins<number>(async (input) => {
      done.push(input);
      await new Promise<void>((resolve) => (release = resolve));
    });
    const turn = () => new Promise((resolve) => setTimeout(resolve, 20));
    take(1);
    await turn();
    [2, 3, 4].forEach(take);
    release();
    await turn();
    expect(done).toEqual([1, 4]);
    release();
    await turn();
    take(5);
    await turn();
    expect(done).toEqual([1, 4, 5]);
    release();
  });
});
