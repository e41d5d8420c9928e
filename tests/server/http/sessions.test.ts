import { createSecretKey } from 'node:crypto';
import jwt from 'jsonwebtoken';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { PASSWORD, startTestService, type TestService } from '#tests/support/test-service.ts';

let service: TestService;
beforeAll(async () => {
  service = await startTestService();
});
afterAll(() => service.stop());

const signIn = (email: string, password: string) => service.call().post('/api/v1/sessions').send({ email, password });

describe('sessions', () => {
  it('begin with the right password, in an HttpOnly SameSite cookie', async () => {
    const { body, headers } = await signIn('administrator@sallowtern.example', PASSWORD).expect(201);
    expect(body.person).toMatchObject({ email: 'administrator@sallowtern.example', role: 'administrator' });
    expect(headers['set-cookie']?.[0]).toMatch(/^dextral=.*; Max-Age=43200; Path=\/; Expires=.*; HttpOnly; SameSite=Lax$/);
    expect(JSON.stringify(body)).not.toContain('password');
  });

  it('say the same of an unknown address and a wrong password', async () => {
    const unknown = await signIn('nobody@sallowtern.example', PASSWORD);
    const wrong = await signIn('engineer@sallowtern.example', 'wrong');
    expect([unknown.status, unknown.body.code, unknown.body.detail]).toEqual([wrong.status, wrong.body.code, wrong.body.detail]);
    expect(unknown.status).toBe(401);
  });

  it('tell a visitor that nobody is signed in', async () => {
    expect((await service.call().get('/api/v1/sessions/current').expect(200)).body).toEqual({ person: null });
  });

  it('end on signing out, also for a copy of the cookie', async () => {
    const { headers } = await signIn('engineer@sallowtern.example', PASSWORD);
    const cookie = headers['set-cookie']![0]!.split(';')[0]!;
    await service.call().get('/api/v1/history').set('Cookie', cookie).expect(200);
    await service.call().delete('/api/v1/sessions/current').set('Cookie', cookie).expect(204);
    const refused = await service.call().get('/api/v1/keys').set('Cookie', cookie);
    expect([refused.status, refused.body.code]).toEqual([401, 'not-signed-in']);
  });

  it('end by themselves after twelve hours', async () => {
    const agent = await service.signedIn('engineer');
    service.time.now += 12 * 3600 * 1000 + 1000;
    expect((await agent.get('/api/v1/sessions/current')).body.person).toBeNull();
  });

  it.each([
    ['signed with another secret', (claims: object) => jwt.sign(claims, createSecretKey(Buffer.from('x'.repeat(40))), { algorithm: 'HS256' })],
    ['not signed at all', (claims: object) => jwt.sign(claims, '', { algorithm: 'none' })],
    ['for another audience', (claims: object) => jwt.sign({ ...claims, aud: 'elsewhere' }, service.services.config.sessionSecret, { algorithm: 'HS256' })],
  ])('are not opened by a token %s', async (_what, forge) => {
    const personId = service.people.get('administrator')!;
    const sessionId = 'made-up';
    const token = forge({ sub: personId, sid: sessionId, iss: 'dextral', aud: 'dextral-console', exp: Math.floor(service.time.now / 1000) + 3600 });
    const { body } = await service.call().get('/api/v1/sessions/current').set('Cookie', `dextral=${token}`);
    expect(body.person).toBeNull();
  });

  it.each([['Origin', 'https://elsewhere.example'], ['Sec-Fetch-Site', 'cross-site']])('refuse a write whose %s is another site', async (header, value) => {
    const agent = await service.signedIn('administrator');
    const { status, body } = await agent.post('/api/v1/keys').set(header, value).send({ name: 'Forged', role: 'administrator', expiresAt: null });
    expect([status, body.code]).toEqual([403, 'cross-site']);
  });
});
