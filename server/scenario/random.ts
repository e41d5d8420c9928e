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

  /** Standard normal, by the sum of twelve uniforms: close enough for weather. */
  normal(): number {
    let sum = -6;
    for (let i = 0; i < 12; i++) sum += this.next();
    return sum;
  }
}
