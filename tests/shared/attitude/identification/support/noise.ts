/** Mulberry32 (Tommy Ettinger, public domain): fast, and the same on every engine. */
export class Noise {
  #state: number;

  constructor(seed: number) {
    this.#state = seed >>> 0;
  }

  uniform(): number {
    this.#state = (this.#state + 0x6d2b79f5) >>> 0;
    let t = this.#state;
    t = Math.imul(t ^ (t >>> 15), t | 1);
    t ^= t + Math.imul(t ^ (t >>> 7), t | 61);
    return ((t ^ (t >>> 14)) >>> 0) / 4294967296;
  }

  between = (low: number, high: number): number => low + (high - low) * this.uniform();
  pick = <T>(choices: readonly T[]): T => choices[Math.floor(this.uniform() * choices.length)]!;
  integer = (low: number, high: number): number => low + Math.floor(this.uniform() * (high - low + 1));
  /** Standard normal, by Box and Muller. */
  normal = (): number => Math.sqrt(-2 * Math.log(1 - this.uniform())) * Math.cos(2 * Math.PI * this.uniform());
  /** A unit vector. */
  axis(): [number, number, number] {
    const v = [this.normal(), this.normal(), this.normal()];
    const norm = Math.hypot(...v);
    return v.map((entry) => entry / norm) as [number, number, number];
  }
}
