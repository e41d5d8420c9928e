// Written by shared/generator/write.ts from shared/generator/kernels/quick-sin-cos.ts. Do not edit.
import { scratch } from './scratch.ts';
import { SIGN_OF_COSINE, SIGN_OF_SINE, SPLIT_SINES_AND_COSINES } from './sine-table.ts';
import { STEP_PARTS } from './tables.gen.ts';

const STEP_1 = STEP_PARTS[0];
const STEP_REST = STEP_PARTS[1] + STEP_PARTS[2];
const STEP = 15 / 128;
/** Adding and taking away 1.5 × 2^52 rounds to an integer. */
const ROUNDER = 6755399441055744;

/**
 * Sine and cosine of an angle in radians, quickly: errors below 2^-71, absolute.
 *
 * @param at - slot of the angle, a double of size below 8.
 * @param to - slot of the answer: sine head, tail, cosine head, tail; heads have 26 bits.
 */
export function quickSinCosRadians(at: number, to: number): void {
  const S = scratch;
  const T = SPLIT_SINES_AND_COSINES;
  const x = S[at]!;
  const k = x * 488.9239851783025 + ROUNDER - ROUNDER;
  const turns = k * 0.0013020833333333333 + ROUNDER - ROUNDER;
  const row = ((k - 768 * turns + 384) | 0) << 2;
  const quadrant = turns & 3;
  const sineTo = to + ((quadrant & 1) << 1);
  const cosineTo = to + 2 - ((quadrant & 1) << 1);
  const sineSign = SIGN_OF_SINE[quadrant]!;
  const cosineSign = SIGN_OF_COSINE[quadrant]!;
  const t0 = STEP_1 * k;
  const t1 = x - t0;
  const t2 = 134217729 * t1;
  const t3 = t2 - t1;
  const t4 = t2 - t3;
  const t5 = t1 - t4;
  const t6 = STEP_REST * k;
  const t7 = t5 - t6;
  const t8 = t4 + t7;
  const t9 = t8 * t8;
  const t10 = t8 * t9;
  const t11 = 0.008333333333333333 * t9;
  const t12 = (-0.16666666666666666) + t11;
  const t13 = t10 * t12;
  const t14 = t13 + t7;
  const t15 = (-0.001388888888888889) * t9;
  const t16 = 0.041666666666666664 + t15;
  const t17 = t16 * t9;
  const t18 = (-0.5) + t17;
  const t19 = t18 * t9;
  const t20 = T[row]!;
  const t21 = T[row + 1]!;
  const t22 = T[row + 2]!;
  const t23 = T[row + 3]!;
  const t24 = t20 + t21;
  const t25 = t22 + t23;
  const t26 = t22 * t4;
  const t27 = t20 + t26;
  const t28 = t27 - t20;
  const t29 = t26 - t28;
  const t30 = t23 * t4;
  const t31 = t14 * t25;
  const t32 = t19 * t24;
  const t33 = t31 + t32;
  const t34 = t30 + t33;
  const t35 = t21 + t34;
  const t36 = t29 + t35;
  const t37 = t20 * t4;
  const t38 = -t37;
  const t39 = t22 + t38;
  const t40 = t39 - t22;
  const t41 = t38 - t40;
  const t42 = t19 * t25;
  const t43 = t21 * t4;
  const t44 = t14 * t24;
  const t45 = t43 + t44;
  const t46 = t42 - t45;
  const t47 = t23 + t46;
  const t48 = t41 + t47;
  const t49 = 134217729 * t27;
  const t50 = t49 - t27;
  const t51 = t49 - t50;
  const t52 = t27 - t51;
  const t53 = t36 + t52;
  const t54 = 134217729 * t39;
  const t55 = t54 - t39;
  const t56 = t54 - t55;
  const t57 = t39 - t56;
  const t58 = t48 + t57;
  const t59 = sineSign * t51;
  const t60 = sineSign * t53;
  const t61 = cosineSign * t56;
  const t62 = cosineSign * t58;
  S[sineTo] = t59;
  S[sineTo + 1] = t60;
  S[cosineTo] = t61;
  S[cosineTo + 1] = t62;
}

