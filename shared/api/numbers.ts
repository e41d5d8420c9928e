import { z } from 'zod';

/**
 * Rows of numbers, checked as an array only: the numbers themselves are checked by a hand loop that names every
 * bad index (a schema over 100,000 rows costs ten times as much). The documentation shows the full shape.
 */
export const numberRows = z.custom<unknown[]>((value) => Array.isArray(value), { error: 'must be an array of arrays of numbers' })
  .meta({ override: { type: 'array', items: { type: 'array', items: { type: 'number' } } }, description: 'One row of numbers per attitude, in the order and count that the convention states.' });

/** As `numberRows`; a row-major matrix may also stand as three rows of three. */
export const attitudeRows = z.custom<unknown[]>((value) => Array.isArray(value), { error: 'must be an array of attitudes, each an array of numbers' })
  .meta({
    override: { type: 'array', minItems: 1, items: { type: 'array', items: { anyOf: [{ type: 'number' }, { type: 'array', items: { type: 'number' }, minItems: 3, maxItems: 3 }] } } },
    description: 'One array of numbers per attitude, in the count and order that the convention states. A row-major matrix may also stand as three rows of three.',
  });
