import { ApiError } from './api-error.ts';

/**
 * Puts what the service says of a request's fields at the fields of the form that sent it.
 *
 * @param fields - JSON pointer of the request body → name of the form's field.
 * @returns false where something was said of no field: the problem must then be shown as a whole.
 */
export function atFields<Name extends string>(error: Error, fields: Readonly<Record<string, Name>>, show: (name: Name, message: string) => void): boolean {
  if (!(error instanceof ApiError) || error.problem.errors.length === 0) return false;
  let all = true;
  for (const { pointer, message } of error.problem.errors) {
    const name = Object.hasOwn(fields, pointer) ? fields[pointer] : undefined;
    if (name === undefined) all = false;
    else show(name, `${message.charAt(0).toUpperCase()}${message.slice(1)}.`);
  }
  return all;
}
