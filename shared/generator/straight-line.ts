/**
 * Writes double-double formulas out as straight-line TypeScript.
 *
 * V8 boxes a double that crosses a call, and inlines only so much: a kernel of forty small calls allocates and takes
 * microseconds. So the kernels are stated here in terms of pairs (x = hi + lo, unevaluated) and flattened into one
 * function body each, sharing every common subexpression: above all the two halves of Dekker's splitting.
 *
 * The rules are those of the functions in shared/attitude/arithmetic (same formulas, same order). A pair is not
 * renormalised after each step; the low part stays within a few units of 2^-53 of the high one unless terms cancel,
 * and then the absolute error stays at about 2^-104 of the terms.
 * Source of the pair rules: Lange & Rump 2020, ACM TOMS 46(3), "Faithfully rounded floating-point computations".
 */

/** A name or a literal of the generated code. */
export type Scalar = string;

/** x = hi + lo. `lo` is ZERO where x is a double. */
export interface Pair {
  readonly hi: Scalar;
  readonly lo: Scalar;
}

export const ZERO: Scalar = '0';
/** 2^27 + 1, Dekker's splitting constant. */
const SPLITTER = '134217729';

export class StraightLine {
  readonly #nameOf = new Map<string, Scalar>();
  readonly #lines: { name: Scalar; expression: string; uses: readonly Scalar[] }[] = [];
  readonly #effects: { text: (name: (scalar: Scalar) => Scalar) => string; uses: readonly Scalar[] }[] = [];
  readonly #prefix: string;

  /** @param prefix - what the names of intermediate results begin with, so that two blocks can share one function. */
  constructor(prefix = 't') {
    this.#prefix = prefix;
  }

  // Doubles -----------------------------------------------------------------------------------------------------

  add(a: Scalar, b: Scalar): Scalar {
    if (a === ZERO) return b;
    if (b === ZERO) return a;
    return this.let(a < b ? `${a} + ${b}` : `${b} + ${a}`, a, b);
  }

  sub(a: Scalar, b: Scalar): Scalar {
    return b === ZERO ? a : a === ZERO ? this.let(`-${b}`, b) : this.let(`${a} - ${b}`, a, b);
  }

  mul(a: Scalar, b: Scalar): Scalar {
    if (a === ZERO || b === ZERO) return ZERO;
    if (a === '1') return b;
    if (b === '1') return a;
    return this.let(a < b ? `${a} * ${b}` : `${b} * ${a}`, a, b);
  }

  div(a: Scalar, b: Scalar): Scalar {
    return this.let(`${a} / ${b}`, a, b);
  }

  sqrt(a: Scalar): Scalar {
    return this.let(`Math.sqrt(${a})`, a);
  }

  /** a literal; negative ones are bracketed so that they may stand anywhere. */
  literal(value: number): Scalar {
    return value < 0 || Object.is(value, -0) ? `(${value})` : String(value);
  }

  /** Any expression over the given names. */
  let(expression: string, ...uses: readonly Scalar[]): Scalar {
    const known = this.#nameOf.get(expression);
    if (known !== undefined) return known;
    const name = `${this.#prefix}${this.#lines.length}`;
    this.#nameOf.set(expression, name);
    this.#lines.push({ name, expression, uses });
    return name;
  }

  // Error-free transformations -----------------------------------------------------------------------------------

  /** a + b exactly. Knuth. */
  twoSum(a: Scalar, b: Scalar): Pair {
    if (a === ZERO) return { hi: b, lo: ZERO };
    if (b === ZERO) return { hi: a, lo: ZERO };
    const s = this.add(a, b);
    const bb = this.sub(s, a);
    return { hi: s, lo: this.add(this.sub(a, this.sub(s, bb)), this.sub(b, bb)) };
  }

  twoDifference(a: Scalar, b: Scalar): Pair {
    if (b === ZERO) return { hi: a, lo: ZERO };
    if (a === ZERO) return { hi: this.sub(ZERO, b), lo: ZERO };
    const s = this.sub(a, b);
    const bb = this.sub(s, a);
    return { hi: s, lo: this.sub(this.sub(a, this.sub(s, bb)), this.add(b, bb)) };
  }

  /** a + b exactly where |a| >= |b| or a = 0. Dekker. */
  fastTwoSum(a: Scalar, b: Scalar): Pair {
    if (b === ZERO) return { hi: a, lo: ZERO };
    const s = this.add(a, b);
    return { hi: s, lo: this.sub(b, this.sub(s, a)) };
  }

