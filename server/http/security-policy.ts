import type { HelmetOptions } from 'helmet';

/** Everything from this origin, nothing inline, nothing from elsewhere. */
export function contentSecurityPolicy(publicUrl: URL): NonNullable<HelmetOptions['contentSecurityPolicy']> {
  return {
    useDefaults: false,
    directives: {
      defaultSrc: ["'self'"],
      imgSrc: ["'self'", 'data:'],
      objectSrc: ["'none'"],
      baseUri: ["'none'"],
      formAction: ["'self'"],
      frameAncestors: ["'none'"],
      ...(publicUrl.protocol === 'https:' ? { upgradeInsecureRequests: [] } : {}),
    },
  };
}
