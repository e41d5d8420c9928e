import { describe, expect, it } from 'vitest';
import { SEQUENCES, type Convention, type EulerConvention } from '#shared/attitude/convention.ts';
import { createConverter } from '#shared/attitude/converter.ts';
import { BigNumber } from '#server/cross-check/big-number.ts';
import { meaningOf, numbersOf, relabelled } from '#server/cross-check/exact-conversion.ts';
import { ExactAttitude } from '#tests/support/exact/attitude.ts';
import { fixedPointOf, Measure } from '#tests/support/exact/measure.ts';
import { CONVENTIONS, type ConventionName } from '#tests/support/named-conventions.ts';
import { Random } from '#tests/support/random.ts';
import { REGIMES } from '#tests/support/regimes.ts';

const names = Object.keys(CONVENTIONS) as ConventionName[];
const COMPUTED = names.flatMap((from) => names.map((to) => [from, to] as const)).filter(([from, to]) => from !== to || !(from === 'dcm' || from.startsWith('quaternion')));
/** What may come out: angle errors in radians, by what the numbers are. */
const ANGLE_BOUND: Partial<Record<Convention['representation'], number>> = { quaternion: 2.2e-16, dcm: 2.2e-16, euler: 5e-16 };

function measured(from: Convention, to: Convention, regime: (typeof REGIMES)[number], count: number, seed: number): Measure {
  const random = new Random(seed);
  const measure = new Measure(regime.bits);
  for (let i = 0; i < count; i++) {
    const numbers = regime.numbers(from, random);
    if (!numbers) break;
    const converter = createConverter(from, to, { repair: 'nearest' });
    const answer = Array.from(converter.convert(Float64Array.from(numbers)));
    const locked = converter.warnings().some(({ code }) => code === 'gimbal-lock');
    measure.add(from, to, numbers, answer, { components: !locked, angle: true });
  }
  return measure;
}

describe('every component is the double nearest to the exact result', () => {
  for (const regime of REGIMES) {
    // Exact arithmetic of 2400 bits takes its time.
    const count = regime.bits > 1000 ? 1 : 12;
    // So near lock, angles of attitudes that come through a rounded quaternion lose what 106 bits have to spare.
    const nearLock = regime.name.includes('1e-13');
    it(`in the regime "${regime.name}"`, () => {
      for (const [from, to] of COMPUTED) {
        // A Gibbs vector near a half turn is as badly conditioned as an angle near lock.
        if (to === 'gibbs' && regime.name === 'near a half turn') continue;
        const { components, correctlyRounded, cancelled, worstUlp, worstCancelled, worstAngle, example } = measured(CONVENTIONS[from], CONVENTIONS[to], regime, count, names.indexOf(from) * 10 + names.indexOf(to) + 1);
        const what = `${from} → ${to}: ${JSON.stringify(example)}`;
        if (nearLock) expect(worstUlp, what).toBeLessThan(0.6);
        else expect(correctlyRounded + cancelled, what).toBe(components);
        expect(worstCancelled, what).toBeLessThan(1e-22);
        expect(worstAngle, what).toBeLessThan(ANGLE_BOUND[CONVENTIONS[to].representation] ?? 3.5e-16);
      }
    }, 60_000);
  }

  it('for every sequence, motion and sign of Euler angles, both ways', () => {
    const random = new Random(77);
    let seed = 1000;
    for (const sequence of SEQUENCES) {
      for (const motion of ['intrinsic', 'extrinsic'] as const) {
        const euler: EulerConvention = { ...CONVENTIONS['euler rad'], sequence, motion, unit: random.sign() > 0 ? 'deg' : 'rad', order: [3, 1, 2], signs: [random.sign(), random.sign(), random.sign()], range: 'positive', reference: 'ENU', body: 'FLU' };
        for (const other of [CONVENTIONS.quaternion, CONVENTIONS.dcm, CONVENTIONS['euler deg'], CONVENTIONS['rotation vector']]) {
          for (const [from, to] of [[euler, other], [other, euler]] as const) {
            const { components, correctlyRounded, example } = measured(from, to, REGIMES[0]!, 6, seed++);
            expect(correctlyRounded, `${sequence} ${motion} ${JSON.stringify(example)}`).toBe(components);
          }
        }
      }
    }
  }, 60_000);

  it.each([7999, 1e6, 1e15, 1e22, 1e100, 1e300])('for rotations of %d rad and degrees', (size) => {
    const random = new Random(3);
    const measure = new Measure(2400);
    for (const unit of ['rad', 'deg'] as const) {
      for (const to of [CONVENTIONS.quaternion, CONVENTIONS['rotation vector']]) {
        const vector: Convention = { ...CONVENTIONS['rotation vector'], unit };
        const turn = random.direction().map((component) => component * size);
        measure.add(vector, to, turn, Array.from(createConverter(vector, to).convert(Float64Array.from(turn))));
        const axisAngle: Convention = { ...CONVENTIONS['axis-angle'], unit };
        const about = [...random.direction(), -size];
        measure.add(axisAngle, to, about, Array.from(createConverter(axisAngle, to).convert(Float64Array.from(about))));
        const euler: Convention = { ...CONVENTIONS['euler rad'], unit };
        measure.add(euler, to, turn, Array.from(createConverter(euler, to).convert(Float64Array.from(turn))));
      }
    }
    expect(measure.correctlyRounded, JSON.stringify(measure.example)).toBe(measure.components);
  });

  it('by mathjs at 64 digits too, whose code is another', () => {
    for (const [from, to] of COMPUTED) {
      if (CONVENTIONS[from].representation === 'dcm') continue; // the polar factor at 64 digits has its own test
      const random = new Random(names.indexOf(from) + 20 * names.indexOf(to) + 5);
      for (let i = 0; i < 2; i++) {
        const numbers = REGIMES[0]!.numbers(CONVENTIONS[from], random)!;
        const answer = Array.from(createConverter(CONVENTIONS[from], CONVENTIONS[to]).convert(Float64Array.from(numbers)));
        const wanted = numbersOf(CONVENTIONS[to], relabelled(meaningOf(CONVENTIONS[from], numbers), CONVENTIONS[from], CONVENTIONS[to]))!.map((value) => value.toNumber());
        answer.forEach((component, k) => {
          const difference = CONVENTIONS[to].representation === 'euler' ? (component - wanted[k]!) % 360 : component - wanted[k]!;
          expect(difference, `${from} → ${to} ${numbers.join()}`).toBe(0);
        });
      }
    }
  }, 60_000);
});

