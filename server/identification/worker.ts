import { identifyAttitudes } from '#shared/attitude/identification/identify-attitudes.ts';
import { serveThread } from '../threads/serve.ts';

serveThread(identifyAttitudes);
