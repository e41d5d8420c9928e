import type { ProblemItem } from '#shared/api/problems.ts';
import { LISTED_AT_MOST } from '#shared/attitude/errors.ts';
import { DomainError } from '../errors.ts';

/** Attitudes and rates of a batch of samples as two lists, checked to be such; the numbers are checked after this. */
export function readSamples(samples: readonly unknown[], pointer: string): { attitudes: unknown[]; rates: unknown[] } {
  const items: ProblemItem[] = [];
  const attitudes: unknown[] = [];
  const rates: unknown[] = [];
  samples.forEach((sample, index) => {
    const keys = typeof sample === 'object' && sample !== null && !Array.isArray(sample) ? Object.keys(sample) : null;
    if (keys === null || keys.length !== 2 || !keys.includes('attitude') || !keys.includes('rate')) {
      if (items.length < LISTED_AT_MOST) items.push({ pointer: `${pointer}/${index}`, message: 'must be an object with "attitude" and "rate", and nothing else' });
      return;
    }
    const { attitude, rate } = sample as { attitude: unknown; rate: unknown };
    attitudes.push(attitude);
    rates.push(rate);
  });
  if (items.length > 0) throw new DomainError('invalid-field', `${items[0]!.pointer} ${items[0]!.message}.`, items);
  return { attitudes, rates };
}
