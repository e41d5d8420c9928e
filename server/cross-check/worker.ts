import { serveThread } from '../threads/serve.ts';
import { crossCheck } from './cross-check.ts';

serveThread(crossCheck);
