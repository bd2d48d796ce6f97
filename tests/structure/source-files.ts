import { readdirSync } from 'node:fs';
import { join, resolve } from 'node:path';

export const checkout = resolve(import.meta.dirname, '../..');

/** Paths, from the checkout, of the files below some folders whose name ends in one of the endings. */
export function sourceFiles(folders: readonly string[], endings: readonly string[]): string[] {
  return folders.flatMap((folder) =>
    readdirSync(join(checkout, folder), { withFileTypes: true }).flatMap((entry) => {
      const path = `${folder}/${entry.name}`;
      if (entry.isDirectory()) return sourceFiles([path], endings);
      return endings.some((ending) => entry.name.endsWith(ending)) ? [path] : [];
    }),
  );
}
