import type { ReactNode } from 'react';

export interface Column<Row> {
  readonly title: string;
  readonly cell: (row: Row) => ReactNode;
  readonly numeric?: boolean;
}

/**
 * A table with hairline rules. On narrow screens each row becomes a block of named values, so that nothing is cut off
 * and the page never scrolls sideways.
 */
export function Table<Row>({ caption, columns, rows, rowKey }: { caption: string; columns: readonly Column<Row>[]; rows: readonly Row[]; rowKey: (row: Row) => string }) {
  return (
    <table className="w-full border-collapse text-left">
      <caption className="sr-only">{caption}</caption>
      <thead className="hidden md:table-header-group">
        <tr className="border-y border-rule">
          {columns.map(({ title, numeric }) => <th key={title} scope="col" className={`lettering px-3 py-2 text-soft first:pl-0 last:pr-0 ${numeric ? 'text-right' : ''}`}>{title}</th>)}
        </tr>
      </thead>
      <tbody>
        {rows.map((row) => (
          <tr key={rowKey(row)} className="block border-b border-hair py-2 hover:bg-well md:table-row md:py-0">
            {columns.map(({ title, cell, numeric }) => (
              <td key={title} className={`flex gap-3 px-0 py-0.5 align-top md:table-cell md:px-3 md:py-2 md:first:pl-0 md:last:pr-0 ${numeric ? 'md:text-right' : ''}`}>
                <span aria-hidden="true" className="lettering w-28 shrink-0 pt-0.5 text-soft md:hidden">{title}</span>
                <span className="min-w-0 break-words">{cell(row)}</span>
              </td>
            ))}
          </tr>
        ))}
      </tbody>
    </table>
  );
}
