import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { parse } from 'yaml';
import { startTestService, type TestService } from '#tests/support/test-service.ts';

let service: TestService;
beforeAll(async () => {
  service = await startTestService();
});
afterAll(() => service.stop());

describe('what the service shows of itself', () => {
  it('serves the contract', async () => {
    const { text, headers } = await service.call().get('/openapi.yaml').expect(200);
    expect(headers['content-type']).toContain('application/yaml');
    expect(parse(text).openapi).toBe('3.1.0');
  });

  it('serves the reference pages without a line of inline script or style', async () => {
    const { text } = await service.call().get('/docs/').expect(200);
    expect(text).toContain('swagger-ui-init.js');
    expect(text).not.toMatch(/<style|style=|<script>/);
    const init = await service.call().get('/docs/swagger-ui-init.js').expect(200);
    expect(init.text).toContain('/openapi.yaml');
    await service.call().get('/docs/swagger-ui-bundle.js').expect(200);
  });

  it('sets a strict content security policy and names no software', async () => {
    const { headers } = await service.call().get('/api/v1/health').expect(200);
    expect(headers['content-security-policy']).toContain("default-src 'self'");
    expect(headers['content-security-policy']).not.toContain('unsafe');
    expect(headers['x-powered-by']).toBeUndefined();
    expect(headers['cache-control']).toBe('no-store');
  });

  it('says that it is alive, and whether it can write', async () => {
    await service.call().get('/health/live').expect(200, { status: 'live' });
    await service.call().get('/health/ready').expect(200, { status: 'ready' });
    const closing = await startTestService();
    await closing.services.database.writes.close();
    await closing.call().get('/health/live').expect(200);
    await closing.call().get('/health/ready').expect(503, { status: 'not-ready' });
    const refused = await closing.call().get('/api/v1/conventions');
    expect([refused.status, refused.body.code]).toEqual([503, 'not-recorded']);
    await closing.stop();
  });

  it('lists the presets, and one by its id', async () => {
    const { secret } = await service.key('engineer');
    const list = await service.call().get('/api/v1/conventions').set('Authorization', `Bearer ${secret}`).expect(200);
    expect(list.body.items.map(({ id }: { id: string }) => id)).toEqual(expect.arrayContaining(['aircraft-euler-deg', 'aircraft-euler-rad', 'aircraft-euler-rpy-deg', 'aircraft-euler-rpy-rad', 'aircraft-quaternion', 'aircraft-dcm']));
    const one = await service.call().get('/api/v1/conventions/aircraft-dcm').set('Authorization', `Bearer ${secret}`).expect(200);
    expect(one.body).toMatchObject({ convention: { representation: 'dcm', maps: 'reference-to-body', layout: 'row-major' }, standard: null, interfaces: [] });
    const none = await service.call().get('/api/v1/conventions/none').set('Authorization', `Bearer ${secret}`);
    expect([none.status, none.body.code]).toEqual([404, 'not-found']);
  });
});
