import { parse as parseCookies } from 'cookie';
import type { Endpoint } from '#shared/api/endpoint.ts';
import { RefusedKeyError } from '#server/domain/keys/key-ring.ts';
import { scopeOf } from '#server/domain/caller.ts';
import { resumeSession } from '#server/domain/sessions/sessions.ts';
import type { Services } from '../services.ts';
import type { Call } from './call.ts';
import { HttpProblem, missingKey } from './problems.ts';
import { refuseCrossSite } from './same-site.ts';

/**
 * Finds out who is calling and whether they may. A header that is there decides: a bad key is refused even where
 * a session would do, so that a pipeline never passes by accident on somebody's cookie.
 */
export async function authenticate(services: Services, endpoint: Endpoint, call: Call): Promise<void> {
  const { request } = call;
  const header = request.headers.authorization;
  if (endpoint.auth === 'public') {
    refuseCrossSite(request, services.config.publicUrl);
    return;
  }
  if (endpoint.auth === 'visitor') {
    await resume(services, call);
    return;
  }
  if (header !== undefined) await byKey(services, endpoint, call, header);
  else await bySession(services, endpoint, call);
  if (endpoint.permission) scopeOf(call.caller!, endpoint.permission);
}

async function byKey(services: Services, endpoint: Endpoint, call: Call, header: string): Promise<void> {
  const secret = /^Bearer +(\S+)$/i.exec(header)?.[1];
  if (secret === undefined) throw new HttpProblem('invalid-key', 'The Authorization header must read "Bearer <key>".', [], { 'WWW-Authenticate': 'Bearer realm="dextral"' });
  try {
    call.caller = await services.keyRing.callerOf(secret);
  } catch (error) {
    if (error instanceof RefusedKeyError) call.caller = error.caller;
    throw error;
  }
  if (endpoint.auth === 'session') throw new HttpProblem('not-allowed', 'This operation is for people signed in to the console; an API key cannot do it.');
}

async function bySession(services: Services, endpoint: Endpoint, call: Call): Promise<void> {
  if (!(await resume(services, call))) throw endpoint.auth === 'session' ? new HttpProblem('not-signed-in', 'Nobody is signed in, or the session has ended.') : missingKey();
  refuseCrossSite(call.request, services.config.publicUrl);
}

/** Takes up the session of the request's cookie; false where there is none that is still good. */
async function resume(services: Services, call: Call): Promise<boolean> {
  const token = parseCookies(call.request.headers.cookie ?? '')[services.cookie.name];
  const session = token === undefined ? null : await resumeSession(services, token);
  call.caller = session?.caller ?? null;
  call.person = session?.person ?? null;
  return session !== null;
}
