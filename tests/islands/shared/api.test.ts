import { afterEach, describe, expect, it, vi } from 'vitest';
import { readDesign, saveDesign, signIn, signOut } from '~/islands/shared/api';
import { ApiProblem } from '~/islands/shared/problem';
import { startingPoints } from '~/domain/tank/starting-points';
import { json, problem, sent } from './answers';

const fetch = vi.fn<(...args: unknown[]) => Promise<Response>>();
vi.stubGlobal('fetch', fetch);
afterEach(() => fetch.mockReset());

const design = startingPoints[0]!.design;
const refused = async (work: Promise<unknown>): Promise<ApiProblem> => {
  const error: unknown = await work.then(
    () => null,
    (thrown: unknown) => thrown,
  );
  expect(error).toBeInstanceOf(ApiProblem);
  return error as ApiProblem;
};

describe('calls of the API', () => {
  it('sends JSON and takes an answer without a body', async () => {
    fetch.mockResolvedValueOnce(new Response(null, { status: 204 }));
    await expect(signIn({ email: 'a@b.example', password: 'x' })).resolves.toBeUndefined();
    expect(sent(fetch.mock.calls, 0)).toMatchObject({
      path: '/api/v1/session',
      headers: { 'content-type': 'application/json' },
      body: { email: 'a@b.example', password: 'x' },
    });
  });

  it('reads the draft with its entity tag and gives it back when saving', async () => {
    fetch.mockResolvedValueOnce(
      new Response(JSON.stringify(design), {
        headers: { 'content-type': 'application/json', etag: '"7"' },
      }),
    );
    const { value, etag } = await readDesign('t1');
    expect([value, etag]).toEqual([design, '"7"']);
    fetch.mockResolvedValueOnce(json(200, design));
    await saveDesign('t1', design, '"7"');
    expect(sent(fetch.mock.calls, 1).headers['if-match']).toBe('"7"');
  });

  it('turns a problem document into a typed error with its faults and facts', async () => {
    fetch.mockResolvedValueOnce(
      problem(412, {
        code: 'precondition-failed',
        detail: 'Idris Vaughan saved first.',
        requestId: 'r1',
        errors: [
          { pointer: '/solids/0/length', detail: 'A length is more than 0 mm.' },
          { detail: 'no pointer' },
        ],
        etag: '"8"',
        savedBy: 'Idris Vaughan',
      }),
    );
    const error = await refused(saveDesign('t1', design, '"7"'));
    expect(error).toMatchObject({
      code: 'precondition-failed',
      status: 412,
      message: 'Idris Vaughan saved first.',
      requestId: 'r1',
      faults: [{ pointer: '/solids/0/length', detail: 'A length is more than 0 mm.' }],
      facts: { etag: '"8"', savedBy: 'Idris Vaughan' },
    });
  });

  it('says in a sentence that no answer came, or one that nobody can read', async () => {
    fetch.mockRejectedValueOnce(new TypeError('Failed to fetch'));
    expect(await refused(signOut())).toMatchObject({ code: 'unreachable', status: 0 });
    fetch.mockResolvedValueOnce(
      new Response('<html>', { status: 502, headers: { 'content-type': 'text/html' } }),
    );
    const error = await refused(signOut());
    expect(error).toMatchObject({ code: 'unreadable', status: 502 });
    expect(error.message).toMatch(/^The server answered with 502/);
    fetch.mockResolvedValueOnce(json(200, { format: 'something else' }));
    expect(await refused(readDesign('t1'))).toMatchObject({ code: 'unreadable' });
  });

  it('lets an abandoned call end as the browser ends it', async () => {
    fetch.mockRejectedValueOnce(new DOMException('stopped', 'AbortError'));
    await expect(signOut()).rejects.toMatchObject({ name: 'AbortError' });
  });
});
