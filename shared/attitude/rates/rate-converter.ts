import { betweenBodies, handedness, type SignedPermutation } from '../axes.ts';
import { COSINE } from '../arithmetic/slots.ts';
import { scratch } from '../arithmetic/scratch.ts';
import { NUMBERS_PER_ATTITUDE, type Convention, type DcmConvention, type EulerConvention, type QuaternionConvention } from '../convention.ts';
import { createConverter } from '../converter.ts';
import { AttitudeError } from '../errors.ts';
import { LOCKED, NOT_REPRESENTABLE, REFUSED } from '../kernels/status.ts';
import { pipelineBetween } from '../pipeline.ts';
import { determinantOf, relabellingBetween } from '../relabelling.ts';
import { refuseOutOfRange } from '../refuse-out-of-range.ts';
import { WarningTally } from '../warning-tally.ts';
import type { AttitudeWarning } from '../warnings.ts';
import { fromMatrixRate, fromQuaternionRate, fromReference, toMatrixRate, toQuaternionRate, toReference, type BodyRates } from './body-rates.ts';
import { angleRatesOfBody, bodyOfAngleRates, intrinsicAxes, turningAxes, type TurningAxes } from './euler-rates.ts';
import { NUMBERS_PER_RATE, rateFits, type Rate, type RateUnit } from './rate.ts';

export interface ConvertedRates {
  /** count × width numbers; NaN where an Euler rate does not exist, at gimbal lock. */
  readonly rates: Float64Array;
  /** κ of the Euler angles in play, 1 where there are none; Infinity at lock. */
  readonly conditions: Float64Array;
}

/** Turns rates of one form into another, each at its attitude. Indices go on over successive calls, as in Converter. */
export interface RateConverter {
  readonly inputWidth: number;
  readonly outputWidth: number;
  /** @throws AttitudeError for attitudes or rates that cannot be used. */
  convert(attitudes: Float64Array, rates: Float64Array): ConvertedRates;
  warnings(): AttitudeWarning[];
}

const DEG = Math.PI / 180;
const perSecond = (unit: RateUnit): number => (unit === 'deg/s' ? DEG : 1);

/**
 * Rates between sets of axes are those of vee(C Ċᵀ) of the component matrix as it stands, whatever its handedness.
 * Accuracy: plain double precision on correctly rounded attitudes: a few units in the last place of |ω|, times κ for
 * Euler rates near lock. No operation differs between engines.
 * @throws AttitudeError `invalid-convention` where a rate needs numbers that the attitude does not have, and as createConverter.
 */
export function createRateConverter(attitude: Convention, from: Rate, to: Rate): RateConverter {
  for (const rate of [from, to]) {
    if (!rateFits(attitude, rate)) throw new AttitudeError('invalid-convention', `A "${rate.rate}" rate is the derivative of the attitude's own numbers, and the attitude is given as "${attitude.representation}".`);
  }
  const components = componentsConvention(attitude);
  const matrices = createConverter(attitude, components);
  const determinant = determinantOf(attitude);
  const tally = new WarningTally(1);
  const width = NUMBERS_PER_ATTITUDE[attitude.representation];
  const inputWidth = NUMBERS_PER_RATE[from.rate];
  const outputWidth = NUMBERS_PER_RATE[to.rate];
  const fromAngles = from.rate === 'euler' ? anglesAt(attitude, from.angles) : null;
  const toAngles = to.rate === 'euler' ? anglesAt(attitude, to.angles) : null;
  let converted = 0;

  function convert(attitudes: Float64Array, rates: Float64Array): ConvertedRates {
    const count = attitudes.length / width;
    if (rates.length !== count * inputWidth) throw new AttitudeError('count-mismatch', `${rates.length} numbers are not ${count} rates of ${inputWidth} numbers each.`);
    refuseOutOfRange(rates, inputWidth, 'Rate', converted);
    const c = matrices.convert(attitudes);
    const out = new Float64Array(count * outputWidth);
    const conditions = new Float64Array(count).fill(1);
    for (let i = 0; i < count; i++) {
      const matrix = c.subarray(9 * i, 9 * i + 9);
      const read = fromAngles?.(attitudes, i * width);
      const omega = omegaOf(from, read ?? null, matrix, attitudes, i * width, rates, i * inputWidth);
      const written = toAngles?.(attitudes, i * width);
      write(to, written ?? null, matrix, attitudes, i * width, omega, out, i * outputWidth);
      const angles = written ?? read;
      if (angles) {
        conditions[i] = angles.axes.cosine === 0 ? Infinity : 1 / angles.axes.cosine;
        tally.lock(converted + i, angles.axes.cosine, angles.axes.cosine === 0, angles.convention, angles.listed, angles.middle);
      }
    }
    // Nobody means −0.
    for (let k = 0; k < out.length; k++) out[k]! += 0;
    converted += count;
    return { rates: out, conditions };
  }

  function omegaOf(rate: Rate, angles: AnglesAt | null, c: Float64Array, attitudes: Float64Array, at: number, rates: Float64Array, rAt: number): BodyRates {
    switch (rate.rate) {
      case 'body': return [0, 1, 2].map((k) => rates[rAt + k]! * perSecond(rate.unit)) as BodyRates;
      case 'reference': return fromReference(c, [0, 1, 2].map((k) => rates[rAt + k]! * perSecond(rate.unit)) as BodyRates, determinant);
      case 'quaternion': return fromQuaternionRate(attitude as QuaternionConvention, attitudes, at, rates, rAt);
      case 'dcm': return fromMatrixRate(attitude as DcmConvention, c, rates, rAt);
      case 'euler': {
        const scale = perSecond(rate.unit);
        const listed = [0, 1, 2].map((k) => rates[rAt + k]! * scale);
        return angles!.toAttitude(bodyOfAngleRates(angles!.axes, angles!.intrinsicOf(listed)));
      }
    }
  }

  function write(rate: Rate, angles: AnglesAt | null, c: Float64Array, attitudes: Float64Array, at: number, omega: BodyRates, out: Float64Array, oAt: number): void {
    switch (rate.rate) {
      case 'body': return out.set(omega.map((component) => component / perSecond(rate.unit)), oAt);
      case 'reference': return out.set(toReference(c, omega, determinant).map((component) => component / perSecond(rate.unit)), oAt);
      case 'quaternion': return toQuaternionRate(attitude as QuaternionConvention, attitudes, at, omega, out, oAt);
      case 'dcm': return toMatrixRate(attitude as DcmConvention, c, omega, out, oAt);
      case 'euler': return out.set(angles!.listedOf(angleRatesOfBody(angles!.axes, angles!.fromAttitude(omega))).map((component) => component / perSecond(rate.unit)), oAt);
    }
  }

  return { inputWidth, outputWidth, convert, warnings: () => [...matrices.warnings(), ...tally.warnings()] };
}

