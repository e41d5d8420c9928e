import type { AttitudeIdentificationInput } from '#shared/attitude/identification/identify-attitudes.ts';
import type { Identification } from '#shared/attitude/identification/identification.ts';
import type { RateIdentificationInput } from '#shared/attitude/identification/rates/identify-rates.ts';
import type { RateIdentification } from '#shared/attitude/identification/rates/rate-identification.ts';
import { WorkerThread } from '../threads/worker-thread.ts';

export type IdentificationRequest = { readonly attitudes: AttitudeIdentificationInput } | { readonly rates: RateIdentificationInput };

/** Runs identifications in a thread of its own: a long recording takes a second. */
export class Identifier {
  readonly #thread = new WorkerThread<IdentificationRequest, Identification | RateIdentification>('dist/server/identification-worker.js');

  /** @throws AttitudeError as identifyAttitudes does. */
  identify = (attitudes: AttitudeIdentificationInput): Promise<Identification> => this.#thread.ask({ attitudes }) as Promise<Identification>;
  /** @throws AttitudeError as identifyRates does. */
  identifyRates = (rates: RateIdentificationInput): Promise<RateIdentification> => this.#thread.ask({ rates }) as Promise<RateIdentification>;
  close = (): Promise<void> => this.#thread.close();
}
