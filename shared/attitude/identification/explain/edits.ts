import type { Fit } from '../search/fit.ts';
import { facetSentences } from './facet-edits.ts';
import { offsetSentence } from './offsets.ts';
import type { Choice, Claim } from './statement-choice.ts';

/** What an integrator would change in the stated convention, and beside it. */
export function editsOf({ statement, convention, offsets }: Choice, { lag, scale, freed }: Pick<Fit, 'lag' | 'scale' | 'freed'>, { stated, frame }: Claim): string[] {
  const edits = facetSentences(statement.facets, statement.numbersAre, stated);
  if (stated && convention.reference !== stated.reference) edits.push(`reads reference axes ${convention.reference}, stated ${stated.reference}`);
  if (stated && convention.body !== stated.body) edits.push(`reads body axes ${convention.body}, stated ${stated.body}`);
  if (offsets.reference) edits.push(offsetSentence('reference', offsets.reference, frame));
  if (offsets.body) edits.push(offsetSentence('body', offsets.body, null));
  if (freed.includes('lag')) edits.push(`comes ${Math.abs(lag * 1000).toFixed(1)} ms ${lag >= 0 ? 'late' : 'early'}`);
  if (freed.includes('scale')) edits.push(`every number is ${Number(scale.toPrecision(5))} times what it should be`);
  return edits;
}
