import type { Request } from 'express';
import { convertQuery, streamedConvention } from '#shared/api/attitude.ts';
import type { ConvertInput } from '#shared/api/attitude.ts';
import type { ConventionReference } from '#shared/api/convention.ts';
import { explainIssues } from '../explain-issues.ts';
import { HttpProblem } from '../problems.ts';

export interface StatedInQuery {
  readonly from: ConventionReference;
  readonly to: ConventionReference;
  readonly options: NonNullable<ConvertInput['options']>;
}

/**
 * What the query states of a body that is only rows: both conventions and the options.
 * @throws HttpProblem with pointers such as `?from/sequence`.
 */
export function readQuery(request: Request): StatedInQuery {
  const given = { ...request.query };
  const checked = convertQuery.safeParse(given);
  if (!checked.success) throw explainIssues(checked.error, given, 'query');
  const { from, to, repair, warnWithinDeg } = checked.data;
  for (const [name, value] of [['from', from], ['to', to]] as const) {
    if (value === undefined) throw new HttpProblem('missing-field', `?${name} is missing: a body of rows says nothing of its convention, so the query must.`, [{ pointer: `?${name}`, message: 'is missing; it must be the id of a preset, or a convention as JSON' }]);
  }
  return {
    from: convention('from', from!), to: convention('to', to!),
    options: { ...(repair === undefined ? {} : { repair }), ...(warnWithinDeg === undefined ? {} : { warnWithinDeg: Number(warnWithinDeg) }) },
  };
}

/** A JSON body states its conventions itself; a query that does too would contradict it or be passed over. @throws HttpProblem. */
export function refuseStatedTwice(query: Readonly<Record<string, unknown>>): void {
  const [name] = Object.keys(query);
  if (name !== undefined) throw new HttpProblem('invalid-field', `?${name} is for bodies of rows; a JSON body states its conventions and options itself.`, [{ pointer: `?${name}`, message: 'is for bodies of rows; state it in the body' }]);
}

function convention(name: 'from' | 'to', text: string): ConventionReference {
  if (!text.startsWith('{')) return { preset: text };
  let value: unknown;
  try {
    value = JSON.parse(text);
  } catch {
    throw new HttpProblem('invalid-field', `?${name} begins like JSON and is none.`, [{ pointer: `?${name}`, message: 'must be the id of a preset, or a convention as JSON' }]);
  }
  const checked = streamedConvention.safeParse({ [name]: value });
  if (checked.success) return checked.data[name]!;
  const problem = explainIssues(checked.error, { [name]: value }, 'body');
  throw new HttpProblem(problem.code, problem.message.replace(/^\//, '?'), problem.items.map(({ pointer, message }) => ({ pointer: pointer.replace(/^\//, '?'), message })));
}
