import type { Convention } from '../../../../../shared/attitude/convention.ts';

export interface FacetPair {
  readonly facet: string;
  /** Null where a convention of that representation has no such facet. */
  readonly left: string | null;
  readonly right: string | null;
  readonly differs: boolean;
}

const show = (value: unknown): string | null => (value === undefined ? null : Array.isArray(value) ? `[${value.join(', ')}]` : String(value));

/** Two conventions facet by facet: those of the first in its order, then those that only the second has. */
export function compareConventions(left: Convention, right: Convention): FacetPair[] {
  const [a, b] = [left, right].map((convention) => ({ ...convention }) as Record<string, unknown>) as [Record<string, unknown>, Record<string, unknown>];
  return [...new Set([...Object.keys(a), ...Object.keys(b)])].map((facet) => {
    const pair = { left: show(a[facet]), right: show(b[facet]) };
    return { facet, ...pair, differs: pair.left !== pair.right };
  });
}
