import { dominantEigenvector } from '../fit/small-matrix.ts';
import type { RateClass } from './identify-rates.ts';
import type { MeasuredRates } from './measured-rates.ts';

const AXES = ['forward', 'right', 'down'];

/** What the data cannot tell, one sentence each. */
export function unobservableRates(classes: readonly RateClass[], { bodyRates, samples }: MeasuredRates, sigma: number): string[] {
  const sentences: string[] = [];
  const kinds = new Set(classes.map(({ fit }) => fit.hypothesis.kind));
  if (kinds.has('body')) sentences.push('Angular velocity in body axes says nothing of the reference axes.');
  if (kinds.has('reference')) sentences.push('Angular velocity in reference axes says nothing of the body axes.');
  if (classes.length < 2) return sentences;
  const scatter = new Float64Array(9);
  for (let i = 0; i < samples.length; i++) for (let k = 0; k < 3; k++) for (let l = 0; l < 3; l++) scatter[3 * k + l]! += bodyRates[3 * i + k]! * bodyRates[3 * i + l]!;
  const total = scatter[0]! + scatter[4]! + scatter[8]!;
  const noise = samples.length * Math.max(3 * sigma, 1e-6) ** 2;
  if (total <= noise) sentences.push('Nothing turned: every rate is zero in any convention.');
  else {
    const axis = dominantEigenvector(scatter.slice(), 3);
    const along = [0, 1, 2].reduce((sum, k) => sum + [0, 1, 2].reduce((row, l) => row + axis[k]! * scatter[3 * k + l]! * axis[l]!, 0), 0);
    if (total - along <= Math.max(noise, 1e-6 * total)) {
      const own = AXES.find((_, k) => Math.abs(axis[k]!) > 0.9999);
      sentences.push(`All turning is about ${own ? `the body's ${own} axis` : 'one axis fixed in the body'}: what the other axes do is not seen.`);
    }
  }
  if (kinds.has('euler') && kinds.has('body')) sentences.push('These attitudes do not tell rates of Euler angles from the angular velocity in body axes: that takes turning while pitched or banked.');
  if (kinds.has('reference') && kinds.has('body')) sentences.push('These attitudes do not tell body axes from reference axes.');
  return sentences;
}
