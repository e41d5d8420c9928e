import type { CookieOptions } from 'express';

/** How the session cookie is set: with the `__Host-` prefix wherever the console is reached through https. */
export interface SessionCookie {
  readonly name: string;
  readonly options: CookieOptions;
}

export function sessionCookie(publicUrl: URL): SessionCookie {
  const secure = publicUrl.protocol === 'https:';
  return {
    name: secure ? '__Host-dextral' : 'dextral',
    options: { httpOnly: true, sameSite: 'lax', secure, path: '/' },
  };
}