  #split(a: Scalar): readonly [Scalar, Scalar] {
    const value = Number(a.replace(/[()]/g, ''));
    if (!Number.isNaN(value)) {
      const c = Number(SPLITTER) * value;
      const high = c - (c - value);
      return [this.literal(high), this.literal(value - high)];
    }
    const c = this.mul(SPLITTER, a);
    const high = this.sub(c, this.sub(c, a));
    return [high, this.sub(a, high)];
  }

  /** a b exactly. Dekker's splitting (Veltkamp), 26 bits and 26 bits. */
  twoProduct(a: Scalar, b: Scalar): Pair {
    if (a === ZERO || b === ZERO) return { hi: ZERO, lo: ZERO };
    const p = this.mul(a, b);
    const [ah, al] = this.#split(a);
    if (a === b) {
      const cross = this.mul(ah, al);
      return { hi: p, lo: this.add(this.add(this.sub(this.mul(ah, ah), p), this.add(cross, cross)), this.mul(al, al)) };
    }
    const [bh, bl] = this.#split(b);
    return { hi: p, lo: this.add(this.add(this.sub(this.mul(ah, bh), p), this.add(this.mul(ah, bl), this.mul(al, bh))), this.mul(al, bl)) };
  }

  // Pairs ---------------------------------------------------------------------------------------------------------

  exact(a: Scalar): Pair {
    return { hi: a, lo: ZERO };
  }

  constant([hi, lo]: readonly [number, number]): Pair {
    return { hi: this.literal(hi), lo: lo === 0 ? ZERO : this.literal(lo) };
  }

  plus(x: Pair, y: Pair): Pair {
    const s = this.twoSum(x.hi, y.hi);
    return { hi: s.hi, lo: this.add(s.lo, this.add(x.lo, y.lo)) };
  }

  minus(x: Pair, y: Pair): Pair {
    const s = this.twoDifference(x.hi, y.hi);
    return { hi: s.hi, lo: this.add(s.lo, this.sub(x.lo, y.lo)) };
  }

  /** x y, less lo × lo. */
  times(x: Pair, y: Pair): Pair {
    const p = this.twoProduct(x.hi, y.hi);
    return { hi: p.hi, lo: this.add(p.lo, this.add(this.mul(x.hi, y.lo), this.mul(x.lo, y.hi))) };
  }

  square(x: Pair): Pair {
    const p = this.twoProduct(x.hi, x.hi);
    const cross = this.mul(x.hi, x.lo);
    return { hi: p.hi, lo: this.add(p.lo, this.add(cross, cross)) };
  }

  /** x times a power of two, exactly. */
  scale(x: Pair, power: number): Pair {
    const factor = this.literal(power);
    return { hi: this.mul(x.hi, factor), lo: this.mul(x.lo, factor) };
  }

  negative(x: Pair): Pair {
    return { hi: this.sub(ZERO, x.hi), lo: x.lo === ZERO ? ZERO : this.sub(ZERO, x.lo) };
  }

  /** x / y by one correction of the quotient of the high parts. */
  over(x: Pair, y: Pair): Pair {
    const q = this.div(x.hi, y.hi);
    const p = this.twoProduct(q, y.hi);
    const rest = this.sub(this.add(this.sub(this.sub(x.hi, p.hi), p.lo), x.lo), this.mul(q, y.lo));
    return { hi: q, lo: this.div(rest, y.hi) };
  }

  /** √x by one correction of the root of the high part; √0 = 0. */
  root(x: Pair): Pair {
    const s = this.sqrt(x.hi);
    const p = this.twoProduct(s, s);
    const rest = this.add(this.sub(this.sub(x.hi, p.hi), p.lo), x.lo);
    return { hi: s, lo: this.let(`${s} > 0 ? ${rest} / (${s} + ${s}) : 0`, s, rest) };
  }

  /** The same value with hi = the double nearest to it. */
  normalised(x: Pair): Pair {
    return this.twoSum(x.hi, x.lo);
  }

  /** The double nearest to x; never −0. */
  rounded(x: Pair): Scalar {
    return this.let(`${this.add(x.hi, x.lo)} + 0`, this.add(x.hi, x.lo));
  }

  // Memory ----------------------------------------------------------------------------------------------------------

  /** The double stored at `place`, read once. */
  load(place: string): Scalar {
    return this.let(`${place}!`);
  }

  /** The pair that the scratch holds at `slot` and the place after it. */
  loadPair(slot: number): Pair {
    return { hi: this.load(`S[${slot}]`), lo: this.load(`S[${slot + 1}]`) };
  }

  store(place: string, value: Scalar): void {
    this.#effects.push({ text: (name) => `${place} = ${name(value)};`, uses: [value] });
  }

  /** Returns a value after every store. */
  answer(value: Scalar): void {
    this.#effects.push({ text: (name) => `return ${name(value)};`, uses: [value] });
  }

  storePair(slot: number, { hi, lo }: Pair): void {
    this.store(`S[${slot}]`, hi);
    this.store(`S[${slot + 1}]`, lo);
  }

  /** The lines of the block; what no store needs is left out. Every load comes before every store. */
  text(indent = '  '): string {
    const alive = new Set<Scalar>(this.#effects.flatMap(({ uses }) => uses));
    const kept = this.#lines.toReversed().filter(({ name, uses }) => {
      if (!alive.has(name)) return false;
      for (const use of uses) alive.add(use);
      return true;
    }).toReversed();
    const renamed = new Map(kept.map(({ name }, i) => [name, `${this.#prefix}${i}`]));
    const rename = (text: string): string => text.replace(new RegExp(`\\b${this.#prefix}\\d+\\b`, 'g'), (name) => renamed.get(name) ?? name);
    return [
      ...kept.map(({ name, expression }) => `const ${rename(name)} = ${rename(expression)};`),
      ...this.#effects.map(({ text }) => text(rename)),
    ].map((line) => indent + line).join('\n');
  }
}
