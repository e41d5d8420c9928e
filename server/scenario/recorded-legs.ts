import { simulateFlight, type FlightSample } from './flight/simulate-flight.ts';
import type { Fault, Pipeline } from './pipelines.ts';
import { unitOutput } from './unit-output.ts';

/** The flight by its legs, and what each unit's output was in them. Simulating it takes about a second: make one and share it. */
export class RecordedLegs {
  readonly #legs = new Map<string, FlightSample[]>();

  constructor() {
    for (const sample of simulateFlight()) {
      const samples = this.#legs.get(sample.leg);
      if (samples) samples.push(sample);
      else this.#legs.set(sample.leg, [sample]);
    }
  }

  samples(leg: string): readonly FlightSample[] {
    const samples = this.#legs.get(leg);
    if (!samples) throw new Error(`The flight has no leg "${leg}".`);
    return samples;
  }

  /** What the pipeline's unit sent: in its stated convention, or in what it really was while a fault lasted. */
  sent({ sends }: Pipeline, samples: readonly FlightSample[], fault: Fault | null): Float64Array {
    return unitOutput(fault?.really.convention ?? sends.convention, fault?.really.resolution ?? sends.resolution, samples);
  }
}
