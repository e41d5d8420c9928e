import http from 'node:http';
import type { AddressInfo } from 'node:net';
import type { TestService } from '#tests/support/test-service.ts';

export interface Answer {
  readonly status: number;
  readonly headers: http.IncomingHttpHeaders;
  readonly trailers: Record<string, string | undefined>;
  readonly bytes: Buffer;
  readonly text: string;
}

/** A real socket, since streaming both ways, trailers and back-pressure exist on nothing less. */
export async function listen(service: TestService) {
  const server = http.createServer(service.app);
  await new Promise<void>((resolve) => { server.listen(0, '127.0.0.1', resolve); });
  const { port } = server.address() as AddressInfo;
  return {
    port,
    open: (path: string, headers: http.OutgoingHttpHeaders) => http.request({ port, host: '127.0.0.1', path, method: 'POST', headers, agent: false }),
    post(path: string, headers: http.OutgoingHttpHeaders, body: Uint8Array | string): Promise<Answer> {
      const request = http.request({ port, host: '127.0.0.1', path, method: 'POST', headers, agent: false });
      const answer = answerOf(request);
      request.end(body);
      return answer;
    },
    stop: () => new Promise<void>((resolve) => {
      server.close(() => { resolve(); });
      server.closeAllConnections();
    }),
  };
}

export function answerOf(request: http.ClientRequest): Promise<Answer> {
  return new Promise((resolve, reject) => {
    request.on('error', reject);
    request.on('response', (response) => {
      const chunks: Buffer[] = [];
      response.on('data', (chunk: Buffer) => chunks.push(chunk));
      response.on('error', reject);
      response.on('end', () => {
        const bytes = Buffer.concat(chunks);
        resolve({ status: response.statusCode!, headers: response.headers, trailers: response.trailers, bytes, text: bytes.toString('utf8') });
      });
    });
  });
}
