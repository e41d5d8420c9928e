import { expect, it } from 'vitest';
import { ApiError } from '../../../web/src/lib/api-error.ts';
import { atFields } from '../../../web/src/lib/field-problems.ts';

const problem = (errors: { pointer: string; message: string }[]) => new ApiError({ type: '/problems/invalid-field', title: 'A field is not valid', status: 422, detail: '', instance: '', code: 'invalid-field', errors });
const fields = { '/name': 'name', '/expiresAt': 'expires' } as const;

it('puts each message at its field, as a sentence', () => {
  const shown: string[][] = [];
  expect(atFields(problem([{ pointer: '/name', message: 'is "x"; it must be longer' }, { pointer: '/expiresAt', message: 'must lie ahead' }]), fields, (name, message) => shown.push([name, message]))).toBe(true);
  expect(shown).toEqual([['name', 'Is "x"; it must be longer.'], ['expires', 'Must lie ahead.']]);
});

it('says when something concerns no field, so that it is shown all the same', () => {
  expect(atFields(problem([{ pointer: '/role', message: 'x' }]), fields, () => undefined)).toBe(false);
  expect(atFields(problem([{ pointer: '/constructor', message: 'x' }]), fields, () => undefined)).toBe(false);
  expect(atFields(problem([]), fields, () => undefined)).toBe(false);
  expect(atFields(new Error('no network'), fields, () => undefined)).toBe(false);
});
