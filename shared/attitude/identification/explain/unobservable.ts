import type { Motion } from '../fit/motion.ts';
import type { Block, Fit } from '../search/fit.ts';
import { motionCharacter } from './motion-character.ts';
import { openFacets } from './open-facets.ts';
import type { Choice } from './statement-choice.ts';

const NAMES: Readonly<Record<Block, string>> = { reference: 'an offset of the reference (north)', body: 'an offset of the mounting', lag: 'a time lag', scale: 'a scale of the numbers' };
const DEG = 180 / Math.PI;
const FRAME_AXES = ['forward', 'right', 'down'] as const;

export interface Seen {
  readonly fits: readonly Fit[];
  readonly choices: readonly Choice[];
  readonly motion: Motion;
  readonly numbers: Float64Array;
  readonly width: number;
  /** rad */
  readonly sigma: number;
  readonly ambiguous: boolean;
  /** Named frame of the reference, or null. */
  readonly frame: string | null;
}

/** What the data cannot tell, one sentence each. */
export function unobservableSentences(seen: Seen): string[] {
  return [
    ...(seen.ambiguous ? motionSentences(seen) : []),
    ...(seen.ambiguous ? constantNumbers(seen) : []),
    ...(seen.ambiguous && seen.choices.length > 1 ? [openFacets(seen.choices)].flatMap((sentence) => sentence ?? []) : []),
    ...hiddenParameters(seen),
    ...(seen.ambiguous && seen.motion.samples.length < FEW && seen.fits.some(({ freed }) => freed.length > 0) ? [`Only ${seen.motion.samples.length} samples: too few to be sure of an offset, a lag or a scale; six are the least.`] : []),
  ];
}

export const FEW = 6;

function motionSentences({ motion, sigma, frame }: Seen): string[] {
  const slack = Math.max(8 * sigma, 1e-5);
  const { character, first, axis } = motionCharacter(motion, slack);
  const level = !frame && Math.abs(first[8]! - 1) <= slack * slack;
  switch (character) {
    case 'one-attitude': {
      const where = level ? `level at one heading, ${heading(first)}` : 'the same throughout';
      return [`Only one attitude is in the data (${where}): nothing turned, so what differs only in motion looks the same.`];
    }
    case 'single-axis': {
      const names = axis!.map((component, k) => (Math.abs(component) > 0.9999 ? FRAME_AXES[k]! : null)).find((name) => name !== null);
      const about = names ? `the body's ${names} axis` : `one axis fixed in the body, (${axis!.map((component) => component.toFixed(3)).join(', ')}) in forward, right, down`;
      return [`All motion is about ${about}: what the other axes do is not seen.`];
    }
    case 'right-angles': return ['Every attitude is right angles away from every other: axis sets, signs and orders that differ by right angles look the same.'];
    case 'general': return [];
  }
}

const heading = (c: Float64Array): string => `${((Math.atan2(c[1]!, c[0]!) * DEG + 360) % 360).toFixed(1).padStart(5, '0')}°`;

function constantNumbers({ numbers, width, sigma, choices }: Seen): string[] {
  // Noise of a number, as the plainest explanation reads it; angles near lock scatter more, and are then not called zero.
  const [convention] = choices.map((choice) => choice.convention);
  const noise = convention && 'unit' in convention && convention.unit === 'deg' ? sigma * DEG : sigma;
  const count = numbers.length / width;
  if (count < 2) return [];
  const zero: number[] = [];
  for (let k = 0; k < width; k++) {
    let largest = 0;
    for (let i = 0; i < count; i++) largest = Math.max(largest, Math.abs(numbers[width * i + k]!));
    if (largest <= Math.max(6 * noise, 1e-9)) zero.push(k + 1);
  }
  if (zero.length === 0 || zero.length === width) return zero.length === 0 ? [] : ['All numbers are zero throughout: any reading of them is the identity.'];
  return [`Number${zero.length > 1 ? 's' : ''} ${zero.join(' and ')} of each attitude ${zero.length > 1 ? 'are' : 'is'} zero throughout${sigma > 0 ? ', within the noise' : ''}: ${zero.length > 1 ? 'their' : 'its'} sign, unit and place in the sequence do not show.`];
}

/** Parameters that could hide, and those that could be one another. */
function hiddenParameters({ fits, motion }: Seen): string[] {
  const sentences: string[] = [];
  const alike = new Set<Block>(fits.flatMap(({ hidden }) => hidden().inseparable.flat()));
  const alternatives = new Set(fits.flatMap(({ freed }) => (freed.length === 1 ? freed : [])));
  // Different single parameters that each explain the same decoder and axis sets are one another's doubles.
  if (alternatives.size > 1) alternatives.forEach((block) => alike.add(block));
  const first = fits[0];
  const unseen = first?.hidden().unseen ?? [];
  if (alike.size > 0) {
    unseen.forEach((block) => alike.add(block));
    sentences.push(`In these data ${list([...alike].map((block) => NAMES[block]))} cannot be told apart${steady(motion) ? ': the turn is steady' : alike.has('reference') && alike.has('body') ? ': there is too little tilt between the samples' : ''}.`);
  } else if (unseen.length > 0 && motion.samples.length > 1) {
    const still = unseen.includes('lag') && motion.sumSquareRate / motion.samples.length < 1e-8;
    const rest = still ? unseen.filter((block) => block !== 'lag') : unseen;
    if (still) sentences.push('A time lag would not show: nothing turned.');
    if (rest.length > 1) sentences.push(`${capital(list(rest.map((block) => NAMES[block])))} could cancel without a trace${steady(motion) ? ': the turn is steady' : ''}.`);
    else if (rest.length === 1) sentences.push(`${capital(NAMES[rest[0]!])} would hardly show.`);
  }
  return sentences;
}

/** Whether the rate is the same throughout, in body axes. */
function steady({ samples, sumBodyRate, sumSquareRate }: Motion): boolean {
  const mean = sumBodyRate.reduce((sum, component) => sum + component * component, 0) / samples.length;
  return sumSquareRate > 1e-8 * samples.length && sumSquareRate - mean < 1e-3 * sumSquareRate;
}

const list = (names: readonly string[]): string => (names.length < 2 ? names.join('') : `${names.slice(0, -1).join(', ')} and ${names[names.length - 1]!}`);
const capital = (sentence: string): string => sentence[0]!.toUpperCase() + sentence.slice(1);