/**
 * Sine and cosine of an angle in degrees, quickly: errors below 2^-71, absolute.
 *
 * @param at - slot of the angle, a double of size below 2^40.
 * @param to - slot of the answer: sine head, tail, cosine head, tail; heads have 26 bits.
 */
export function quickSinCosDegrees(at: number, to: number): void {
  const S = scratch;
  const T = SPLIT_SINES_AND_COSINES;
  const x = S[at]!;
  const k = x * 8.533333333333333 + ROUNDER - ROUNDER;
  const turns = k * 0.0013020833333333333 + ROUNDER - ROUNDER;
  const row = ((k - 768 * turns + 384) | 0) << 2;
  const quadrant = turns & 3;
  const sineTo = to + ((quadrant & 1) << 1);
  const cosineTo = to + 2 - ((quadrant & 1) << 1);
  const sineSign = SIGN_OF_SINE[quadrant]!;
  const cosineSign = SIGN_OF_COSINE[quadrant]!;
  const t0 = STEP * k;
  const t1 = x - t0;
  const t2 = 134217729 * t1;
  const t3 = t2 - t1;
  const t4 = t2 - t3;
  const t5 = t1 - t4;
  const t6 = 0.017453292519943295 * 134217729;
  const t7 = t6 - 0.017453292519943295;
  const t8 = t6 - t7;
  const t9 = 0.017453292519943295 - t8;
  const t10 = 2.9486522708701687e-19 + t9;
  const t11 = t10 * t4;
  const t12 = t10 + t8;
  const t13 = t12 * t5;
  const t14 = t11 + t13;
  const t15 = t4 * t8;
  const t16 = 134217729 * t15;
  const t17 = t16 - t15;
  const t18 = t16 - t17;
  const t19 = t15 - t18;
  const t20 = t14 + t19;
  const t21 = t18 + t20;
  const t22 = t21 * t21;
  const t23 = t21 * t22;
  const t24 = 0.008333333333333333 * t22;
  const t25 = (-0.16666666666666666) + t24;
  const t26 = t23 * t25;
  const t27 = t20 + t26;
  const t28 = (-0.001388888888888889) * t22;
  const t29 = 0.041666666666666664 + t28;
  const t30 = t22 * t29;
  const t31 = (-0.5) + t30;
  const t32 = t22 * t31;
  const t33 = T[row]!;
  const t34 = T[row + 1]!;
  const t35 = T[row + 2]!;
  const t36 = T[row + 3]!;
  const t37 = t33 + t34;
  const t38 = t35 + t36;
  const t39 = t18 * t35;
  const t40 = t33 + t39;
  const t41 = t40 - t33;
  const t42 = t39 - t41;
  const t43 = t18 * t36;
  const t44 = t27 * t38;
  const t45 = t32 * t37;
  const t46 = t44 + t45;
  const t47 = t43 + t46;
  const t48 = t34 + t47;
  const t49 = t42 + t48;
  const t50 = t18 * t33;
  const t51 = -t50;
  const t52 = t35 + t51;
  const t53 = t52 - t35;
  const t54 = t51 - t53;
  const t55 = t32 * t38;
  const t56 = t18 * t34;
  const t57 = t27 * t37;
  const t58 = t56 + t57;
  const t59 = t55 - t58;
  const t60 = t36 + t59;
  const t61 = t54 + t60;
  const t62 = 134217729 * t40;
  const t63 = t62 - t40;
  const t64 = t62 - t63;
  const t65 = t40 - t64;
  const t66 = t49 + t65;
  const t67 = 134217729 * t52;
  const t68 = t67 - t52;
  const t69 = t67 - t68;
  const t70 = t52 - t69;
  const t71 = t61 + t70;
  const t72 = sineSign * t64;
  const t73 = sineSign * t66;
  const t74 = cosineSign * t69;
  const t75 = cosineSign * t71;
  S[sineTo] = t72;
  S[sineTo + 1] = t73;
  S[cosineTo] = t74;
  S[cosineTo + 1] = t75;
}
