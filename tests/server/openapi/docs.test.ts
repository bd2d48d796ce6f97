import { readFileSync } from 'node:fs';
import { expect, it } from 'vitest';
import { operations } from '~/server/openapi/operations';
import { limits } from '~/server/http/rate-limits';
import { statusOf } from '~/server/http/problem';

const page = readFileSync('docs/api.md', 'utf8');

it('docs/api.md lists every call, and no other', () => {
  const listed = [...page.matchAll(/^\| `((?:GET|POST|PUT|PATCH|DELETE) \/[^`]+)` \|/gm)].map(
    (match) => match[1]!,
  );
  const there = operations.map(({ method, path }) => `${method} ${path}`);
  expect([...listed].sort()).toEqual([...there].sort());
});

it('docs/api.md lists every code with its status', () => {
  const listed = [...page.matchAll(/^\| (\d{3}) \| `([a-z-]+)` \|/gm)].map((match) => [
    match[2]!,
    Number(match[1]),
  ]);
  expect(Object.fromEntries(listed)).toEqual(statusOf);
});

it('docs/api.md names the limits as they are', () => {
  const { compute, session, workshops } = limits;
  expect(page.replaceAll(/\s+/g, ' ')).toContain(
    `\`/compute\` ${compute.burst} calls at once, then ${compute.perSecond} a second; \`/session\` ${session.burst}, then one in ` +
      `${1 / session.perSecond} seconds; \`/workshops\` ${workshops.burst}, then one in ${1 / workshops.perSecond} seconds`,
  );
});
