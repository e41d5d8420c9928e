import type { Router } from 'express';
import { currentSessionEndpoint, signInEndpoint, signOutEndpoint } from '#shared/api/sessions.ts';
import { signIn, signOut } from '#server/domain/sessions/sessions.ts';
import type { Services } from '#server/services.ts';
import { mount } from '../mount.ts';

export function sessionRoutes(services: Services, router: Router): void {
  const { cookie } = services;
  mount(services, router, signInEndpoint)(async ({ body, call }) => {
    const { person, token, expiresAt } = await signIn(services, body, call.request.headers['user-agent'] ?? 'unknown');
    call.response.cookie(cookie.name, token, { ...cookie.options, maxAge: expiresAt - services.clock() });
    return { person };
  });
  mount(services, router, currentSessionEndpoint)(({ call }) => ({ person: call.person }));
  mount(services, router, signOutEndpoint)(async ({ caller, call }) => {
    await signOut(services, caller.sessionId!);
    call.response.clearCookie(cookie.name, cookie.options);
    return undefined;
  });
}
