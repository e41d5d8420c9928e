import type { Choice } from './statement-choice.ts';

const LABELS: readonly (readonly [string, string])[] = [
  ['representation', 'what the numbers are'],
  ['numbersAre', 'whether they are those of half or twice the rotation'],
  ['unit', 'the unit'],
  ['sequence', 'the sequence of rotations'],
  ['motion', 'intrinsic or extrinsic'],
  ['order', 'the order in which the angles are listed'],
  ['signs', 'the signs of the angles'],
  ['scalar', 'where the scalar stands'],
  ['maps', 'the sense'],
  ['reference', 'the reference axes'],
  ['body', 'the body axes'],
];
const SHOWN = 4;

/** One sentence on what differs between the explanations that remain, in their shortest words. */
export function openFacets(choices: readonly Choice[]): string | null {
  const open = LABELS.flatMap(([facet, label]) => {
    const values = [...new Set(choices.flatMap(({ convention, statement }) => {
      const value = facet === 'numbersAre' ? (statement.numbersAre ?? 'as they stand') : (convention as unknown as Record<string, unknown>)[facet];
      return value === undefined ? [] : [Array.isArray(value) ? value.join(', ') : String(value)];
    }))];
    if (values.length < 2) return [];
    return [`${label} (${values.slice(0, SHOWN).join('; ')}${values.length > SHOWN ? '; …' : ''})`];
  });
  return open.length === 0 ? null : `These data leave open: ${open.join(', ')}.`;
}
