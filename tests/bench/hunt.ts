/**
 * Hunts for wrong answers of identification: random recordings with one or two mistakes of an interface, of every kind of
 * motion, with noise stated rightly or too high. A wrong `unique` is the answer that must not be.
 *
 *   npm run hunt                         2,000 recordings of every kind, and 2,000 varied ones
 *   npm run hunt -- 10000 50000          as many, from that seed on
 *
 * Prints what is not right, with the seed that makes it again, and a count of the verdicts. Exits 1 if a `unique` was
 * wrong, or if fewer than 98 % of the varied ones were named.
 */
import { caseOf, EVERYTHING, judged, VARIED_PAIRS, type Choices } from '../shared/attitude/identification/support/hunt.ts';
import type { Verdict } from '../shared/attitude/identification/support/verdict.ts';

const [count = 2000, from = 1] = process.argv.slice(2).map(Number);

function hunt(title: string, choices: Choices): Map<Verdict, number> {
  const verdicts = new Map<Verdict, number>();
  const times: number[] = [];
  for (let seed = from; seed < from + count; seed++) {
    const each = caseOf(seed, choices);
    const { verdict, milliseconds } = judged(each);
    verdicts.set(verdict, (verdicts.get(verdict) ?? 0) + 1);
    times.push(milliseconds);
    if (verdict === 'wrong unique' || verdict === 'none' || verdict === 'ambiguous without the truth') {
      console.log(`  ${title}, seed ${seed}: ${verdict}: ${each.names.join(' and ')}; ${each.stated.convention.representation} stated, ${each.kind}, ${each.count} samples`);
    }
    if ((seed - from + 1) % 500 === 0) console.log(`  ${title}: ${seed - from + 1} of ${count}`);
  }
  times.sort((a, b) => a - b);
  console.log(`${title}: ${[...verdicts].map(([verdict, n]) => `${n} ${verdict}`).join(', ')}; median ${times[count >> 1]!.toFixed(1)} ms, longest ${times[count - 1]!.toFixed(0)} ms`);
  return verdicts;
}

const varied = hunt('varied', VARIED_PAIRS);
const every = hunt('every kind', EVERYTHING);
const named = ((varied.get('right') ?? 0) + (varied.get('ambiguous with the truth') ?? 0)) / count;
const wrong = (varied.get('wrong unique') ?? 0) + (every.get('wrong unique') ?? 0);
console.log(`${(100 * named).toFixed(2)} % of the varied ones named, or among what remains; ${wrong} wrong for certain`);
process.exitCode = wrong > 0 || named < 0.98 ? 1 : 0;
