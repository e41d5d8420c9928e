/** An angle with four digits and its unit; very small ones as powers of ten. */
export function angle(value: number, unit: 'deg' | 'rad' | 'arcsec'): string {
  const number = value !== 0 && value < 1e-4 ? value.toExponential(2) : String(Number(value.toPrecision(4)));
  return unit === 'deg' ? `${number}°` : unit === 'arcsec' ? `${number}″` : `${number} rad`;
}
