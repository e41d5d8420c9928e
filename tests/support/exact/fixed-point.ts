/**
 * Arithmetic on integers that stand for multiples of 2^-bits: as exact as one cares to make it, and quick enough to
 * check hundreds of thousands of answers. Checked itself against mathjs' BigNumber in fixed-point.test.ts.
 */
export class FixedPoint {
  readonly bits: bigint;
  readonly one: bigint;
  readonly pi: bigint;

  constructor(bits: number) {
    this.bits = BigInt(bits);
    this.one = 1n << this.bits;
    this.pi = this.#pi();
  }

  mul = (a: bigint, b: bigint): bigint => (a * b) >> this.bits;
  div = (a: bigint, b: bigint): bigint => (a << this.bits) / b;
  square = (a: bigint): bigint => (a * a) >> this.bits;

  /** The value of a double; what lies below the last bit is cut off. */
  of(value: number): bigint {
    const view = new DataView(new ArrayBuffer(8));
    view.setFloat64(0, value);
    const pattern = view.getBigUint64(0);
    const exponent = Number((pattern >> 52n) & 0x7ffn);
    const fraction = pattern & 0xfffffffffffffn;
    const mantissa = exponent === 0 ? fraction : fraction | 0x10000000000000n;
    const shift = BigInt(Math.max(exponent, 1) - 1075) + this.bits;
    const size = shift >= 0n ? mantissa << shift : mantissa >> -shift;
    return pattern >> 63n ? -size : size;
  }

  /** The double nearest to a value, ties to even. */
  toDouble(value: bigint): number {
    if (value < 0n) return -this.toDouble(-value);
    // No double is finer than 2^-1074.
    const least = Number(this.bits) - 1074;
    const excess = Math.max(length(value) - 53, least, 0);
    if (excess === 0) return Number(value) * 2 ** -Number(this.bits);
    const shift = BigInt(excess);
    let kept = value >> shift;
    const rest = value - (kept << shift);
    const half = 1n << (shift - 1n);
    if (rest > half || (rest === half && kept % 2n === 1n)) kept++;
    // In two steps, since either power alone may be out of range.
    const power = excess - Number(this.bits);
    return Number(kept) * 2 ** Math.max(power, -1022) * 2 ** Math.min(0, power + 1022);
  }

  sqrt(value: bigint): bigint {
    if (value <= 0n) return 0n;
    const radicand = value << this.bits;
    let guess = 1n << BigInt((length(radicand) >> 1) + 1);
    for (;;) {
      const next = (guess + radicand / guess) >> 1n;
      if (next >= guess) return guess;
      guess = next;
    }
  }

  /** [sin, cos] of any angle in radians. */
  sinCos(angle: bigint): readonly [bigint, bigint] {
    const right = this.pi / 2n;
    const turns = floorDivide(angle + right / 2n, right);
    // Reduced once more by 2^-8, so that the series are short; then doubled back.
    const reduced = (angle - turns * right) >> 8n;
    const square = this.square(reduced);
    let term = reduced;
    let sine = 0n;
    for (let k = 2n; term !== 0n && term !== -1n; k += 2n) {
      sine += term;
      term = -this.mul(term, square) / (k * (k + 1n));
    }
    // 1 − cos, which loses nothing when doubled: 1 − cos 2x = 2 v (2 − v) with v = 1 − cos x.
    let versine = 0n;
    term = square / 2n;
    for (let k = 3n; term !== 0n && term !== -1n; k += 2n) {
      versine += term;
      term = -this.mul(term, square) / (k * (k + 1n));
    }
    for (let i = 0; i < 8; i++) {
      sine = 2n * this.mul(sine, this.one - versine);
      versine = 2n * this.mul(versine, 2n * this.one - versine);
    }
    const cosine = this.one - versine;
    switch (((turns % 4n) + 4n) % 4n) {
      case 0n: return [sine, cosine];
      case 1n: return [cosine, -sine];
      case 2n: return [-sine, -cosine];
      default: return [-cosine, sine];
    }
  }

  /** The angle of (x, y) in (−π, π]. */
  atan2(y: bigint, x: bigint): bigint {
    const [ay, ax] = [y < 0n ? -y : y, x < 0n ? -x : x];
    if (ay === 0n) return x < 0n ? this.pi : 0n;
    const first = ay <= ax ? this.#atan(this.div(ay, ax)) : this.pi / 2n - this.#atan(this.div(ax, ay));
    const upper = x < 0n ? this.pi - first : first;
    return y < 0n ? -upper : upper;
  }

  /** For 0 ≤ t ≤ 1: halved four times, then by its series. */
  #atan(t: bigint): bigint {
    let reduced = t;
    for (let i = 0; i < 4; i++) reduced = this.div(reduced, this.one + this.sqrt(this.one + this.square(reduced)));
    const square = this.square(reduced);
    let power = reduced;
    let sum = 0n;
    for (let k = 1n; power !== 0n; k += 2n) {
      sum += k % 4n === 1n ? power / k : -power / k;
      power = this.mul(power, square);
    }
    return sum << 4n;
  }

  /** Gauss, Legendre, Brent, Salamin: the arithmetic-geometric mean, which the tables do not use. */
  #pi(): bigint {
    const guard = 64n;
    const one = this.one << guard;
    const bits = this.bits + guard;
    const root = (value: bigint): bigint => {
      const radicand = value << bits;
      let guess = 1n << BigInt((length(radicand) >> 1) + 1);
      for (;;) {
        const next = (guess + radicand / guess) >> 1n;
        if (next >= guess) return guess;
        guess = next;
      }
    };
    let [a, b, t, p] = [one, root(one / 2n), one / 4n, 1n];
    while (a - b > 4n) {
      const mean = (a + b) / 2n;
      b = root((a * b) >> bits);
      t -= p * (((a - mean) * (a - mean)) >> bits);
      p *= 2n;
      a = mean;
    }
    return ((((a + b) * (a + b)) / (4n * t)) >> guard);
  }
}

function length(value: bigint): number {
  const text = value.toString(16);
  return 4 * (text.length - 1) + (32 - Math.clz32(Number.parseInt(text[0]!, 16)));
}

function floorDivide(a: bigint, b: bigint): bigint {
  const quotient = a / b;
  return a % b < 0n ? quotient - 1n : quotient;
}
