import type { z } from 'zod';
import type { Permission } from './roles.ts';

/**
 * One operation of the API. The table of these is the one source of the contract: the server mounts it,
 * openapi.yaml is generated from it, and the console's client types from that.
 */
export interface Endpoint<
  Params extends z.ZodType = z.ZodType,
  Query extends z.ZodType = z.ZodType,
  Body extends z.ZodType = z.ZodType,
  Response extends z.ZodType = z.ZodType,
> {
  readonly id: string;
  readonly method: 'get' | 'post' | 'put' | 'patch' | 'delete';
  /** Below the base path, parameters in braces as in OpenAPI. */
  readonly path: string;
  readonly tag: 'Attitude' | 'Conventions' | 'Runs' | 'Keys' | 'History' | 'Usage' | 'Session' | 'Health';
  readonly summary: string;
  readonly description?: string;
  /** `public` needs nothing; `visitor` takes a session where there is one; `caller` needs an API key or a session; `session` a person signed in to the console. */
  readonly auth: 'public' | 'visitor' | 'caller' | 'session';
  readonly permission?: Permission;
  readonly params?: Params;
  readonly query?: Query;
  readonly body?: Body;
  /** Content types beside JSON in which body and answer may be rows of numbers alone; conventions then stand in the query. */
  readonly rowTypes?: readonly string[];
  readonly status: 200 | 201 | 204;
  /** What the answer holds; absent where it has no body. */
  readonly response?: Response;
  /** Of the answer; JSON when absent. Then `response` is the text itself. */
  readonly contentType?: string;
  readonly problems: readonly number[];
  /**
   * Whether calls by a signed-in person count as API calls and are kept in the history. Calls with an API key,
   * and calls refused for want of one, always are; a console reading its own lists is not.
   */
  readonly recordsSessions?: boolean;
  /** An example body for the documentation, valid for `body`. */
  readonly example?: unknown;
}

export const BASE_PATH = '/api/v1';

/** Declares an endpoint and keeps the types of its schemas. */
export function endpoint<
  Params extends z.ZodType = z.ZodUndefined,
  Query extends z.ZodType = z.ZodUndefined,
  Body extends z.ZodType = z.ZodUndefined,
  Response extends z.ZodType = z.ZodUndefined,
>(declared: Endpoint<Params, Query, Body, Response>): Endpoint<Params, Query, Body, Response> {
  return declared;
}
