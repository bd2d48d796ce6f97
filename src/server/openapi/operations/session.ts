import { signIn } from '~/domain/access/account';
import { me } from '~/domain/access/member';
import { operation } from '../../http/operation';

export const sessionOperations = {
  signIn: operation({
    id: 'signIn',
    method: 'POST',
    path: '/api/v1/session',
    tag: 'People',
    summary: 'Sign in: begins a new session and sets its cookie',
    access: 'anybody',
    limit: 'session',
    body: signIn,
    answers: [
      {
        status: 204,
        description: 'Signed in.',
        headers: { 'Set-Cookie': 'The session: HttpOnly, SameSite=Lax, Secure where TLS is on.' },
      },
    ],
    problems: [401, 429],
  }),
  signOut: operation({
    id: 'signOut',
    method: 'DELETE',
    path: '/api/v1/session',
    tag: 'People',
    summary: 'Sign out: ends the session of the cookie',
    access: 'anybody',
    answers: [{ status: 204, description: 'Signed out.' }],
  }),
  readMe: operation({
    id: 'readMe',
    method: 'GET',
    path: '/api/v1/me',
    tag: 'People',
    summary: 'Who is signed in, and where',
    access: 'member',
    answers: [{ status: 200, description: 'The member.', schema: me }],
  }),
};
