import type { ProblemItem } from '#shared/api/problems.ts';
import type { ResolveInput, ResolveOutput } from '#shared/api/resolve.ts';
import { LISTED_AT_MOST } from '#shared/attitude/errors.ts';
import { NUMBERS_PER_RATE } from '#shared/attitude/rates/rate.ts';
import { LARGEST_COMPONENT } from '#shared/attitude/refuse-out-of-range.ts';
import { resolveVectors } from '#shared/attitude/resolve/resolve-vectors.ts';
import { resolveConvention } from '../conventions/resolve-convention.ts';
import { DomainError } from '../errors.ts';
import type { Meter } from '../meter.ts';
import { ENGINE } from './engine.ts';
import { readAttitudes, readRows } from './read-attitudes.ts';
import { pointingInto } from './refuse-attitudes.ts';
import { resolveRate } from './resolve-rate.ts';

/** Resolves a batch of vectors in the other frame; one bad sample refuses the whole batch. */
export function resolveBatch({ attitude: named, from, rate: namedRate, samples }: ResolveInput, meter: Meter): ResolveOutput {
  meter.spend(samples.length, '/samples');
  const attitude = resolveConvention(named, '/attitude');
  const columns = readSamples(samples, namedRate !== undefined);
  const attitudes = readAttitudes(columns.attitude, attitude, '/samples', '/attitude');
  const vectors = readRows(columns.vector, { width: 3, mayNest: false, taker: 'a vector', pointer: '/samples', within: '/vector', most: LARGEST_COMPONENT });
  const rate = namedRate === undefined ? null : resolveRate(namedRate, attitude, '/rate');
  const change = rate === null ? null : {
    rate,
    derivatives: readRows(columns.derivative, { width: 3, mayNest: false, taker: 'a derivative', pointer: '/samples', within: '/derivative', most: LARGEST_COMPONENT }),
    rates: readRows(columns.rate, { width: NUMBERS_PER_RATE[rate.rate], mayNest: false, taker: `the rate "${rate.rate}"`, pointer: '/samples', within: '/rate', most: LARGEST_COMPONENT }),
  };
  const resolved = pointingInto('/samples', () => resolveVectors(attitude, from, { attitudes, vectors, ...(change ? { change } : {}) }));
  return {
    vectors: rows(resolved.vectors),
    ...(resolved.derivatives ? { derivatives: rows(resolved.derivatives) } : {}),
    attitude: attitude as ResolveOutput['attitude'], from, to: from === 'body' ? 'reference' : 'body',
    ...(rate ? { rate: { ...rate } as NonNullable<ResolveOutput['rate']> } : {}),
    engine: ENGINE,
  };
}

type Columns = Record<'attitude' | 'vector' | 'derivative' | 'rate', unknown[]>;

/** What each sample holds, by name; with a rate stated all four, without one only attitude and vector. */
function readSamples(samples: readonly unknown[], changing: boolean): Columns {
  const names = changing ? (['attitude', 'vector', 'derivative', 'rate'] as const) : (['attitude', 'vector'] as const);
  const columns: Columns = { attitude: [], vector: [], derivative: [], rate: [] };
  const items: ProblemItem[] = [];
  samples.forEach((sample, index) => {
    const keys = typeof sample === 'object' && sample !== null && !Array.isArray(sample) ? Object.keys(sample) : [];
    if (keys.length !== names.length || !names.every((name) => keys.includes(name))) {
      items.push({ pointer: `/samples/${index}`, message: `must be an object with ${names.map((name) => `"${name}"`).join(', ')}, and nothing else, since /rate is ${changing ? 'stated' : 'not stated'}` });
      return;
    }
    for (const name of names) columns[name].push((sample as Record<string, unknown>)[name]);
  });
  if (items.length > 0) throw new DomainError('invalid-field', `${items[0]!.pointer} ${items[0]!.message}.`, items.slice(0, LISTED_AT_MOST));
  return columns;
}

const rows = (numbers: Float64Array): [number, number, number][] => Array.from({ length: numbers.length / 3 }, (_, i) => [numbers[3 * i]!, numbers[3 * i + 1]!, numbers[3 * i + 2]!]);
