import type { Router } from 'express';
import type { z } from 'zod';
import { BASE_PATH, type Endpoint } from '#shared/api/endpoint.ts';
import { PROBLEMS } from '#shared/api/problems.ts';
import type { Caller } from '#server/domain/caller.ts';
import type { Meter } from '#server/domain/meter.ts';
import type { Services } from '../services.ts';
import { admit, type Admission } from './admit.ts';
import { authenticate } from './authenticate.ts';
import { openCall, type Call } from './call.ts';
import { explainIssues } from './explain-issues.ts';
import { problemOf, sendProblem } from './problems.ts';
import { bytesOf, readJson } from './read-body.ts';
import { record } from './record.ts';
import { isStream, sendStream } from './send-stream.ts';

/** What a handler gets: everything parsed, the caller known. */
export interface Input<E extends Endpoint> {
  readonly params: Output<E['params']>;
  readonly query: Output<E['query']>;
  readonly body: Output<E['body']>;
  readonly caller: E['auth'] extends 'public' | 'visitor' ? Caller | null : Caller;
  readonly meter: Meter;
  readonly call: Call;
}

type Output<S> = NonNullable<S> extends z.ZodType ? z.output<NonNullable<S>> : undefined;
type Answer<E extends Endpoint> = E['status'] extends 204 ? undefined : Output<E['response']> | (Output<E['response']> extends string ? AsyncIterable<string> : never);

/**
 * Mounts an endpoint of the contract. A request goes one way: caller → parsed input → handler → record → answer.
 * The record is committed before the answer leaves, refused calls included.
 */
export function mount<E extends Endpoint>(services: Services, router: Router, endpoint: E) {
  const route = BASE_PATH + endpoint.path;
  return (handler: (input: Input<E>) => Answer<E> | Promise<Answer<E>>): void => {
    router[endpoint.method](endpoint.path.replaceAll(/\{(\w+)\}/g, ':$1'), async (request, response) => {
      const call = openCall(request, response, services.clock());
      let admission: Admission | null = null;
      let answered = false;
      try {
        await authenticate(services, endpoint, call);
        admission = await admit(services, call);
        const input = await parseInput(endpoint, call);
        const answer = await handler(input as Input<E>);
        const { contentType } = endpoint;
        const text = answer === undefined || isStream(answer) ? undefined : contentType === undefined ? JSON.stringify(answer) : String(answer);
        if (recorded(endpoint, call)) await record(services, call, route, endpoint.status, null);
        answered = true;
        response.status(endpoint.status);
        if (isStream(answer)) await sendStream(response.type(contentType!), answer, { logger: services.logger, requestId: call.id });
        else if (text === undefined) response.end();
        else response.type(contentType ?? 'application/json').send(text);
      } catch (error) {
        await refuse(services, call, route, error);
      } finally {
        admission?.leave(answered);
      }
    });
  };
}

/** Answers a call with a problem document, and records it first wherever that can be done. */
export async function refuse(services: Services, call: Call, route: string, error: unknown): Promise<void> {
  let problem = problemOf(error);
  if (PROBLEMS[problem.code].status === 500) services.logger.error({ err: error, requestId: call.id, route }, 'call failed');
  if (problem.code !== 'not-recorded') {
    try {
      await record(services, call, route, PROBLEMS[problem.code].status, problem.code);
    } catch (recordError) {
      services.logger.error({ err: recordError, requestId: call.id, route }, 'call could not be recorded');
      problem = problemOf(recordError);
    }
  }
  sendProblem(call.response, problem, `/requests/${call.id}`);
}

/** A console reading its own lists is no API call; everything with a key is, and so is computing. */
function recorded(endpoint: Endpoint, call: Call): boolean {
  return endpoint.auth !== 'public' && endpoint.auth !== 'visitor' && (call.caller?.kind === 'key' || endpoint.recordsSessions === true);
}

async function parseInput(endpoint: Endpoint, call: Call) {
  const { request, response, caller, meter } = call;
  const params = parse(endpoint.params, request.params, 'path');
  const query = parse(endpoint.query, { ...request.query }, 'query');
  // Computing calls carry numbers and conventions; what other calls carry may be a password.
  call.bodyMayBeKept = endpoint.permission === 'attitude.compute';
  const json = endpoint.body ? await readJson(request, response).finally(() => { call.body = bytesOf(request); }) : undefined;
  const body = parse(endpoint.body, json, 'body');
  return { params, query, body, caller, meter, call };
}

function parse(schema: z.ZodType | undefined, value: unknown, where: 'path' | 'query' | 'body'): unknown {
  if (!schema) return undefined;
  const result = schema.safeParse(value);
  if (result.success) return result.data;
  throw explainIssues(result.error, value, where);
}
