import type { Express } from 'express';
import type { Services } from '../services.ts';

/** For whoever keeps the service running: alive, and able to do its work. Neither says anything of what is inside. */
export function mountHealth(app: Express, services: Services): void {
  app.get('/health/live', (_request, response) => {
    response.set('Cache-Control', 'no-store').json({ status: 'live' });
  });
  app.get('/health/ready', async (_request, response) => {
    response.set('Cache-Control', 'no-store');
    try {
      await services.database.writes.run(async () => undefined);
      response.json({ status: 'ready' });
    } catch (error) {
      services.logger.error({ err: error }, 'not ready');
      response.status(503).json({ status: 'not-ready' });
    }
  });
}
