import type { Request } from 'express';
import { HttpProblem } from './problems.ts';

const READS = new Set(['GET', 'HEAD', 'OPTIONS']);

/**
 * Refuses a write that a browser sends for another site. Browsers say where a request comes from in
 * Sec-Fetch-Site and Origin and let no page forge them; a client that is no browser sends neither, and has no
 * cookies of anybody's to abuse.
 */
export function refuseCrossSite(request: Request, publicUrl: URL): void {
  if (READS.has(request.method)) return;
  const site = request.headers['sec-fetch-site'];
  if (site !== undefined && site !== 'same-origin' && site !== 'none') throw crossSite(`Sec-Fetch-Site: ${String(site)}`);
  const { origin } = request.headers;
  if (origin !== undefined && origin !== publicUrl.origin && hostOf(origin) !== request.headers.host) throw crossSite(`Origin: ${origin}`);
}

const hostOf = (origin: string): string | undefined => URL.parse(origin)?.host;
const crossSite = (evidence: string) => new HttpProblem('cross-site', `A page of another site sent this request (${evidence}).`);
