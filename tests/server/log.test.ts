import { expect, it } from 'vitest';
import { createLog } from '~/server/log';

function written(
  level: Parameters<typeof createLog>[0],
  work: (log: ReturnType<typeof createLog>) => void,
): string[] {
  const lines: string[] = [];
  work(createLog(level, (line) => lines.push(line)));
  return lines;
}

it('writes one JSON object a line, whatever the text holds', () => {
  const [line = ''] = written('info', (log) =>
    log.info('two\nlines', { tank: 'T1', litres: 55.5 }),
  );
  expect(line.match(/\n/g)).toHaveLength(1);
  expect(JSON.parse(line)).toMatchObject({
    level: 'info',
    message: 'two\nlines',
    tank: 'T1',
    litres: 55.5,
  });
});

it('leaves out what is below its level', () => {
  const lines = written('warn', (log) => {
    log.debug('a');
    log.info('b');
    log.warn('c');
    log.error('d');
  });
  expect(lines.map((line) => (JSON.parse(line) as { message: string }).message)).toEqual([
    'c',
    'd',
  ]);
});

it('keeps secrets out at any depth', () => {
  const [line = ''] = written('info', (log) =>
    log.info('x', {
      password: 'p-1',
      headers: { Cookie: 'p-2', authorization: 'p-3' },
      list: [{ sessionToken: 'p-4', deviceKey: 'p-5', apiKey: 'p-6' }],
    }),
  );
  expect(line).not.toMatch(/p-\d/);
});

it('writes of an error its message and place, not what a driver hung on it', () => {
  const error = Object.assign(new Error('refused'), {
    code: 'ECONNREFUSED',
    config: { host: 'db', password: 'p-1' },
    cause: Object.assign(new Error('below'), { options: { secret: 'p-2' } }),
  });
  const [line = ''] = written('info', (log) => log.error('x', { error }));
  expect(JSON.parse(line)).toMatchObject({
    error: { message: 'refused', code: 'ECONNREFUSED', cause: { message: 'below' } },
  });
  expect(line).not.toMatch(/p-\d/);
  expect(line).toContain('log.test.ts');
});

it('survives what JSON cannot hold', () => {
  const circle: Record<string, unknown> = { big: 10n };
  circle.self = circle;
  const [line = ''] = written('info', (log) => log.info('x', { circle }));
  expect(JSON.parse(line)).toMatchObject({ circle: { big: '10' } });
});
