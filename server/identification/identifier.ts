import type { AttitudeIdentificationInput } from '#shared/attitude/identification/identify-attitudes.ts';
import type { Identification } from '#shared/attitude/identification/identification.ts';
import { WorkerThread } from '../threads/worker-thread.ts';

/** Runs identifications in a thread of its own: a long recording takes a second. */
export class Identifier {
  readonly #thread = new WorkerThread<AttitudeIdentificationInput, Identification>('dist/server/identification-worker.js');

  /** @throws AttitudeError as identifyAttitudes does. */
  identify = (input: AttitudeIdentificationInput): Promise<Identification> => this.#thread.ask(input);
  close = (): Promise<void> => this.#thread.close();
}
