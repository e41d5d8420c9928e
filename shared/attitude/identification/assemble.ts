import type { AngleUnit, Convention, DcmConvention } from '../convention.ts';
import { discriminatingAttitudes } from './explain/discriminating.ts';
import { editsOf } from './explain/edits.ts';
import { presentOffset } from './explain/offsets.ts';
import { StatementChooser, type Choice, type Claim } from './explain/statement-choice.ts';
import { FEW, unobservableSentences } from './explain/unobservable.ts';
import { AT_REST, NOTHING_HIDDEN, type Fit } from './search/fit.ts';
import type { EquivalentStatement, Explanation, Identification, RunnerUp } from './identification.ts';
import { turnMatrix, inverse, TURN_COUNT } from './lattice/turns.ts';
import type { DecoderSearch, Miss } from './search/decoder-search.ts';
import { search } from './search/search.ts';

export interface Presentation {
  readonly claim: Claim;
  readonly reference: Convention;
  readonly standard: DcmConvention;
  readonly unit: AngleUnit;
}

const LISTED = 100;
const EQUIVALENTS = 12;
const PER_UNIT: Readonly<Record<AngleUnit, number>> = { deg: Math.PI / 180, rad: 1 };
interface Ranked {
  readonly fit: Fit;
  readonly choice: Choice;
}

/** Puts the fits of a search into words, fewest edits first, and says what is left open. */
export function assemble(decoderSearch: DecoderSearch, presentation: Presentation): Identification {
  const { claim, unit } = presentation;
  const { problem } = decoderSearch;
  const chooser = new StatementChooser(claim);
  const result = search(decoderSearch, (decoder, bodyTurn, referenceTurn) => chooser.leastCost(decoder, bodyTurn, referenceTurn));
  const deviationOf = (fit: Fit): number => Math.sqrt(problem.criteria.found(fit.squaredError, fit.count, 0) / fit.count);
  const best = new Map<Fit, Choice | null>();
  const bestOf = (fit: Fit): Choice | null => {
    if (!best.has(fit)) best.set(fit, chooser.choices(fit, deviationOf(fit), 1)[0] ?? null);
    return best.get(fit)!;
  };
  const rank = (fits: readonly Fit[]): Ranked[] => fits
    .flatMap((fit) => (bestOf(fit) ? [{ fit, choice: bestOf(fit)! }] : []))
    .sort((x, y) => x.choice.cost - y.choice.cost || x.fit.freed.length - y.fit.freed.length || x.fit.index - y.fit.index);

  const rivals = rank(result.fits).filter(({ fit, choice }) => fit.freed.length === 0 || choice.cost <= result.budget).map(({ fit }) => fit);
  const ranked = rank(withShared(rivals, decoderSearch, (fit) => chooser.choices(fit, deviationOf(fit), 1)[0]?.cost ?? Infinity));
  const listed = ranked.slice(0, LISTED);
  const [only] = ranked;
  const sure = ranked.length === 1 && only!.fit.hidden().inseparable.length === 0 && (only!.fit.freed.length === 0 || problem.recording.count >= FEW);
  const largest = decoderSearch.largestErrors(listed.map(({ fit }) => fit));
  return {
    outcome: ranked.length === 0 ? 'none' : sure ? 'unique' : 'ambiguous',
    explanations: listed.map(({ fit, choice }) => explanationOf(fit, choice, chooser.choices(fit, deviationOf(fit), EQUIVALENTS + 1).slice(1), largest.get(fit)!, presentation)),
    remaining: ranked.length,
    unobservable: unobservableSentences({
      fits: listed.map(({ fit }) => fit), choices: listed.map(({ choice }) => choice), motion: decoderSearch.motion, numbers: problem.numbers, width: problem.width, sigma: problem.sigma,
      ambiguous: ranked.length > 0 && !sure, frame: claim.frame,
    }),
    discriminating: sure ? [] : discriminatingAttitudes(listed.map(({ fit, choice }) => ({ choice, scale: fit.scale })), presentation.reference, presentation.standard, problem.sigma),
    runnerUp: result.nearestMiss && runnerUpOf(result.nearestMiss, chooser, problem.sigma, unit, claim),
  };
}

/** How many fits are few enough to work out how an offset may be shared between the sides. */
const WORKED_OUT = 6;

/** Adds, where one side's offset could be the other's in part, the fit that shares it between both; one that does already is put in its plainest words. */
function withShared(fits: readonly Fit[], decoderSearch: DecoderSearch, costOf: (fit: Fit) => number): readonly Fit[] {
  if (fits.length > WORKED_OUT) return fits;
  return fits.flatMap((fit) => {
    const sides = fit.hidden().inseparable.some((pair) => pair.every((block) => block === 'reference' || block === 'body'));
    if (!sides) return [fit];
    const shared = decoderSearch.shared(fit, costOf);
    if (!decoderSearch.problem.criteria.fits(shared.squaredError, shared.count)) return [fit];
    return fit.bodyTurn === null && fit.referenceTurn === null ? [shared] : [fit, shared];
  });
}

function explanationOf(fit: Fit, choice: Choice, others: readonly Choice[], largest: number, { claim, unit }: Presentation): Explanation {
  return {
    ...statementOf(choice, unit),
    ...(fit.freed.includes('lag') ? { timeLag: { seconds: fit.lag } } : {}),
    ...(fit.freed.includes('scale') ? { scale: fit.scale } : {}),
    edits: editsOf(choice, fit, claim),
    residual: { rms: Math.sqrt(fit.squaredError / fit.count) / PER_UNIT[unit], max: largest / PER_UNIT[unit], unit },
    sameNumbersAs: others.map((other) => statementOf(other, unit)),
  };
}

function statementOf({ statement: { numbersAre }, convention, offsets }: Choice, unit: AngleUnit): EquivalentStatement {
  const constantOffset = [
    ...(offsets.reference ? [presentOffset('reference', offsets.reference, unit)] : []),
    ...(offsets.body ? [presentOffset('body', offsets.body, unit)] : []),
  ];
  return { convention, ...(numbersAre ? { numbersAre } : {}), ...(constantOffset.length > 0 ? { constantOffset } : {}) };
}

const TURN_MATRICES = Array.from({ length: TURN_COUNT }, (_, turn) => turnMatrix(turn));

function runnerUpOf({ decoder, index, pair, squaredError, count }: Miss, chooser: StatementChooser, sigma: number, unit: AngleUnit, claim: Claim): RunnerUp | null {
  const [bodyTurn, referenceTurn] = [Math.floor(pair / TURN_COUNT), pair % TURN_COUNT];
  const fit: Fit = { decoder, index, bodyTurn, referenceTurn, b: TURN_MATRICES[bodyTurn]!, a: TURN_MATRICES[inverse(referenceTurn)]!, place: AT_REST, ...AT_REST, squaredError, count, hidden: () => NOTHING_HIDDEN };
  const [choice] = chooser.choices(fit, 0, 1);
  if (!choice) return null;
  const rms = Math.sqrt(squaredError / count);
  const { statement: { numbersAre }, convention } = choice;
  return { convention, ...(numbersAre ? { numbersAre } : {}), edits: editsOf(choice, fit, claim), residual: { rms: rms / PER_UNIT[unit], unit }, timesNoise: rms / (Math.sqrt(3) * Math.max(sigma, 1e-6)) };
}
