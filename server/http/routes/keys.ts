import type { Router } from 'express';
import { issueKeyEndpoint, listKeysEndpoint, revokeKeyEndpoint } from '#shared/api/keys.ts';
import { issueKey, listKeys, revokeKey } from '#server/domain/keys/keys.ts';
import type { Services } from '#server/services.ts';
import { mount } from '../mount.ts';

export function keyRoutes(services: Services, router: Router): void {
  mount(services, router, listKeysEndpoint)(async ({ caller }) => ({ items: await listKeys(services, caller) }));
  mount(services, router, issueKeyEndpoint)(({ caller, body }) => issueKey(services, caller, body));
  mount(services, router, revokeKeyEndpoint)(async ({ params }) => ({ key: await revokeKey(services, params.id) }));
}
