import type { Decoder, Reader } from '../lattice/decoder.ts';
import type { DecoderSearch, Miss, Problem } from './decoder-search.ts';
import { AT_REST, keyOf, type Fit, type Place } from './fit.ts';
import type { Wanted } from './fit-decoder.ts';
import { LagSearch } from './lag-search.ts';
import { ScaleSearch } from './scale-search.ts';

export interface SearchResult {
  readonly fits: readonly Fit[];
  /** The axis sets and decoder that came nearest without fitting, as they stand. */
  readonly nearestMiss: Miss | null;
  /** Most edits that an explanation with parameters may take beside one without. */
  readonly budget: number;
}

/**
 * Chance, taken over the whole lattice, that some statement of axis sets alone fits one attitude by accident; rarer than
 * this, an offset that would explain the data too is no rival.
 */
const ACCIDENT = 1e-5;
/** Statements of the lattice that are not the same numbers: decoders times pairs of axis sets. */
const LATTICE = 4e4;

/**
 * Every explanation of the numbers, from the plainest on: axis sets alone, constant offsets, then a lag and a scale.
 *
 * Where axis sets alone explain the data, anything with parameters beside other axis sets is a rival only if it takes no
 * more edits: it has numbers of its own to choose, and they could have been anything. Lags and scales too large to be
 * told from a slope are only looked for where nothing plainer explains the data.
 *
 * @param leastCost - fewest edits of a decoder with two turns (null: an offset on that side).
 */
export function search(decoderSearch: DecoderSearch, leastCost: (decoder: Decoder, bodyTurn: number | null, referenceTurn: number | null) => number): SearchResult {
  const { problem } = decoderSearch;
  const { decoders, recording, numbers } = problem;
  const fits = new Map<string, Fit>();
  const misses: Miss[] = [];
  const keep = (found: readonly Fit[]): void => found.forEach((fit) => fits.set(keyOf(fit), fit));

  const alive = decoders.flatMap((decoder, index) => {
    const rest = restOf(decoder, numbers);
    const fitting = decoderSearch.alive(decoder, rest) ? decoderSearch.fitting(decoder, index, rest) : null;
    if (!fitting) {
      const miss = decoderSearch.nearestOnVaried(decoder, index);
      if (miss) misses.push(miss);
      return [];
    }
    fitting.fitAxisSets(possible(leastCost, decoder, 0, Infinity));
    if (fitting.nearestMiss) misses.push({ decoder, index, count: recording.count, ...fitting.nearestMiss });
    return [{ decoder, index, fitting, rest }];
  });
  const budget = budgetOf(alive.flatMap(({ fitting }) => fitting.fits), (fit) => leastCost(fit.decoder, fit.bodyTurn, fit.referenceTurn), problem);
  for (const { decoder, index, fitting, rest } of alive) {
    if (budget >= 0) {
      fitting.fitOffsets(possible(leastCost, decoder, 0, budget));
      const wanted = fitting.proposals.filter(({ place, bodyTurn, referenceTurn }) => place.freed.length > rest.freed.length && leastCost(decoder, bodyTurn, referenceTurn) + place.freed.length <= budget);
      if (wanted.length > 0) keep(decoderSearch.follow(decoder, index, wanted.map(({ place }) => place), possible(leastCost, decoder, 1, budget)));
    }
    keep(fitting.fits);
  }

  const anything = (decoder: Decoder): Wanted => possible(leastCost, decoder, 0, Infinity);
  if (fits.size === 0 && recording.longestLag > 0) {
    const lags = new LagSearch(recording, numbers, problem.width);
    const found = new Map<Reader, number[]>();
    decoders.forEach((decoder, index) => {
      const at = found.get(decoder.reader) ?? lags.lagsFor(decoder.reader);
      found.set(decoder.reader, at);
      const rest = restOf(decoder, numbers);
      const places = at.map((lag): Place => ({ lag, scale: rest.scale, freed: ['lag', ...rest.freed] })).filter((place) => decoderSearch.alive(decoder, place));
      keep(decoderSearch.follow(decoder, index, places, anything(decoder)));
    });
  }
  if (fits.size === 0) {
    const scales = new ScaleSearch(decoderSearch.motion, numbers, problem.width);
    decoders.forEach((decoder, index) => {
      const places = scales.scalesFor(decoder.reader).map((scale): Place => ({ lag: 0, scale, freed: ['scale'] })).filter((place) => decoderSearch.alive(decoder, place));
      keep(decoderSearch.follow(decoder, index, places, anything(decoder)));
    });
  }
  const rms = ({ squaredError, count }: Miss): number => squaredError / count;
  misses.sort((a, b) => rms(a) - rms(b));
  return { fits: dropLarger([...fits.values()]), nearestMiss: misses[0] ?? null, budget };
}

const possible = (leastCost: (decoder: Decoder, bodyTurn: number | null, referenceTurn: number | null) => number, decoder: Decoder, beside: number, budget: number): Wanted =>
  (bodyTurn, referenceTurn) => {
    const cost = leastCost(decoder, bodyTurn, referenceTurn) + beside;
    return cost < Infinity && cost <= budget;
  };

/** Most edits that an explanation with parameters may take; −∞ where none is a rival. */
function budgetOf(fits: readonly Fit[], costOf: (fit: Fit) => number, { criteria, recording: { count } }: Problem): number {
  const discrete = fits.filter(({ freed }) => freed.length === 0);
  if (discrete.length === 0) return Infinity;
  const angle = Math.sqrt(criteria.largest(count) / count);
  if (discrete.length === 1 && (LATTICE * angle ** 3) / (6 * Math.PI) < ACCIDENT) return -Infinity;
  return Math.min(...discrete.map(costOf));
}

/** Further from 1 than this, the norm of a quaternion or a matrix is a scale of its numbers. */
const NORM_SLACK = 0.02;

function restOf({ reader }: Decoder, numbers: Float64Array): Place {
  const norm = reader.norm?.(numbers) ?? 1;
  return Math.abs(norm - 1) <= NORM_SLACK || !(norm > 0) ? AT_REST : { lag: 0, scale: norm, freed: ['scale'] };
}

/** Without explanations that are another one with parameters added that it does not need. */
function dropLarger(fits: readonly Fit[]): Fit[] {
  const byDecoder = new Map<number, Fit[]>();
  for (const fit of fits) {
    const list = byDecoder.get(fit.index);
    if (list) list.push(fit);
    else byDecoder.set(fit.index, [fit]);
  }
  return fits.filter((fit) => fit.freed.length === 0 || !byDecoder.get(fit.index)!.some((other) => isPlainer(other, fit)));
}

const isPlainer = (other: Fit, fit: Fit): boolean =>
  other.freed.length < fit.freed.length && other.freed.every((block) => fit.freed.includes(block))
  && (fit.bodyTurn === null || fit.bodyTurn === other.bodyTurn) && (fit.referenceTurn === null || fit.referenceTurn === other.referenceTurn);
