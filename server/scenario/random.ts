/** A small generator of our own, so that the scenario is the same on every machine. Source: Marsaglia 2003, xorshift32. */
export class SeededRandom {
  #state: number;

  constructor(seed: number) {
    this.#state = seed | 0 || 1;
  }

  /** In [0, 1). */
  next(): number {
    this.#state ^= this.#state << 13;
    this.#state ^= this.#state >>> 17;
    this.#state ^= this.#state << 5;
    return (this.#state >>> 0) / 4_294_967_296;
  }

  between(low: number, high: number): number {
    return low + (high - low) * this.next();
  }

  chance(probability: number): boolean {
    return this.next() < probability;
  }

  pick<T>(choices: readonly T[]): T {
    return choices[Math.floor(this.next() * choices.length)]!;
  }

  /** Of mean 0 and variance 1, bell-shaped, never beyond ±2√3: the sum of four uniforms, close enough for weather. */
  normal(): number {
    return (this.next() + this.next() + this.next() + this.next() - 2) * 1.7320508075688772;
  }
}
