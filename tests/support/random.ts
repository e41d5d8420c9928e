/**
 * A generator that gives the same doubles on every engine: xorshift128+ on 64-bit integers, no transcendental function.
 * Source: Vigna 2017, "Further scramblings of Marsaglia's xorshift generators", J. Comput. Appl. Math. 315.
 */
export class Random {
  #a: bigint;
  #b: bigint;

  constructor(seed: number) {
    this.#a = BigInt(seed) * 0x9e3779b97f4a7c15n & MASK | 1n;
    this.#b = 0x6a09e667f3bcc909n;
    for (let i = 0; i < 16; i++) this.uniform();
  }

  /** In [0, 1), a multiple of 2^-53. */
  uniform(): number {
    let a = this.#a;
    const b = this.#b;
    this.#a = b;
    a ^= (a << 23n) & MASK;
    this.#b = a ^ b ^ (a >> 18n) ^ (b >> 5n);
    return Number(((this.#b + b) & MASK) >> 11n) * 2 ** -53;
  }

  between(low: number, high: number): number {
    return low + (high - low) * this.uniform();
  }

  sign(): 1 | -1 {
    return this.uniform() < 0.5 ? -1 : 1;
  }

  /** A unit quaternion, uniformly distributed: a point of the ball, divided by its length in double precision. */
  rotation(): [number, number, number, number] {
    for (;;) {
      const q: [number, number, number, number] = [this.between(-1, 1), this.between(-1, 1), this.between(-1, 1), this.between(-1, 1)];
      const square = q[0] * q[0] + q[1] * q[1] + q[2] * q[2] + q[3] * q[3];
      if (square > 1 || square < 1e-4) continue;
      const norm = Math.sqrt(square);
      return [q[0] / norm, q[1] / norm, q[2] / norm, q[3] / norm];
    }
  }

  /** A unit vector, uniformly distributed. */
  direction(): [number, number, number] {
    for (;;) {
      const v: [number, number, number] = [this.between(-1, 1), this.between(-1, 1), this.between(-1, 1)];
      const square = v[0] * v[0] + v[1] * v[1] + v[2] * v[2];
      if (square > 1 || square < 1e-4) continue;
      const norm = Math.sqrt(square);
      return [v[0] / norm, v[1] / norm, v[2] / norm];
    }
  }
}

const MASK = 0xffffffffffffffffn;
