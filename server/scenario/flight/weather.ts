import type { SeededRandom } from '../random.ts';
import type { Air } from './state.ts';

/** Standard deviations of the gusts on a day with light turbulence, m/s: along, across, vertical. */
const GUSTS = [0.8, 0.8, 0.55] as const;
/** Lengths over which gusts change, m. */
const LENGTHS = [300, 300, 120] as const;
/** Rolling gust: standard deviation in rad/s, and its length in m. */
const ROLLING = { deviation: 0.018, length: 40 };
/** Wind well above the ground, towards north and east, m/s: from the west-north-west. */
const WIND = [-2.2, 6.1] as const;

/**
 * Wind that grows with height, and gusts as first-order filtered noise carried past the aircraft at its airspeed:
 * the longitudinal form of Dryden's model (MIL-HDBK-1797, from memory) for every component.
 */
export class Weather {
  readonly #random: SeededRandom;
  readonly #gust: [number, number, number] = [0, 0, 0];
  #rolling = 0;

  constructor(random: SeededRandom) {
    this.#random = random;
  }

  /** @param turbulence - 1 on the ordinary day; the whole gust scales with it. */
  at(height: number, airspeed: number, turbulence: number, seconds: number): Air {
    const speed = Math.max(airspeed, 8);
    for (let i = 0; i < 3; i++) this.#gust[i] = this.#next(this.#gust[i]!, GUSTS[i]!, LENGTHS[i]! / speed, seconds);
    this.#rolling = this.#next(this.#rolling, ROLLING.deviation, ROLLING.length / speed, seconds);
    const share = 0.45 + 0.55 * (Math.max(0, height) / (Math.max(0, height) + 80));
    const strength = turbulence * Math.min(1, 0.3 + Math.max(0, height) / 60);
    return {
      wind: [WIND[0] * share, WIND[1] * share, 0],
      gust: [this.#gust[0] * strength, this.#gust[1] * strength, this.#gust[2] * strength],
      rollingGust: this.#rolling * strength,
      density: densityAt(height),
    };
  }

  #next(value: number, deviation: number, timeConstant: number, seconds: number): number {
    const share = seconds / timeConstant;
    return value * (1 - share) + deviation * Math.sqrt(2 * share) * this.#random.normal();
  }
}

/**
 * Density of the standard atmosphere in kg/m³ up to some kilometres: 1.225 (1 − 2.2558e-5 h)^4.256 (ISO 2533, from
 * memory), with the exponent 4.25, whose power takes only products and roots; the difference is below 0.1 % at 3 km.
 */
export function densityAt(height: number): number {
  const ratio = 1 - 2.2558e-5 * height;
  return 1.225 * ratio * ratio * ratio * ratio * Math.sqrt(Math.sqrt(ratio));
}
