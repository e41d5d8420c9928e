/** A double's shortest text has at most 24 characters; a separator follows it. */
const LONGEST_NUMBER = 25;

/** One for the whole thread, which writes one part at a time: memory made anew for every part would pile up between collections. */
let scratch = Buffer.alloc(0);

/**
 * Rows as text, each number as the shortest text that reads back to the same double. Written row by row into one
 * buffer: a string of a whole part would be built twice over and thrown away.
 */
export function textRows(numbers: Float64Array, width: number, before: string, after: string): Uint8Array {
  const most = (numbers.length / width) * (width * LONGEST_NUMBER + before.length + after.length);
  if (scratch.length < most) scratch = Buffer.allocUnsafeSlow(most);
  let at = 0;
  for (let i = 0; i < numbers.length; i += width) {
    let row = before + numbers[i]!;
    for (let k = 1; k < width; k++) row += `,${numbers[i + k]!}`;
    at += scratch.write(row + after, at, 'latin1');
  }
  return new Uint8Array(scratch.subarray(0, at));
}
