/** Weights of the polynomial through a few nodes, for its value and its derivative at one time. */
export interface LagrangeWeights {
  readonly value: Float64Array;
  readonly derivative: Float64Array;
}

/** Nodes of a quintic: its error falls with the sixth power of the step. */
export const STENCIL = 6;

/**
 * Lagrange's weights at t, written into `weights`; nodes are distinct, their spacing is free.
 *
 * @param nodes - times of the nodes, s; the first `count` of them are used.
 */
export function lagrange(nodes: Float64Array, count: number, t: number, weights: LagrangeWeights): void {
  const { value, derivative } = weights;
  for (let j = 0; j < count; j++) {
    let product = 1;
    let slope = 0;
    for (let k = 0; k < count; k++) {
      if (k === j) continue;
      const step = nodes[j]! - nodes[k]!;
      const factor = (t - nodes[k]!) / step;
      slope = slope * factor + product / step;
      product *= factor;
    }
    value[j] = product;
    derivative[j] = slope;
  }
}

/** Index j of the last time that is not after t, by bisection; −1 before the first. */
export function lastNotAfter(times: Float64Array, t: number): number {
  let low = -1;
  let high = times.length;
  while (high - low > 1) {
    const middle = (low + high) >> 1;
    if (times[middle]! <= t) low = middle;
    else high = middle;
  }
  return low;
}
