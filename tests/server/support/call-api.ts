import type { APIContext, APIRoute } from 'astro';
import type { Actor } from '~/domain/access/actor';
import { newId } from '~/server/database/new-id';
import { ownOrigin, type House } from './house';

type Route = Partial<Record<string, APIRoute>>;

/** Every route file of the API, by its address, as the framework finds them. */
export const routes: Record<string, Route> = Object.fromEntries(
  Object.entries(
    import.meta.glob<Route>(['../../../src/pages/api/**/*.ts', '../../../src/pages/*.ts'], {
      eager: true,
    }),
  )
    .filter(([file]) => !file.includes('/_'))
    .map(([file, route]) => [addressOf(file), route]),
);

function addressOf(file: string): string {
  return file
    .replace('../../../src/pages', '')
    .replace(/\.ts$/, '')
    .replace(/\/index$/, '')
    .replaceAll(/\[(\.\.\.)?(\w+)\]/g, '{$2}');
}

export interface Sent {
  /** The Cookie header. */
  cookie?: string | undefined;
  headers?: Record<string, string>;
  /** Sent as JSON. */
  json?: unknown;
  /** Sent as it stands, with the content type that `headers` say. */
  raw?: BodyInit;
  clientAddress?: string;
}

/** What a browser of our own pages, or a program, would get: route, session and problem handling included. */
export async function callApi(
  house: House,
  method: string,
  path: string,
  sent: Sent = {},
): Promise<Response> {
  const url = new URL(path, ownOrigin);
  const headers = new Headers({ origin: house.context.config.http.origin, ...sent.headers });
  if (headers.get('origin') === '') headers.delete('origin');
  if (sent.cookie !== undefined) headers.set('cookie', sent.cookie);
  if (sent.json !== undefined) headers.set('content-type', 'application/json');
  const body = sent.json === undefined ? sent.raw : JSON.stringify(sent.json);
  const request = new Request(url, {
    method,
    headers,
    ...(body === undefined ? {} : { body, duplex: 'half' }),
  });
  const { route, params } = find(url.pathname);
  const handler = route[method] ?? route['ALL'];
  if (handler === undefined) throw new Error(`${path} has no ALL.`);
  const locals: App.Locals = {
    context: house.context,
    actor: await house.context.sessions.readActor(headers.get('cookie')),
    requestId: newId(),
    clientAddress: sent.clientAddress ?? '127.0.0.1',
  };
  return handler({ request, url, params, locals } as unknown as APIContext) as Promise<Response>;
}

function find(pathname: string): { route: Route; params: Record<string, string> } {
  for (const [address, route] of Object.entries(routes)) {
    const pattern = new RegExp(
      `^${address.replaceAll('.', '\\.').replaceAll(/\{(\w+)\}/g, '(?<$1>[^/]+)')}$`,
    );
    const match = pattern.exec(pathname);
    if (match !== null && !address.includes('{path}'))
      return { route, params: { ...match.groups } };
  }
  return { route: routes['/api/{path}']!, params: {} };
}

/** Signs in and returns the Cookie header of the new session. */
export async function signInAs(house: House, email: string, password: string): Promise<string> {
  const response = await callApi(house, 'POST', '/api/v1/session', { json: { email, password } });
  if (response.status !== 204) throw new Error(`Signing in as ${email} gave ${response.status}.`);
  return response.headers.get('set-cookie')!.split(';')[0]!;
}

/** The Cookie header of a session of theirs, begun without a password. */
export async function cookieOf(house: House, actor: Actor): Promise<string> {
  return (await house.context.sessions.begin(actor)).split(';')[0]!;
}