const componentsConvention = ({ reference, body }: Convention): DcmConvention => ({ representation: 'dcm', reference, body, maps: 'reference-to-body', layout: 'row-major' });

/** The angles of one attitude, ready for rates. */
interface AnglesAt {
  readonly convention: EulerConvention;
  readonly axes: TurningAxes;
  readonly listed: readonly [number, number, number];
  readonly middle: number;
  /** Angular velocity between the attitude's body axes and the angles' own. */
  fromAttitude(omega: BodyRates): BodyRates;
  toAttitude(omega: BodyRates): BodyRates;
  /** Rates as listed and in the intrinsic order applied. */
  intrinsicOf(listed: readonly number[]): [number, number, number];
  listedOf(intrinsic: readonly number[]): number[];
}

function anglesAt(attitude: Convention, angles: EulerConvention): (attitudes: Float64Array, at: number) => AnglesAt {
  relabellingBetween(attitude, angles);
  const bodies = betweenBodies(attitude.body, angles.body);
  const sense = handedness(bodies);
  const own = attitude.representation === 'euler' && JSON.stringify({ ...attitude, range: 0 }) === JSON.stringify({ ...angles, range: 0 });
  const { read, write } = pipelineBetween(attitude, angles, 'none');
  const { read: readMatrix, write: writeMatrix } = pipelineBetween(attitude, componentsConvention(angles), 'none');
  const intrinsic = intrinsicAxes(angles);
  const matrix = new Float64Array(9);
  const listed = new Float64Array(3);
  const { order, signs, motion, unit } = angles;
  /** intrinsic place → place in the list, and sign. */
  const places = [1, 2, 3].map((turn) => {
    const applied = motion === 'extrinsic' ? 4 - turn : turn;
    return { at: order.indexOf(applied as 1 | 2 | 3), sign: signs[applied - 1]! };
  });

  return (attitudes, at) => {
    if (readMatrix(attitudes, at) === REFUSED || writeMatrix(matrix, 0) === NOT_REPRESENTABLE) throw new AttitudeError('not-a-rotation', 'An attitude cannot be used.');
    let locked = false;
    let cosine: number | null = null;
    if (own) listed.set(attitudes.subarray(at, at + 3));
    else {
      read(attitudes, at);
      locked = write(listed, 0) === LOCKED;
      cosine = scratch[COSINE]!;
    }
    const angleAt = (place: number): number => listed[places[place]!.at]! * places[place]!.sign;
    const axes = turningAxes(matrix, intrinsic, angleAt(1), angleAt(2), unit);
    return {
      convention: angles,
      axes: { ...axes, cosine: locked ? 0 : (cosine ?? axes.cosine) },
      listed: [listed[0]!, listed[1]!, listed[2]!],
      middle: angleAt(1),
      fromAttitude: (omega) => relabel(bodies, sense, omega),
      toAttitude: (omega) => relabelBack(bodies, sense, omega),
      intrinsicOf: (rates) => places.map((place) => rates[place.at]! * place.sign) as [number, number, number],
      listedOf: (rates) => {
        const out = [0, 0, 0];
        places.forEach((place, k) => { out[place.at] = rates[k]! * place.sign; });
        return out;
      },
    };
  };
}

/** ω' = det(P) P ω: an angular velocity changes axes as an axial vector. */
const relabel = ({ column, sign }: SignedPermutation, sense: number, omega: BodyRates): BodyRates => [0, 1, 2].map((i) => sense * sign[i]! * omega[column[i]!]!) as BodyRates;

function relabelBack({ column, sign }: SignedPermutation, sense: number, omega: BodyRates): BodyRates {
  const out: BodyRates = [0, 0, 0];
  for (let i = 0; i < 3; i++) out[column[i]!] = sense * sign[i]! * omega[i]!;
  return out;
}
