import type { Block, Hidden } from './fit.ts';
import { BLOCKS, type Models } from './models.ts';

/** A parameter known no better than this with all the others free has not been seen: rad, rad, s, ln. */
const SEEN: Readonly<Record<Block, number>> = { reference: 0.02, body: 0.02, lag: 0.02, scale: 0.02 };

/**
 * What the data leave open about the parameters of a model, reckoned when first asked for.
 *
 * A fitted parameter is inseparable from another one if, with the other free too, it is known no better than to half its
 * size: the data do not say which of the two it is, or how they share it.
 */
export function hiddenParameters(models: Models, freed: readonly Block[], size: Readonly<Record<Block, () => number>>): () => Hidden {
  let hidden: Hidden | undefined;
  return () => (hidden ??= { inseparable: inseparable(models, freed, size), unseen: unseen(models, freed) });
}

const inseparable = (models: Models, freed: readonly Block[], size: Readonly<Record<Block, () => number>>): [Block, Block][] =>
  freed.filter((block) => models.has(block)).flatMap((block) => BLOCKS.flatMap((other): [Block, Block][] => {
    if (other === block || !models.has(other)) return [];
    const alone = models.deviation(block, freed.filter((each) => each !== other));
    const together = models.deviation(block, [...new Set([...freed, other])]);
    return together > 3 * alone && together > 0.5 * size[block]() ? [[block, other]] : [];
  }));

function unseen(models: Models, freed: readonly Block[]): Block[] {
  const all = BLOCKS.filter((block) => models.has(block));
  return all.filter((block) => !freed.includes(block) && models.deviation(block, all) > SEEN[block]);
}
