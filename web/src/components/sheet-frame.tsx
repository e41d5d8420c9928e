import type { ReactNode } from 'react';

const COLUMNS = ['1', '2', '3', '4', '5', '6', '7', '8'];
const ROWS = ['A', 'B', 'C', 'D', 'E', 'F'];

/** The border of a drawing sheet. Where there is room, its margin carries the grid references of a drawing (ISO 5457), for the look alone. */
export function SheetFrame({ children, className = '' }: { children: ReactNode; className?: string }) {
  return (
    <div className={`relative border border-hair xl:p-6 ${className}`}>
      <div aria-hidden="true" className="figures pointer-events-none absolute inset-0 hidden text-soft select-none xl:block">
        {(['top-0', 'bottom-0'] as const).map((edge) => <div key={edge} className={`absolute inset-x-6 flex h-6 ${edge}`}>{COLUMNS.map((column) => <span key={column} className="grid grow place-items-center border-l border-hair first:border-l-0">{column}</span>)}</div>)}
        {(['left-0', 'right-0'] as const).map((edge) => <div key={edge} className={`absolute inset-y-6 flex w-6 flex-col ${edge}`}>{ROWS.map((row) => <span key={row} className="grid grow place-items-center border-t border-hair first:border-t-0">{row}</span>)}</div>)}
      </div>
      <div className="relative flex min-h-full grow flex-col border-rule bg-sheet xl:border">{children}</div>
    </div>
  );
}
