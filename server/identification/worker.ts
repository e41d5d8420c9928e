import { identifyAttitudes } from '#shared/attitude/identification/identify-attitudes.ts';
import { identifyRates } from '#shared/attitude/identification/rates/identify-rates.ts';
import { serveThread } from '../threads/serve.ts';
import type { IdentificationRequest } from './identifier.ts';

serveThread((request: IdentificationRequest) => ('attitudes' in request ? identifyAttitudes(request.attitudes) : identifyRates(request.rates)));
