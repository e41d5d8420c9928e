import { z } from 'zod';
import { person } from './common.ts';
import { endpoint } from './endpoint.ts';

const signedIn = z.strictObject({ person }).meta({ id: 'SignedIn' });

export const signInInput = z.strictObject({
  email: z.string().min(1).max(254),
  password: z.string().min(1).max(1024),
}).meta({ id: 'SignInInput' });

export const signInEndpoint = endpoint({
  id: 'signIn', method: 'post', path: '/sessions', tag: 'Session', summary: 'Sign in; the session is kept in a cookie',
  auth: 'public', body: signInInput, status: 201, response: signedIn, problems: [400, 401, 403, 413, 415, 422, 429, 503],
});

export const currentSessionEndpoint = endpoint({
  id: 'currentSession', method: 'get', path: '/sessions/current', tag: 'Session', summary: 'Who is signed in, if anybody',
  auth: 'visitor', status: 200, response: z.strictObject({ person: person.nullable() }), problems: [],
});

export const signOutEndpoint = endpoint({
  id: 'signOut', method: 'delete', path: '/sessions/current', tag: 'Session', summary: 'Sign out',
  auth: 'session', status: 204, problems: [401, 403, 429, 503],
});