describe('FixedPoint, the exact arithmetic of these checks', () => {
  const f = fixedPointOf(300);
  const decimal = (x: bigint): BigNumber => new BigNumber(x.toString()).div(new BigNumber(2).pow(300));
  const agrees = (got: bigint, wanted: BigNumber) => expect(decimal(got).minus(wanted).abs().lt('1e-60'), `${decimal(got)} ${wanted}`).toBe(true);

  it('agrees with mathjs at 60 digits', () => {
    agrees(f.pi, BigNumber.acos(-1));
    for (const x of [0.1, 1, -2.5, 3.14, 7, -0.001]) {
      const exactly = decimal(f.of(x));
      agrees(f.sinCos(f.of(x))[0], BigNumber.sin(exactly));
      agrees(f.sinCos(f.of(x))[1], BigNumber.cos(exactly));
      for (const y of [0.3, -4, 0]) agrees(f.atan2(f.of(x), f.of(y)), BigNumber.atan2(exactly, decimal(f.of(y))));
      if (x > 0) agrees(f.sqrt(f.of(x)), BigNumber.sqrt(exactly));
    }
  });

  it('rounds to the nearest double, ties to even', () => {
    for (const x of [0.1, -5e-20, 1 + 2 ** -52, 2 ** -200]) expect(f.toDouble(f.of(x))).toBe(x);
    expect(f.toDouble(f.one + (f.one >> 53n))).toBe(1);
    expect(f.toDouble(f.one + (f.one >> 53n) + 1n)).toBe(1 + 2 ** -52);
    expect(f.toDouble(f.one + 3n * (f.one >> 53n))).toBe(1 + 2 ** -51);
  });

  it('knows a rotation by its definition', () => {
    const exact = new ExactAttitude(f);
    expect(exact.convert(CONVENTIONS['euler deg'], CONVENTIONS.dcm, [90, 0, 0])!.map((x) => f.toDouble(x))).toEqual([0, 1, 0, -1, 0, 0, 0, 0, 1].map((x) => expect.closeTo(x, 15)));
  });
});
