import { useSearchParams } from 'react-router-dom';
import { isBodyAxes, isReferenceAxes } from '../../../../../shared/attitude/axes.ts';
import { NUMBERS_PER_ATTITUDE, type Convention } from '../../../../../shared/attitude/convention.ts';
import { PRESETS } from '../../../../../shared/attitude/presets.ts';
import { FACETS, REPRESENTATIONS, same } from './facet-choices.ts';

/** A convention as somebody stated it here: by a preset's id, or facet by facet (then `preset` is null). */
export interface Statement {
  readonly preset: string | null;
  readonly convention: Convention;
}

export interface WorkbenchState {
  readonly from: Statement;
  readonly to: Statement;
  /** As typed, one text a number. */
  readonly numbers: readonly string[];
}

export const statementOf = (id: string): Statement => ({ preset: id, convention: PRESETS.find((preset) => preset.id === id)!.convention });

/** The state in the address: `from` and `to` as preset ids or JSON facets, one `n` a number, as typed. */
export function useWorkbenchState(): readonly [WorkbenchState, (change: Partial<WorkbenchState>) => void] {
  const [search, setSearch] = useSearchParams();
  const from = readStatement(search.get('from')) ?? statementOf('aircraft-euler-deg');
  const to = readStatement(search.get('to')) ?? statementOf('aircraft-quaternion');
  const given = search.has('n') ? search.getAll('n') : ['30', '10', '20'];
  const width = NUMBERS_PER_ATTITUDE[from.convention.representation];
  const state = { from, to, numbers: Array.from({ length: width }, (_, i) => given[i] ?? '') };
  function change(part: Partial<WorkbenchState>) {
    const next = { ...state, ...part };
    setSearch([['from', writeStatement(next.from)], ['to', writeStatement(next.to)], ...next.numbers.map((number): [string, string] => ['n', number])], { replace: true });
  }
  return [state, change];
}

const writeStatement = ({ preset, convention }: Statement): string => preset ?? JSON.stringify(convention);

/** Null for anything that is not a whole convention: an address can be edited by anybody. */
export function readStatement(text: string | null): Statement | null {
  if (text === null) return null;
  if (PRESETS.some(({ id }) => id === text)) return statementOf(text);
  try {
    const facets: unknown = JSON.parse(text);
    if (typeof facets !== 'object' || facets === null) return null;
    const { representation, reference, body, ...rest } = facets as Record<string, unknown>;
    const known = REPRESENTATIONS.find((each) => each === representation);
    if (!known || typeof reference !== 'string' || typeof body !== 'string' || !isReferenceAxes(reference) || !isBodyAxes(body)) return null;
    const complete = FACETS[known].every(([facet, choices]) => choices.some((choice) => same(choice, rest[facet]))) && Object.keys(rest).length === FACETS[known].length;
    return complete ? { preset: null, convention: facets as Convention } : null;
  } catch {
    return null;
  }
}
