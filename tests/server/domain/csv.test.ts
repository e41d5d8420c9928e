import { describe, expect, it } from 'vitest';
import { csvRow } from '#server/domain/history/csv.ts';

describe('csvRow', () => {
  it('leaves numbers numbers, negative ones too', () => {
    expect(csvRow([-1.5, 0, 1e-7, null])).toBe('-1.5,0,1e-7,\r\n');
  });

  // The characters that OWASP's page on CSV injection lists (=, +, -, @, tab, carriage return), from memory; the full-width ones are common practice.
  it.each(['=1+1', '+1', '-1', '@SUM(A1)', '\t=1', '\r=1', '  =HYPERLINK("x")', '|cmd', '＝1'])('puts an apostrophe before %j', (text) => {
    const cell = csvRow([text]).slice(0, -2);
    expect(cell.replace(/^"/, '')).toMatch(/^'/);
  });

  // RFC 4180, section 2, rules 6 and 7.
  it('quotes commas, line breaks and quotes, and doubles quotes', () => {
    expect(csvRow(['a,b', 'say "no"', 'two\nlines', 'plain'])).toBe('"a,b","say ""no""","two\nlines",plain\r\n');
  });
});
