import { readFileSync } from 'node:fs';
import { basename, join } from 'node:path';
import { expect, it } from 'vitest';
import { checkout, sourceFiles } from './source-files';

const code = sourceFiles(['src', 'db', 'tests'], ['.ts', '.tsx', '.astro', '.mjs', '.cjs', '.css']);
const textOf = (file: string) => readFileSync(join(checkout, file), 'utf8');

it('no file is longer than 400 lines', () => {
  expect(code.filter((file) => textOf(file).split('\n').length > 401)).toEqual([]);
});

it('no file or folder is a drawer', () => {
  expect(
    code.filter((file) => /(^|\/)(utils?|helpers?|misc|common|lib)(\/|\.)/.test(file)),
  ).toEqual([]);
});

it('no file only passes on what others export', () => {
  const barrels = code.filter((file) => {
    const lines = textOf(file)
      .split('\n')
      .filter((line) => line.trim() && !/^\s*(\/\/|\/?\*)/.test(line));
    return (
      lines.length > 0 && lines.every((line) => /^export (\*|\{|type \{)[^;]* from /.test(line))
    );
  });
  expect(barrels).toEqual([]);
});

it('nothing is left for later inside the code', () => {
  const marks = new RegExp(
    `\\b(${['TO', 'FIX', 'XX'].map((half, at) => half + ['DO', 'ME', 'X'][at]).join('|')})\\b`,
  );
  expect(code.filter((file) => marks.test(textOf(file)))).toEqual([]);
});

it('pages use nothing that the content policy or the closed routes refuse', () => {
  const refused =
    /\bdefine:vars\b|\bis:inline\b|\bserver:defer\b|\bset:html\b|<ClientRouter|\sstyle=/;
  const rendered = code.filter((file) => file.endsWith('.astro'));
  expect(rendered.filter((file) => refused.test(textOf(file)))).toEqual([]);
});

it('every test file lies where a project looks for it', () => {
  const rooms = [
    'structure',
    'geometry',
    'domain',
    'scene',
    'viewport',
    'workers',
    'commands',
    'islands',
    'server',
    'db',
    'long',
  ];
  const tests = sourceFiles(['tests'], ['.test.ts', '.test.tsx', '.spec.ts']);
  const lost = tests.filter((file) => {
    const room = file.split('/')[1] ?? '';
    return basename(file).includes('.spec.') ? room !== 'e2e' : !rooms.includes(room);
  });
  expect(lost).toEqual([]);
});
