import { expect, it } from 'vitest';
import { isId, newId } from '~/server/database/new-id';

it('makes ids of version 7 that carry their millisecond and do not repeat', () => {
  const ids = Array.from({ length: 5000 }, () => newId(1_700_000_000_000));
  expect(new Set(ids).size).toBe(5000);
  for (const id of ids) expect(isId(id)).toBe(true);
  // RFC 9562, 5.7: the first 48 bits are the Unix time in milliseconds
  expect(Number.parseInt(ids[0]!.replaceAll('-', '').slice(0, 12), 16)).toBe(1_700_000_000_000);
  expect(newId(1_700_000_000_001) > ids[0]!).toBe(true);
});

it('knows its own form only', () => {
  const id = '01890a5d-ac96-774b-bcce-b302099a8057';
  expect(isId(id)).toBe(true);
  const others = [
    '',
    '1',
    id.toUpperCase(),
    ` ${id}`,
    `${id} `,
    id.replaceAll('-', ''),
    '01890a5d-ac96-474b-bcce-b302099a8057', // version 4
    '01890a5d-ac96-774b-0cce-b302099a8057', // another variant
  ];
  for (const text of others) expect(isId(text), text).toBe(false);
});
