type Unit = 'deg' | 'rad' | 'arcsec' | 'deg/s' | 'rad/s';

/** An angle or a rate with four digits and its unit; very small ones as powers of ten. */
export function angle(value: number, unit: Unit): string {
  const number = value !== 0 && value < 1e-4 ? value.toExponential(2) : String(Number(value.toPrecision(4)));
  return unit === 'deg' ? `${number}°` : unit === 'arcsec' ? `${number}″` : unit === 'deg/s' ? `${number}°/s` : `${number} ${unit}`;
}

/** What a tolerance, a worst error or a failure amounts to: an angle of attitudes, or a rate. */
export const sizeOf = (error: { readonly angle: number } | { readonly rate: number }): number => ('angle' in error ? error.angle : error.rate);
