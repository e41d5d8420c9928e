import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { parseTable, pick } from '../../../../web/src/features/verify/model/parse-table.ts';

describe('reading a recording', () => {
  it.each([
    ['commas', '1,2,3\n4,5,6'],
    ['semicolons and blanks', ' 1 ; 2;3 \n4; 5 ;6'],
    ['tabs', '1\t2\t3\n4\t5\t6'],
    ['blanks', '1  2 3\n4 5   6'],
    ['JSON rows', '[[1,2,3],\n[4,5,6]]'],
    ['Windows line ends, a byte order mark, remarks, empty lines', '\uFEFF# gimbal\r\n1,2,3\r\n\r\n4,5,6\r\n'],
  ])('takes %s', (_, text) => {
    expect(parseTable(text)).toEqual({ columns: ['column 1', 'column 2', 'column 3'], rows: [[1, 2, 3], [4, 5, 6]], error: null });
  });

  it('takes names of columns from the first line only', () => {
    expect(parseTable('t,"yaw",pitch\n0,1,2').columns).toEqual(['t', 'yaw', 'pitch']);
    expect(parseTable('0,1,2\nt,yaw,pitch').error).toBe('Line 2: "t" is not a number.');
  });

  it.each(['nan,nan,nan', 'NaN,0,0', 'inf,inf,inf', 'Infinity,1,2'])('never takes a row of values without meaning for names: %s', (row) => {
    expect(parseTable(`1,2,3\n${row}\n4,5,6`).error).toMatch(/^Line 2: .* is not a number\.$/);
    expect(parseTable(`${row}\n1,2,3`).error).toMatch(/^Line 1: /);
  });

  it('keeps an empty cell as an error rather than closing the gap', () => {
    expect(parseTable('1,2,3\n4,,6').error).toBe('Line 2: "" is not a number.');
  });

  it('says where the count of numbers changes', () => {
    expect(parseTable('1,2,3\n4,5').error).toBe('Line 2 has 2 numbers; the lines before it have 3.');
  });

  it('holds nothing when nothing was pasted', () => {
    expect(parseTable(' \n# only a remark\n')).toEqual({ columns: [], rows: [], error: null });
  });

  it('reads back to the last bit what was written, in whatever order the columns are chosen', () => {
    const finite = fc.double({ noNaN: true, noDefaultInfinity: true }).map((value) => value + 0);
    fc.assert(fc.property(fc.array(fc.tuple(finite, finite, finite, finite), { minLength: 1, maxLength: 20 }), fc.constantFrom(',', ';', '\t', ' '), (rows, separator) => {
      const table = parseTable(rows.map((row) => row.join(separator)).join('\n'));
      expect(table.error).toBeNull();
      expect(pick(table, [3, 0, 1, 2])).toEqual(rows.map(([a, b, c, d]) => [d, a, b, c]));
    }), { numRuns: 50 });
  });
});
