import type { ReactNode } from 'react';

export interface Column<Row> {
  readonly title: string;
  readonly cell: (row: Row) => ReactNode;
  readonly numeric?: boolean;
  /** Kept on one line: a time, a name without blanks. */
  readonly nowrap?: boolean;
  /** Left out where rows are blocks: what opens from the row says it too. */
  readonly minor?: boolean;
}

/** Where a table turns into blocks: written out, since Tailwind reads class names from the source. */
const SHAPES = {
  narrow: { head: 'hidden md:table-header-group', row: 'md:table-row md:py-0', cell: 'md:table-cell md:px-3 md:py-2 md:first:pl-0 md:last:pr-0', numeric: 'md:text-right', nowrap: 'md:whitespace-nowrap', label: 'md:hidden' },
  wide: { head: 'hidden lg:table-header-group', row: 'sm:grid-cols-2 lg:table-row lg:py-0', cell: 'lg:table-cell lg:px-2.5 lg:py-2 lg:first:pl-0 lg:last:pr-0', numeric: 'lg:text-right', nowrap: 'lg:whitespace-nowrap', label: 'lg:hidden' },
};

/**
 * A table with hairline rules. On narrow screens each row becomes a block of named values, so that nothing is cut off
 * and the page never scrolls sideways; a `wide` one, of many columns, does so earlier.
 */
export function Table<Row>({ caption, columns, rows, rowKey, wide = false }: { caption: string; columns: readonly Column<Row>[]; rows: readonly Row[]; rowKey: (row: Row) => string; wide?: boolean }) {
  const shape = wide ? SHAPES.wide : SHAPES.narrow;
  return (
    <table className="w-full border-collapse text-left">
      <caption className="sr-only">{caption}</caption>
      <thead className={shape.head}>
        <tr className="border-y border-rule">
          {columns.map(({ title, numeric }) => <th key={title} scope="col" className={`lettering py-2 align-bottom text-soft first:pl-0 last:pr-0 ${wide ? 'px-2.5' : 'px-3'} ${numeric ? 'text-right' : ''}`}>{title}</th>)}
        </tr>
      </thead>
      <tbody>
        {rows.map((row) => (
          <tr key={rowKey(row)} className={`grid gap-x-6 border-b border-hair py-2 first:border-t first:border-t-rule hover:bg-well ${shape.row}`}>
            {columns.map(({ title, cell, numeric, nowrap, minor }) => (
              <td key={title} className={`${minor ? 'hidden' : 'flex'} gap-3 px-0 py-0.5 align-top ${shape.cell} ${numeric ? shape.numeric : ''} ${nowrap ? shape.nowrap : ''}`}>
                <span aria-hidden="true" className={`lettering w-28 shrink-0 pt-0.5 text-soft ${shape.label}`}>{title}</span>
                <span className="min-w-0 break-words">{cell(row)}</span>
              </td>
            ))}
          </tr>
        ))}
      </tbody>
    </table>
  );
}
