import { randomUUID } from 'node:crypto';
import type { PersonRow } from '#server/db/models/person.ts';
import type { PeopleRepository } from '#server/db/repositories/people.ts';
import type { SessionsRepository } from '#server/db/repositories/sessions.ts';
import type { Caller } from '../caller.ts';
import type { Clock } from '../clock.ts';
import { DomainError } from '../errors.ts';
import { matchNobody, passwordMatches } from '../people/password.ts';
import type { SessionTokens } from './session-tokens.ts';

export const SESSION_LASTS_MS = 12 * 3600 * 1000;

export interface SessionsContext {
  readonly people: PeopleRepository;
  readonly sessions: SessionsRepository;
  readonly tokens: SessionTokens;
  readonly clock: Clock;
}

export interface PersonDocument {
  readonly id: string;
  readonly name: string;
  readonly email: string;
  readonly role: PersonRow['role'];
}

export const presentPerson = ({ id, name, email, role }: PersonRow): PersonDocument => ({ id, name, email, role });

/** @throws DomainError `wrong-credentials`, the same for an unknown address, a wrong password and a deactivated person. */
export async function signIn(
  context: SessionsContext, credentials: { email: string; password: string }, device: string,
): Promise<{ person: PersonDocument; token: string; expiresAt: number }> {
  const person = await context.people.byEmail(credentials.email);
  const matches = person ? await passwordMatches(person.passwordHash, credentials.password) : await matchNobody(credentials.password);
  if (!person || !matches || person.deactivatedAt !== null) {
    throw new DomainError('wrong-credentials', 'No active account has this e-mail address and password.');
  }
  const now = context.clock();
  const expiresAt = now + SESSION_LASTS_MS;
  const sessionId = randomUUID();
  await context.sessions.insert({ id: sessionId, personId: person.id, createdAt: now, expiresAt, lastSeenAt: now, revokedAt: null, device: device.slice(0, 200) });
  return { person: presentPerson(person), token: context.tokens.sign({ personId: person.id, sessionId }, expiresAt), expiresAt };
}

/** The person behind a session token, and the caller they are; null where the session is no longer good. */
export async function resumeSession(context: SessionsContext, token: string): Promise<{ person: PersonDocument; caller: Caller } | null> {
  const now = context.clock();
  const claims = context.tokens.read(token, now);
  if (!claims) return null;
  const [session, person] = await Promise.all([context.sessions.byId(claims.sessionId), context.people.byId(claims.personId)]);
  if (!session || session.revokedAt !== null || session.expiresAt <= now || session.personId !== claims.personId) return null;
  if (!person || person.deactivatedAt !== null) return null;
  return {
    person: presentPerson(person),
    caller: { kind: 'session', role: person.role, ownerId: person.id, keyId: null, personId: person.id, sessionId: session.id, keyLimits: null },
  };
}

export async function signOut(context: SessionsContext, sessionId: string): Promise<void> {
  await context.sessions.revoke(sessionId, context.clock());
}
