/**
 * The one table from error code to problem document (RFC 9457). A code is stable: clients branch on it.
 * `detail` and `errors` of a document are written where the error arises; status and title come from here alone.
 */
export const PROBLEMS = {
  'malformed-json': { status: 400, title: 'The body is not valid JSON' },
  'malformed-request': { status: 400, title: 'The request cannot be read' },
  'invalid-cursor': { status: 400, title: 'The cursor is not one that this list gave out' },
  'missing-key': { status: 401, title: 'An API key or a signed-in session is needed' },
  'invalid-key': { status: 401, title: 'The API key is not known' },
  'revoked-key': { status: 401, title: 'The API key has been revoked' },
  'expired-key': { status: 401, title: 'The API key has expired' },
  'not-signed-in': { status: 401, title: 'A signed-in session is needed' },
  'wrong-credentials': { status: 401, title: 'E-mail address or password is wrong' },
  'not-allowed': { status: 403, title: 'Your role does not allow this' },
  'cross-site': { status: 403, title: 'Writes from another site are refused' },
  'unknown-route': { status: 404, title: 'There is nothing at this address' },
  'not-found': { status: 404, title: 'There is no such thing' },
  'unknown-preset': { status: 422, title: 'There is no preset with this id' },
  'unknown-interface': { status: 422, title: 'There is no published interface version with this name' },
  'method-not-allowed': { status: 405, title: 'This address does not answer to this method' },
  'not-acceptable': { status: 406, title: 'None of the content types asked for can be given' },
  'conflict': { status: 409, title: 'The request contradicts what is there' },
  'already-revoked': { status: 409, title: 'The API key was revoked before' },
  'body-too-large': { status: 413, title: 'The body is too large' },
  'batch-too-large': { status: 413, title: 'The batch has too many attitudes' },
  'unsupported-media-type': { status: 415, title: 'This content type is not accepted here' },
  'unsupported-encoding': { status: 415, title: 'This content encoding is not accepted here' },
  'missing-facet': { status: 422, title: 'A convention must state every facet' },
  'unknown-facet': { status: 422, title: 'A convention has a facet that its representation does not have' },
  'invalid-facet': { status: 422, title: 'A facet has a value that it cannot have' },
  'missing-field': { status: 422, title: 'A required field is missing' },
  'unknown-field': { status: 422, title: 'The request has a field that does not exist' },
  'invalid-field': { status: 422, title: 'A field has a value that it cannot have' },
  'count-mismatch': { status: 422, title: 'An attitude has the wrong count of numbers' },
  'not-a-number': { status: 422, title: 'Where a number belongs stands something else' },
  'not-finite': { status: 422, title: 'A number is not finite' },
  'out-of-range': { status: 422, title: 'A number is too large to compute with' },
  'zero-norm': { status: 422, title: 'A quaternion or axis of norm zero has no direction' },
  'not-a-rotation': { status: 422, title: 'The numbers are no rotation' },
  'improper-axes': { status: 422, title: 'The two axis sets differ in handedness' },
  'unrelated-frames': { status: 422, title: 'The two frames cannot be related without a position or an epoch' },
  'not-representable': { status: 422, title: 'The attitude does not exist in the representation asked for' },
  'invalid-convention': { status: 422, title: 'The convention contradicts itself' },
  'impossible-inertia': { status: 422, title: 'No body can have this inertia matrix' },
  'too-many-requests': { status: 429, title: 'Too many requests in this minute' },
  'too-many-parallel': { status: 429, title: 'Too many requests at the same time' },
  'quota-exceeded': { status: 429, title: 'The attitudes of this month are used up' },
  'internal': { status: 500, title: 'The service failed to answer' },
  'cross-check-failed': { status: 500, title: 'The answer and its cross-check disagree; no answer is given' },
  'not-recorded': { status: 503, title: 'The call could not be recorded and was not answered' },
} as const satisfies Record<string, { status: number; title: string }>;

export type ProblemCode = keyof typeof PROBLEMS;

/** One thing wrong, with a JSON pointer (RFC 6901) into the body, or `?name` for a query parameter. */
export interface ProblemItem {
  readonly pointer: string;
  readonly message: string;
}
