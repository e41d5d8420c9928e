export interface Statistics {
  readonly rms: number;
  readonly median: number;
  readonly p95: number;
  readonly max: number;
}

/** Root mean square, and percentiles by nearest rank, of at least one value; in the values' unit. */
export function statisticsOf(values: Float64Array): Statistics {
  const sorted = values.slice().sort();
  const rank = (share: number): number => sorted[Math.max(0, Math.ceil(share * sorted.length) - 1)]!;
  let square = 0;
  for (const value of values) square += value * value;
  return { rms: Math.sqrt(square / values.length), median: rank(0.5), p95: rank(0.95), max: sorted[sorted.length - 1]! };
}
