import type { Decoder } from '../lattice/decoder.ts';
import type { DecoderSearch, Miss } from './decoder-search.ts';
import { AT_REST, keyOf, type Fit, type Place } from './fit.ts';
import { LagSearch } from './lag-search.ts';
import { ScaleSearch } from './scale-search.ts';

export interface SearchResult {
  readonly fits: readonly Fit[];
  /** The axis sets and decoder that came nearest without fitting, as they stand. */
  readonly nearestMiss: Miss | null;
}

/**
 * Every explanation of the numbers, from the plainest on: axis sets alone, constant offsets, then a lag and a scale;
 * lags and scales too large to be told from a slope are only looked for where nothing plainer explains the data.
 */
export function search(decoderSearch: DecoderSearch): SearchResult {
  const { problem } = decoderSearch;
  const { decoders, recording } = problem;
  const fits = new Map<string, Fit>();
  const misses: Miss[] = [];
  const keep = (found: readonly Fit[]): void => found.forEach((fit) => fits.set(keyOf(fit), fit));
  const follow = (decoder: Decoder, index: number, places: readonly Place[]): void => { if (places.length > 0) keep(decoderSearch.follow(decoder, index, places)); };

  decoders.forEach((decoder, index) => {
    const rest = restOf(decoder, problem.numbers);
    if (!decoderSearch.alive(decoder, rest)) {
      const miss = decoderSearch.nearestOnVaried(decoder, index);
      if (miss) misses.push(miss);
      return;
    }
    const { fits: found, elsewhere, nearestMiss } = decoderSearch.fitAt(decoder, index, rest);
    keep(found);
    if (nearestMiss) misses.push({ decoder, index, count: recording.count, ...nearestMiss });
    follow(decoder, index, elsewhere);
  });

  if (fits.size === 0 && recording.longestLag > 0) {
    const lags = new LagSearch(recording, problem.numbers, problem.width);
    const found = new Map(decoders.map(({ reader }) => [reader, null as number[] | null]));
    decoders.forEach((decoder, index) => {
      const at = found.get(decoder.reader) ?? lags.lagsFor(decoder.reader);
      found.set(decoder.reader, at);
      const rest = restOf(decoder, problem.numbers);
      const places = at.map((lag): Place => ({ lag, scale: rest.scale, freed: ['lag', ...rest.freed] })).filter((place) => decoderSearch.alive(decoder, place));
      follow(decoder, index, places);
    });
  }
  if (fits.size === 0) {
    const scales = new ScaleSearch(recording.at(0), problem.numbers, problem.width);
    decoders.forEach((decoder, index) => {
      const places = scales.scalesFor(decoder.reader).map((scale): Place => ({ lag: 0, scale, freed: ['scale'] })).filter((place) => decoderSearch.alive(decoder, place));
      follow(decoder, index, places);
    });
  }
  const rms = ({ squaredError, count }: Miss): number => squaredError / count;
  misses.sort((a, b) => rms(a) - rms(b));
  return { fits: dropLarger([...fits.values()]), nearestMiss: misses[0] ?? null };
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
