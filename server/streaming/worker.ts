import { serveThread } from '../threads/serve.ts';
import type { BatchReply, BatchRequest } from './batch-thread.ts';
import { convertBatch } from './batch.ts';
import { whollyOwned } from './owned.ts';
import { StreamedConversion } from './streamed-conversion.ts';

const streams = new Map<string, StreamedConversion>();

serveThread(async (request: BatchRequest): Promise<BatchReply> => {
  switch (request.kind) {
    case 'batch': return convertBatch(request.batch);
    case 'open': {
      streams.set(request.stream, new StreamedConversion(request.opening));
      return null;
    }
    case 'part': return streams.get(request.stream)!.convert(request.bytes, request.last, request.whole);
    case 'close': {
      const warnings = streams.get(request.stream)?.warnings() ?? [];
      streams.delete(request.stream);
      return { warnings };
    }
  }
}, (reply) => (reply && 'output' in reply ? whollyOwned(reply.output) : []));
