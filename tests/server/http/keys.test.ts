import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { startTestService, type TestService } from '#tests/support/test-service.ts';

let service: TestService;
beforeAll(async () => {
  service = await startTestService();
});
afterAll(() => service.stop());

const BODY = { from: { preset: 'aircraft-euler-deg' }, to: { preset: 'aircraft-quaternion' }, attitudes: [[1, 2, 3]] };
const convertWith = (secret: string) => service.call().post('/api/v1/convert').set('Authorization', `Bearer ${secret}`).send(BODY);

describe('API keys', () => {
  it('are issued by an administrator, shown once, used, revoked at once', async () => {
    const administrator = await service.signedIn('administrator');
    const issued = await administrator.post('/api/v1/keys').send({ name: 'Nightly', role: 'engineer', expiresAt: null }).expect(201);
    const { key, secret } = issued.body;
    expect(secret.startsWith(`${key.prefix}_`)).toBe(true);

    await convertWith(secret).expect(200);
    const listed = await administrator.get('/api/v1/keys').expect(200);
    const row = listed.body.items.find(({ id }: { id: string }) => id === key.id);
    expect(row.lastUsedAt).toBe(new Date(service.time.now).toISOString());
    expect(JSON.stringify(listed.body)).not.toContain(secret);

    await administrator.post(`/api/v1/keys/${key.id}/revoke`).expect(200);
    const refused = await convertWith(secret);
    expect([refused.status, refused.body.code]).toEqual([401, 'revoked-key']);
    const again = await administrator.post(`/api/v1/keys/${key.id}/revoke`);
    expect([again.status, again.body.code]).toEqual([409, 'already-revoked']);
  });

  it('are stored hashed only', async () => {
    const { secret } = await service.key('engineer');
    const rows = await service.services.database.sequelize.query('SELECT * FROM api_keys');
    expect(JSON.stringify(rows)).not.toContain(secret.slice(-38));
  });

  it('stop working when they expire', async () => {
    const expiresAt = new Date(service.time.now + 1000).toISOString();
    const { secret } = await service.key('engineer', expiresAt);
    await convertWith(secret).expect(200);
    service.time.now += 1000;
    const refused = await convertWith(secret);
    expect([refused.status, refused.body.code]).toEqual([401, 'expired-key']);
  });

  it.each([
    ['no key', undefined, 'missing-key'],
    ['a key of a wrong shape', 'Bearer abc', 'invalid-key'],
    ['a key nobody issued, its check characters wrong', `Bearer dxt_${'a'.repeat(8)}_${'b'.repeat(38)}`, 'invalid-key'],
    ['another scheme', 'Basic abc', 'invalid-key'],
  ])('refuses %s with 401 and says how to authenticate', async (_what, header, code) => {
    const call = service.call().post('/api/v1/convert');
    if (header !== undefined) call.set('Authorization', header);
    const { status, body, headers } = await call.send(BODY);
    expect([status, body.code]).toEqual([401, code]);
    expect(headers['www-authenticate']).toContain('Bearer');
  });

  it('refuses a right key with one character changed', async () => {
    const { secret } = await service.key('engineer');
    const changed = secret.slice(0, 20) + (secret[20] === 'x' ? 'y' : 'x') + secret.slice(21);
    expect((await convertWith(changed)).body.code).toBe('invalid-key');
  });

  it('cannot be issued by an engineer, nor with a key', async () => {
    const engineer = await service.signedIn('engineer');
    const refused = await engineer.post('/api/v1/keys').send({ name: 'Mine', role: 'administrator', expiresAt: null });
    expect([refused.status, refused.body.code]).toEqual([403, 'not-allowed']);
    const { secret } = await service.key('administrator');
    const byKey = await service.call().post('/api/v1/keys').set('Authorization', `Bearer ${secret}`).send({ name: 'Mine', role: 'engineer', expiresAt: null });
    expect([byKey.status, byKey.body.code]).toEqual([403, 'not-allowed']);
  });

  it('of a reviewer compute nothing', async () => {
    const { secret } = await service.key('reviewer');
    const refused = await convertWith(secret);
    expect([refused.status, refused.body.code]).toEqual([403, 'not-allowed']);
  });

  it('show an engineer their own only', async () => {
    await service.key('integrator');
    const { key } = await service.key('engineer');
    const { body } = await (await service.signedIn('engineer')).get('/api/v1/keys').expect(200);
    expect(body.items.map(({ id }: { id: string }) => id)).toContain(key.id);
    expect(body.items.every(({ role }: { role: string }) => role === 'engineer')).toBe(true);
  });

  it('must expire in the future and have a name', async () => {
    const administrator = await service.signedIn('administrator');
    const past = await administrator.post('/api/v1/keys').send({ name: 'Old', role: 'engineer', expiresAt: '2020-01-01T00:00:00Z' });
    expect([past.status, past.body.errors[0].pointer]).toEqual([422, '/expiresAt']);
    const nameless = await administrator.post('/api/v1/keys').send({ name: '  ', role: 'engineer', expiresAt: null });
    expect([nameless.status, nameless.body.errors[0]]).toEqual([422, { pointer: '/name', message: 'is "  "; it must not be empty' }]);
  });
});
