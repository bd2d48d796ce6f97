import { readFileSync } from 'node:fs';
import { join } from 'node:path';
import { describe, expect, it } from 'vitest';
import { checkout, sourceFiles } from './source-files';

interface Floor {
  name: string;
  minimum: string;
  reason: string;
  /** Counts only once a source imports the package: it is installed beside another, and not loaded. */
  onlyWhenUsed?: boolean;
}

const read = <T>(file: string) => JSON.parse(readFileSync(join(checkout, file), 'utf8')) as T;
const floors = read<Floor[]>('tests/structure/version-floors.json');
type Lock = { packages: Record<string, { version?: string; name?: string }> };
const lock = read<Lock>('package-lock.json');

/** Every copy of a package in the lock file that is older than the floor. */
function below(floor: Floor, { packages }: Lock): string[] {
  return Object.entries(packages)
    .filter(
      ([path, entry]) => path.endsWith(`node_modules/${floor.name}`) || entry.name === floor.name,
    )
    .filter(([, { version = '0.0.0' }]) => compare(version, floor.minimum) < 0)
    .map(
      ([path, { version }]) => `${path} ${version} is older than ${floor.minimum}: ${floor.reason}`,
    );
}

/** A release candidate counts as older than its release. */
function compare(a: string, b: string): number {
  const parts = (version: string) => version.split('-')[0]!.split('.').map(Number);
  const [left, right] = [parts(a), parts(b)];
  for (let at = 0; at < 3; at += 1) {
    const difference = (left[at] ?? 0) - (right[at] ?? 0);
    if (difference !== 0) return difference;
  }
  return Number(b.includes('-')) - Number(a.includes('-'));
}

function isUsed(name: string): boolean {
  const imported = new RegExp(`(from|import|require)\\s*\\(?\\s*['"]${name}(/[^'"]*)?['"]`);
  const files = [
    ...sourceFiles(['src', 'db'], ['.ts', '.tsx', '.mjs', '.astro']),
    'astro.config.mjs',
  ];
  return files.some((file) => imported.test(readFileSync(join(checkout, file), 'utf8')));
}

describe('version floors', () => {
  it.each(floors)('$name $minimum', (floor) => {
    if (floor.onlyWhenUsed && !isUsed(floor.name)) {
      expect(readFileSync(join(checkout, 'astro.config.mjs'), 'utf8')).toContain(
        'passthroughImageService()',
      );
      return;
    }
    expect(below(floor, lock)).toEqual([]);
  });

  it('find an old copy deep in the tree', () => {
    const planted: Lock = {
      packages: {
        'node_modules/sequelize': { version: '6.37.8' },
        'node_modules/other/node_modules/sequelize': { version: '6.37.7' },
        'node_modules/renamed': { name: 'sequelize', version: '5.0.0' },
        'node_modules/early/node_modules/sequelize': { version: '6.37.8-beta.1' },
      },
    };
    expect(below(floors[0]!, planted)).toHaveLength(3);
  });
});

it('every version in package.json is exact', () => {
  const { dependencies, devDependencies, overrides } =
    read<Record<string, Record<string, string>>>('package.json');
  const loose = Object.entries({ ...dependencies, ...devDependencies, ...overrides }).filter(
    ([, version]) => !/^\d+\.\d+\.\d+(-[\w.]+)?$/.test(version),
  );
  expect(loose).toEqual([]);
});
