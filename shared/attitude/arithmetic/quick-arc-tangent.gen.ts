// Written by shared/generator/write.ts from shared/generator/kernels/quick-arc-tangent.ts. Do not edit.
import { ARCS_DEGREES, ARCS_RADIANS, SENSE } from './arc-table.ts';
import { scratch } from './scratch.ts';

/**
 * The angle of (x, y) in radians, quickly: within 2^-70, absolute, for a point known to 2^-74 of its distance.
 *
 * @param at - slot of y head, tail, x head, tail; heads have 26 bits and x and y are not both 0.
 * @param to - slot of the angle, hi and lo.
 */
export function quickArcTangentRadians(at: number, to: number): void {
  const S = scratch;
  const T = ARCS_RADIANS;
  const yh = S[at]!;
  const xh = S[at + 2]!;
  // A head may have cancelled to 0: the tail has the sign then, or −180° would come out as a little more than 180°.
  const ySign = yh + S[at + 1]! < 0 ? -1 : 1;
  const xSign = xh + S[at + 3]! < 0 ? -1 : 1;
  let nh = ySign * yh;
  let nt = ySign * S[at + 1]!;
  let dh = xSign * xh;
  let dt = xSign * S[at + 3]!;
  let octant = xSign < 0 ? 1 : 0;
  if (nh > dh) {
    const h = nh;
    const l = nt;
    nh = dh;
    nt = dt;
    dh = h;
    dt = l;
    octant += 2;
  }
  const step = ((nh / dh) * 256 + 0.5) | 0;
  const tangent = step * 0.00390625;
  const row = (octant * 257 + step) << 1;
  const sense = SENSE[octant]!;
  const t0 = dh * tangent;
  const t1 = nh - t0;
  const t2 = dt * tangent;
  const t3 = nt - t2;
  const t4 = nh * tangent;
  const t5 = dh + t4;
  const t6 = nt * tangent;
  const t7 = dt + t6;
  const t8 = t5 + t7;
  const t9 = 1 / t8;
  const t10 = t1 + t3;
  const t11 = t10 * t9;
  const t12 = 134217729 * t11;
  const t13 = t12 - t11;
  const t14 = t12 - t13;
  const t15 = 134217729 * t8;
  const t16 = t15 - t8;
  const t17 = t15 - t16;
  const t18 = t5 - t17;
  const t19 = t18 + t7;
  const t20 = t14 * t17;
  const t21 = t1 - t20;
  const t22 = t14 * t19;
  const t23 = t21 - t22;
  const t24 = t23 + t3;
  const t25 = t24 * t9;
  const t26 = t14 + t25;
  const t27 = t26 * t26;
  const t28 = t26 * t27;
  const t29 = 0.1111111111111111 * t27;
  const t30 = (-0.14285714285714285) + t29;
  const t31 = t27 * t30;
  const t32 = 0.2 + t31;
  const t33 = t27 * t32;
  const t34 = (-0.3333333333333333) + t33;
  const t35 = t28 * t34;
  const t36 = t25 + t35;
  const t37 = T[row]!;
  const t38 = T[row + 1]!;
  const t39 = sense * t14;
  const t40 = t37 + t39;
  const t41 = t40 - t37;
  const t42 = t39 - t41;
  const t43 = sense * t36;
  const t44 = t38 + t43;
  const t45 = t42 + t44;
  const t46 = t40 * ySign;
  const t47 = t45 * ySign;
  S[to] = t46;
  S[to + 1] = t47;
}

/**
 * The angle of (x, y) in degrees, quickly: within 2^-64, absolute, for a point known to 2^-74 of its distance.
 *
 * @param at - slot of y head, tail, x head, tail; heads have 26 bits and x and y are not both 0.
 * @param to - slot of the angle, hi and lo.
 */
export function quickArcTangentDegrees(at: number, to: number): void {
  const S = scratch;
  const T = ARCS_DEGREES;
  const yh = S[at]!;
  const xh = S[at + 2]!;
  // A head may have cancelled to 0: the tail has the sign then, or −180° would come out as a little more than 180°.
  const ySign = yh + S[at + 1]! < 0 ? -1 : 1;
  const xSign = xh + S[at + 3]! < 0 ? -1 : 1;
  let nh = ySign * yh;
  let nt = ySign * S[at + 1]!;
  let dh = xSign * xh;
  let dt = xSign * S[at + 3]!;
  let octant = xSign < 0 ? 1 : 0;
  if (nh > dh) {
    const h = nh;
    const l = nt;
    nh = dh;
    nt = dt;
    dh = h;
    dt = l;
    octant += 2;
  }
  const step = ((nh / dh) * 256 + 0.5) | 0;
  const tangent = step * 0.00390625;
  const row = (octant * 257 + step) << 1;
  const sense = SENSE[octant]!;
  const t0 = dh * tangent;
  const t1 = nh - t0;
  const t2 = dt * tangent;
  const t3 = nt - t2;
  const t4 = nh * tangent;
  const t5 = dh + t4;
  const t6 = nt * tangent;
  const t7 = dt + t6;
  const t8 = t5 + t7;
  const t9 = 1 / t8;
  const t10 = t1 + t3;
  const t11 = t10 * t9;
  const t12 = 134217729 * t11;
  const t13 = t12 - t11;
  const t14 = t12 - t13;
  const t15 = 134217729 * t8;
  const t16 = t15 - t8;
  const t17 = t15 - t16;
  const t18 = t5 - t17;
  const t19 = t18 + t7;
  const t20 = t14 * t17;
  const t21 = t1 - t20;
  const t22 = t14 * t19;
  const t23 = t21 - t22;
  const t24 = t23 + t3;
  const t25 = t24 * t9;
  const t26 = t14 + t25;
  const t27 = t26 * t26;
  const t28 = t26 * t27;
  const t29 = 0.1111111111111111 * t27;
  const t30 = (-0.14285714285714285) + t29;
  const t31 = t27 * t30;
  const t32 = 0.2 + t31;
  const t33 = t27 * t32;
  const t34 = (-0.3333333333333333) + t33;
  const t35 = t28 * t34;
  const t36 = t25 + t35;
  const t37 = 134217729 * 57.29577951308232;
  const t38 = t37 - 57.29577951308232;
  const t39 = t37 - t38;
  const t40 = 57.29577951308232 - t39;
  const t41 = (-1.9878495670576283e-15) + t40;
  const t42 = t14 * t41;
  const t43 = t39 + t41;
  const t44 = t36 * t43;
  const t45 = t42 + t44;
  const t46 = t14 * t39;
  const t47 = T[row]!;
  const t48 = T[row + 1]!;
  const t49 = sense * t46;
  const t50 = t47 + t49;
  const t51 = t50 - t47;
  const t52 = t49 - t51;
  const t53 = sense * t45;
  const t54 = t48 + t53;
  const t55 = t52 + t54;
  const t56 = t50 * ySign;
  const t57 = t55 * ySign;
  S[to] = t56;
  S[to + 1] = t57;
}
