import { createSecretKey } from 'node:crypto';
import { mkdtemp, rm } from 'node:fs/promises';
import os from 'node:os';
import path from 'node:path';
import pino from 'pino';
import request from 'supertest';
import type { Role } from '#shared/api/roles.ts';
import type { Config } from '#server/config.ts';
import { issueKey } from '#server/domain/keys/keys.ts';
import { createPerson } from '#server/domain/people/create-person.ts';
import { createApp } from '#server/http/app.ts';
import { createServices } from '#server/services.ts';

export const PASSWORD = 'correct horse battery';

/** A whole service on a database file of its own, with a clock that tests can move, and nothing listening. */
export async function startTestService() {
  const dataDirectory = await mkdtemp(path.join(os.tmpdir(), 'dextral-test-'));
  const time = { now: Date.parse('2026-03-02T10:00:00Z') };
  const config: Config = {
    host: '127.0.0.1', port: 0, dataDirectory, publicUrl: new URL('http://127.0.0.1:8787'), demo: false, firstAdministrator: null,
    sessionSecret: createSecretKey(Buffer.from('a secret for tests only, 32 bytes or more')),
  };
  const services = await createServices({ config, logger: pino({ level: 'silent' }), clock: () => time.now });
  const app = createApp(services);

  const people = new Map<Role, string>();
  for (const role of ['administrator', 'integrator', 'engineer', 'reviewer'] as const) {
    people.set(role, await createPerson(services, { email: `${role}@sallowtern.example`, name: `A ${role}`, role, password: PASSWORD }));
  }

  return {
    app, services, time, people,
    /** A key of a role, owned by the person of that role. */
    async key(role: Role, expiresAt: string | null = null) {
      const ownerId = people.get(role)!;
      return issueKey(services, { kind: 'session', role: 'administrator', ownerId, keyId: null, personId: ownerId, sessionId: null, keyLimits: null }, { name: `${role} key`, role, expiresAt });
    },
    /** An agent that keeps the cookies of somebody signed in. */
    async signedIn(role: Role) {
      const agent = request.agent(app);
      await agent.post('/api/v1/sessions').send({ email: `${role}@sallowtern.example`, password: PASSWORD }).expect(201);
      return agent;
    },
    call: () => request(app),
    async stop() {
      await services.close();
      await rm(dataDirectory, { recursive: true, force: true });
    },
  };
}

export type TestService = Awaited<ReturnType<typeof startTestService>>;
