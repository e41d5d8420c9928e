import { isUtf8 } from 'node:buffer';
import type { IncomingMessage } from 'node:http';
import express, { type Request, type Response } from 'express';
import { JSON_BODY_BYTES } from '#shared/api/limits.ts';
import { HttpProblem } from './problems.ts';

/** The bytes that a request's JSON was parsed from. */
const bodies = new WeakMap<IncomingMessage, Buffer>();

export const bytesOf = (request: IncomingMessage): Buffer | null => bodies.get(request) ?? null;

const parseJson = express.json({
  limit: JSON_BODY_BYTES,
  strict: false,
  type: () => true,
  verify: (request, _response, bytes) => {
    if (!isUtf8(bytes)) throw new HttpProblem('malformed-json', 'The body is not valid UTF-8.');
    bodies.set(request, bytes);
  },
});

/**
 * The body as JSON. Read only after the caller is known, so that nobody unknown can make the service parse.
 * @throws HttpProblem `unsupported-media-type`, `unsupported-encoding`, `body-too-large`, `malformed-json`.
 */
export async function readJson(request: Request, response: Response): Promise<unknown> {
  const type = request.headers['content-type'];
  if (!request.is(['application/json', 'application/*+json'])) {
    const seen = type === undefined ? 'The request has no content type' : `The content type is "${type}"`;
    throw new HttpProblem('unsupported-media-type', `${seen}; this operation takes application/json.`, [], { Accept: 'application/json' });
  }
  if (request.headers['transfer-encoding'] === undefined && Number(request.headers['content-length'] ?? 0) === 0) throw new HttpProblem('malformed-json', 'The body is empty.');
  await new Promise<void>((resolve, reject) => {
    parseJson(request, response, (error?: unknown) => (error ? reject(asProblem(error)) : resolve()));
  });
  return request.body as unknown;
}

/** What the body parser says, by its documented `type`. */
function asProblem(error: unknown): unknown {
  if (error instanceof HttpProblem) return error;
  const { type, message } = error as { type?: string; message?: string };
  switch (type) {
    case 'entity.too.large': return new HttpProblem('body-too-large', `The body has more than ${JSON_BODY_BYTES} bytes after decompression.`);
    case 'entity.parse.failed': return new HttpProblem('malformed-json', `The body is not valid JSON: ${message ?? 'it ends too early'}. NaN and Infinity are not JSON.`);
    case 'encoding.unsupported': return new HttpProblem('unsupported-encoding', 'The content encoding must be gzip, br, deflate or identity.');
    case 'charset.unsupported': return new HttpProblem('unsupported-media-type', 'The charset must be utf-8.');
    case 'request.aborted':
    case 'request.size.invalid': return new HttpProblem('malformed-request', 'The body ended before its announced length.');
    case 'entity.verify.failed': return new HttpProblem('malformed-json', 'The body is not valid UTF-8.');
    default: return new HttpProblem('malformed-request', 'The body cannot be read or decompressed.');
  }
}
