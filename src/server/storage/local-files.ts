import { randomUUID } from 'node:crypto';
import { access, mkdir, open, rename, rm, writeFile } from 'node:fs/promises';
import { dirname, join, resolve } from 'node:path';
import { DipwrightError } from '~/domain/errors';
import type { FileStore } from './file-store';

/** Keys are our own: groups of letters and digits, parted by slashes. */
const keyForm = /^[a-z0-9]+(\/[a-z0-9]+)*$/;

/** Files in a folder of this machine. What is half written stands beside, under a name of its own, until it is whole. */
export function localFiles(folder: string): FileStore {
  const incoming = resolve(folder, 'incoming');
  const pathOf = (key: string) => {
    if (!keyForm.test(key))
      throw new Error('A key of the storage has letters, digits and slashes only.');
    return resolve(folder, key);
  };
  const there = (path: string) =>
    access(path).then(
      () => true,
      () => false,
    );
  return {
    async put(key, bytes) {
      const path = pathOf(key);
      if (await there(path)) return;
      await mkdir(dirname(path), { recursive: true });
      await mkdir(incoming, { recursive: true });
      const beside = join(incoming, randomUUID());
      try {
        await writeFile(beside, bytes, { flush: true } as Parameters<typeof writeFile>[2]);
        await rename(beside, path);
      } finally {
        await rm(beside, { force: true });
      }
    },
    async fileOf(key) {
      const path = pathOf(key);
      return (await there(path)) ? path : null;
    },
    async withIncoming(sent, mostBytes, work) {
      await mkdir(incoming, { recursive: true });
      const path = join(incoming, randomUUID());
      try {
        const file = await open(path, 'wx');
        try {
          let length = 0;
          for await (const piece of sent) {
            length += piece.byteLength;
            if (length > mostBytes) {
              const most = Math.floor(mostBytes / 1024 / 1024);
              throw new DipwrightError(
                'too-large',
                `The file is larger than ${most} MB: send a smaller one.`,
              );
            }
            await file.writeFile(piece);
          }
        } finally {
          await file.close();
        }
        return await work(path);
      } finally {
        await rm(path, { force: true });
      }
    },
  };
}
