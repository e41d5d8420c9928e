import type { IncomingMessage, ServerResponse } from 'node:http';
import type { Readable } from 'node:stream';
import zlib from 'node:zlib';
import { HttpProblem } from '../problems.ts';

/** The caller went away before its body was complete. */
export class BrokenOffError extends Error {
  override readonly name = 'BrokenOffError';
}

/** A body may unpack to this much in any case … */
const UNPACKED_FREELY = 8 * 1024 * 1024;
/** … and beyond that to so many times its size: recorded attitudes shrink to a half or a third, a bomb to a thousandth. */
const UNPACKED_TIMES = 100;
const CHUNK = 64 * 1024;
/** How long a refused caller may take to read the answer before it is cut off in mid-body. */
const LINGER_MS = 2_000;

type Unpacker = Readable & NodeJS.WritableStream & { readonly bytesWritten: number };

/**
 * The body, decompressed, in parts of at least `first` bytes, later `then`, but for the last. Nothing is read ahead of who takes the parts.
 * @throws HttpProblem `unsupported-encoding`, `body-too-large` for what unpacks out of all proportion, `malformed-request`; BrokenOffError.
 */
export async function* bodyParts(request: IncomingMessage, first: number, then = first): AsyncGenerator<{ bytes: Uint8Array; last: boolean }> {
  const unpacker = unpackerOf(request);
  const source: Readable = unpacker ? piped(request, unpacker) : request;
  let chunks: Buffer[] = [];
  let gathered = 0;
  let total = 0;
  let size = first;
  let held: Buffer | null = null;
  try {
    for await (const chunk of source.iterator({ destroyOnReturn: false }) as AsyncIterable<Buffer>) {
      if (held) yield { bytes: held, last: false };
      held = null;
      chunks.push(chunk);
      gathered += chunk.length;
      total += chunk.length;
      if (unpacker && total > UNPACKED_FREELY && total > UNPACKED_TIMES * unpacker.bytesWritten) {
        throw new HttpProblem('body-too-large', `The body unpacks to more than ${UNPACKED_TIMES} times its size, as no recording does.`);
      }
      if (gathered < size) continue;
      held = Buffer.concat(chunks);
      size = then;
      chunks = [];
      gathered = 0;
    }
  } catch (error) {
    throw asProblem(error, request);
  } finally {
    if (unpacker) request.unpipe(unpacker);
    unpacker?.destroy();
  }
  if (!request.complete) throw new BrokenOffError('The body ended before its announced length.');
  if (held) yield { bytes: held, last: true };
  else yield { bytes: Buffer.concat(chunks), last: true };
}

/** The whole body, decompressed. @throws as bodyParts, and HttpProblem `body-too-large` as soon as there is more than `most`. */
export async function wholeBody(request: IncomingMessage, most: number): Promise<Buffer> {
  const tooLarge = () => new HttpProblem('body-too-large', `The body has more than ${most} bytes after decompression.`);
  if (Number(request.headers['content-length'] ?? 0) > most) throw tooLarge();
  const parts: Uint8Array[] = [];
  let total = 0;
  for await (const { bytes } of bodyParts(request, CHUNK)) {
    total += bytes.length;
    if (total > most) throw tooLarge();
    parts.push(bytes);
  }
  return Buffer.concat(parts);
}

/** Where a call is answered before its body was read: whatever still comes is thrown away, and the connection ended if it goes on coming. */
export function leaveBody(request: IncomingMessage, response: ServerResponse): void {
  if (request.complete) return;
  if (!response.headersSent) response.setHeader('Connection', 'close');
  request.resume();
  response.once('finish', () => setTimeout(() => {
    if (!request.complete) request.socket.destroy();
  }, LINGER_MS).unref());
}

function unpackerOf(request: IncomingMessage): Unpacker | null {
  const encoding = (request.headers['content-encoding'] ?? 'identity').trim().toLowerCase();
  switch (encoding) {
    case 'identity': return null;
    case 'gzip': case 'x-gzip': return zlib.createGunzip({ chunkSize: CHUNK });
    case 'deflate': return zlib.createInflate({ chunkSize: CHUNK });
    case 'br': return zlib.createBrotliDecompress({ chunkSize: CHUNK });
    default: throw new HttpProblem('unsupported-encoding', 'The content encoding must be gzip, br, deflate or identity.');
  }
}

function piped(request: IncomingMessage, unpacker: Unpacker): Unpacker {
  request.once('error', (error) => unpacker.destroy(error));
  request.once('close', () => {
    if (!request.complete) unpacker.destroy(new BrokenOffError('The connection was closed.'));
  });
  return request.pipe(unpacker);
}

function asProblem(error: unknown, request: IncomingMessage): unknown {
  if (error instanceof HttpProblem) return error;
  const { code = '' } = error as { code?: string };
  if (code.startsWith('Z_') || code.startsWith('ERR_') && code.includes('BROTLI') || code.startsWith('ERR__ERROR')) return new HttpProblem('malformed-request', 'The body cannot be decompressed: it is not what Content-Encoding says, or it ends too early.');
  return request.complete ? error : new BrokenOffError('The connection was closed before the body was complete.');
}
