import type { z } from 'zod';
import type { ProblemCode, ProblemItem } from '#shared/api/problems.ts';
import { LISTED_AT_MOST } from '#shared/attitude/errors.ts';
import { HttpProblem } from './problems.ts';

type Issue = z.core.$ZodIssue;
type Path = readonly PropertyKey[];

/**
 * Turns what a schema says of an input into one problem: each item names the field, what stands there and what
 * may. A convention's fields are facets and have codes of their own.
 * @param where - How an item points at its field: a JSON pointer for bodies, `?name` for query parameters.
 */
export function explainIssues(error: z.ZodError, input: unknown, where: 'body' | 'query' | 'path'): HttpProblem {
  const found = error.issues.flatMap((issue) => explain(issue, input, [], where));
  const [first] = found;
  const rest = found.length > 1 ? `; and ${found.length - 1} more` : '';
  return new HttpProblem(first!.code, `${first!.item.pointer || 'The body'} ${first!.item.message}${rest}.`, found.slice(0, LISTED_AT_MOST).map(({ item }) => item));
}

interface Found {
  readonly code: ProblemCode;
  readonly item: ProblemItem;
}

function explain(issue: Issue, input: unknown, prefix: Path, where: 'body' | 'query' | 'path'): Found[] {
  const path = [...prefix, ...issue.path];
  const value = valueAt(input, path);
  const point = (at: Path) => (where === 'query' ? `?${at.map(String).join('.')}` : where === 'path' ? `{${at.map(String).join('.')}}` : at.map((part) => `/${escape(String(part))}`).join(''));
  const parent = valueAt(input, path.slice(0, -1));
  const facet = where === 'body' && isConvention(parent);

  switch (issue.code) {
    case 'unrecognized_keys':
      return issue.keys.map((key) => ({
        code: where === 'body' && isConvention(value) ? 'unknown-facet' : 'unknown-field',
        item: { pointer: point([...path, key]), message: where === 'body' && isConvention(value) ? `is not a facet of the representation "${String(value['representation'])}"` : 'is not a field of this request' },
      }));
    case 'invalid_union': {
      const branch = branchFor(value, issue.errors.length);
      const inner = branch === null ? null : issue.errors[branch];
      if (inner) return inner.flatMap((each) => explain(each, input, path, where));
      if (issue.discriminator !== undefined) {
        const missing = value === undefined;
        return [{ code: missing ? 'missing-facet' : 'invalid-facet', item: { pointer: point(path), message: missing ? `is missing; ${REPRESENTATIONS}` : `is ${show(value)}; ${REPRESENTATIONS}` } }];
      }
      break;
    }
    default:
  }
  const missing = value === undefined;
  const code: ProblemCode = missing ? (facet ? 'missing-facet' : 'missing-field') : (facet ? 'invalid-facet' : 'invalid-field');
  const allowed = allowedBy(issue);
  return [{ code, item: { pointer: point(path), message: missing ? `is missing; it ${allowed}` : `is ${show(value)}; it ${allowed}` } }];
}

const REPRESENTATIONS = 'it must be one of "euler", "quaternion", "dcm", "rotation-vector", "axis-angle", "mrp", "gibbs"';

/** What an issue says may stand there. */
function allowedBy(issue: Issue): string {
  switch (issue.code) {
    case 'invalid_value': return issue.message.startsWith('must') ? issue.message : `must be ${issue.values.length === 1 ? '' : 'one of '}${issue.values.map((each) => JSON.stringify(each)).join(', ')}`;
    case 'invalid_type': return issue.message.startsWith('must') ? issue.message : `must be ${article(issue.expected)}`;
    case 'too_small': return issue.message.startsWith('must') ? issue.message : `must be ${issue.inclusive === false ? 'more than' : 'at least'} ${issue.minimum}${issue.origin === 'string' ? ' characters long' : issue.origin === 'array' ? ' entries long' : ''}`;
    case 'too_big': return issue.message.startsWith('must') ? issue.message : `must be ${issue.inclusive === false ? 'less than' : 'at most'} ${issue.maximum}${issue.origin === 'string' ? ' characters long' : issue.origin === 'array' ? ' entries long' : ''}`;
    case 'invalid_format': return issue.message.startsWith('must') ? issue.message : issue.format === 'datetime' ? 'must be a date and time with offset, such as 2026-05-04T08:30:00Z' : `must have the format ${issue.format}`;
    case 'invalid_union': return issue.message.startsWith('must') ? issue.message : 'must be a convention: an object with every facet, {"preset": "<id>"}, or {"interface": "<name>", "version": <number>}';
    default: return issue.message.startsWith('must') ? issue.message : `must be valid (${issue.message})`;
  }
}

const article = (type: string): string => (type === 'object' ? 'an object' : type === 'array' || type === 'tuple' ? 'an array' : type === 'int' ? 'a whole number' : type === 'number' ? 'a finite number' : type === 'boolean' ? 'true or false' : `a ${type}`);

/** Which alternative of a convention reference, or of observed attitudes and rates, somebody meant: the keys tell. */
function branchFor(value: unknown, alternatives: number): number | null {
  if (alternatives === 2 && isObject(value)) return 'rates' in value ? 1 : 0;
  if (alternatives !== 3 || !isObject(value)) return null;
  if ('preset' in value) return 1;
  if ('interface' in value) return 2;
  return 0;
}

const isObject = (value: unknown): value is Record<string, unknown> => typeof value === 'object' && value !== null && !Array.isArray(value);
const isConvention = (value: unknown): value is Record<string, unknown> => isObject(value) && typeof value['representation'] === 'string' && !('numbers' in value) && !('rates' in value);

function valueAt(input: unknown, path: Path): unknown {
  let value = input;
  for (const part of path) value = typeof value === 'object' && value !== null && Object.hasOwn(value, part) ? (value as Record<PropertyKey, unknown>)[part] : undefined;
  return value;
}

function show(value: unknown): string {
  const text = JSON.stringify(value) ?? String(value);
  return text.length > 60 ? `${text.slice(0, 57)}…` : text;
}

const escape = (part: string): string => part.replaceAll('~', '~0').replaceAll('/', '~1');
