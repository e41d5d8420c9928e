import { z } from 'zod';
import { endpoint } from './endpoint.ts';

export const healthEndpoint = endpoint({
  id: 'health', method: 'get', path: '/health', tag: 'Health', summary: 'Whether the service answers and can write',
  auth: 'public', status: 200, response: z.strictObject({ status: z.literal('ok'), engine: z.string() }), problems: [503],
});
