import { spawnSync } from 'node:child_process';
import {
  cpSync,
  mkdirSync,
  mkdtempSync,
  readFileSync,
  rmSync,
  symlinkSync,
  writeFileSync,
} from 'node:fs';
import { tmpdir } from 'node:os';
import { dirname, join, posix } from 'node:path';
import { beforeAll, describe, expect, it } from 'vitest';
import { rooms } from './import-table.cjs';
import { checkout, sourceFiles } from './source-files';

/** Runs the rules over a folder that is laid out like the checkout; the lines of what they find. */
function violations(root: string, ...folders: string[]): string[] {
  const done = spawnSync(
    process.execPath,
    [
      join(checkout, 'node_modules/dependency-cruiser/bin/dependency-cruise.mjs'),
      '--config',
      join(root, '.dependency-cruiser.cjs'),
      '--output-type',
      'err',
      ...folders,
    ],
    { cwd: root, encoding: 'utf8', env: { ...process.env, NO_COLOR: '1', FORCE_COLOR: '0' } },
  );
  expect(done.stdout + done.stderr).toMatch(/dependency violations|no dependency violations/);
  return done.stdout
    .split('\n')
    .filter((line) => /^\s*(error|warn) /.test(line))
    .map((line) => line.trim());
}

describe('the import table', () => {
  it('is kept by every module of src and db', () => {
    expect(violations(checkout, 'src', 'db')).toEqual([]);
  });

  it('is kept by every .astro file, which the tool does not read', () => {
    const files = sourceFiles(['src'], ['.astro']);
    expect(
      files.flatMap((file) => foreignImports(file, readFileSync(join(checkout, file), 'utf8'))),
    ).toEqual([]);
  });
});

it('is told in DEVELOPERS.md as it is enforced', () => {
  const page = readFileSync(join(checkout, 'DEVELOPERS.md'), 'utf8');
  const told = [...page.matchAll(/^\| `src\/([^`]+)` \| .* \| ([^|]+) \|$/gm)].map(
    ([, room = '', mayImport = '']) => [
      room,
      mayImport === 'nothing of ours' ? [] : mayImport.split(', ').map(roomCalled).sort(),
    ],
  );
  const enforced = Object.entries(rooms).map(([room, may]) => [room, [...may].sort()]);
  expect(Object.fromEntries(told)).toEqual(Object.fromEntries(enforced));
});

/** The page leaves `server/` away where the table lists what a room may import. */
function roomCalled(name: string): string {
  return name in rooms ? name : `server/${name}`;
}

/** In each the first file is the culprit. */
const planted: { fault: string; rule: string; files: Record<string, string> }[] = [
  {
    fault: 'geometry knows the domain',
    rule: 'room-geometry',
    files: {
      'src/geometry/upward.ts': "import '~/domain/innocent';",
      'src/domain/innocent.ts': 'export {};',
    },
  },
  {
    fault: 'a type is imported against the arrows',
    rule: 'room-domain',
    files: {
      'src/domain/typed.ts':
        "import type { B } from '../server/services/typed'; export type A = B;",
      'src/server/services/typed.ts': 'export type B = 1;',
    },
  },
  {
    fault: 'a page reaches into the database',
    rule: 'room-pages',
    files: {
      'src/pages/api/deep.ts': "import '~/server/database/rows';",
      'src/server/database/rows.ts': 'export {};',
    },
  },
  {
    fault: 'two modules need each other',
    rule: 'no-cycles',
    files: {
      'src/scene/egg.ts': "import { hen } from './hen'; export const egg = (): number => hen();",
      'src/scene/hen.ts': "import { egg } from './egg'; export const hen = (): number => egg();",
    },
  },
  {
    fault: 'three outside the viewport',
    rule: 'three-in-viewport',
    files: {
      'src/islands/solid.ts': "import { Vector3 } from 'three'; export const a = new Vector3();",
    },
  },
  {
    fault: 'a query outside the database room',
    rule: 'sequelize-in-database',
    files: {
      'src/server/services/query.ts': "import { Op } from 'sequelize'; export const a = Op.and;",
    },
  },
  {
    fault: 'a migration that leans on the program',
    rule: 'migrations-stand-alone',
    files: { 'db/migrations/0001-leaning.ts': "import '../../src/domain/innocent';" },
  },
  {
    fault: 'a command that needs a package before npm ci has run',
    rule: 'plain-commands',
    files: { 'src/commands/start.mjs': "import { z } from 'zod/v4'; z.string();" },
  },
  {
    fault: 'an import that leads nowhere',
    rule: 'no-missing',
    files: { 'src/domain/lost.ts': "import './gone';" },
  },
];

describe('a planted fault is found', () => {
  let found: string[] = [];

  beforeAll(() => {
    const root = mkdtempSync(join(tmpdir(), 'dipwright-planted-'));
    for (const folder of ['src', 'db', 'tests/structure'])
      mkdirSync(join(root, folder), { recursive: true });
    for (const file of [
      '.dependency-cruiser.cjs',
      'tsconfig.json',
      'package.json',
      'tests/structure/import-table.cjs',
    ]) {
      cpSync(join(checkout, file), join(root, file));
    }
    symlinkSync(join(checkout, 'node_modules'), join(root, 'node_modules'));
    for (const [file, text] of planted.flatMap(({ files }) => Object.entries(files))) {
      mkdirSync(dirname(join(root, file)), { recursive: true });
      writeFileSync(join(root, file), text);
    }
    found = violations(root, 'src', 'db');
    rmSync(root, { recursive: true });
  });

  it.each(planted)('$fault', ({ rule, files }) => {
    const [culprit] = Object.keys(files);
    expect(found.filter((line) => line.startsWith(`error ${rule}: ${culprit}`))).toHaveLength(1);
  });

  it('in an .astro file', () => {
    const page =
      "---\nimport { find } from '~/server/database/repositories/tanks';\n---\n<p>page</p>\n";
    expect(foreignImports('src/pages/tanks.astro', page)).toHaveLength(1);
  });
});

/** Imports of an .astro file that its room may not make. */
function foreignImports(file: string, text: string): string[] {
  const room = roomOf(file);
  if (room === null) return [`${file} stands in no room`];
  const frontmatter = /^---\n([\s\S]*?)\n---/.exec(text)?.[1] ?? '';
  const targets = [...frontmatter.matchAll(/(?:from|import)\s+'([~.][^']*)'/g)].map(
    ([, target = '']) => target,
  );
  return targets
    .map((target) =>
      target.startsWith('~/') ? `src/${target.slice(2)}` : posix.join(posix.dirname(file), target),
    )
    .filter((target) => ![room, ...(rooms[room] ?? [])].includes(roomOf(target) ?? ''))
    .map((target) => `${file} imports ${target}`);
}

function roomOf(path: string): keyof typeof rooms | null {
  const inside = path.replace(/^src\//, '');
  const known = Object.keys(rooms) as (keyof typeof rooms)[];
  return known.find((room) => inside === room || inside.startsWith(`${room}/`)) ?? null;
}
