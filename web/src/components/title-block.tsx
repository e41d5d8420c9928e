import type { ReactNode } from 'react';

export type TitleCell = readonly [label: string, value: ReactNode];

/** The named cells in a corner of a drawing: in a strip at the foot, or two by two. */
export function TitleBlock({ cells, square = false }: { cells: readonly TitleCell[]; square?: boolean }) {
  return (
    <dl className={`gap-px border-t border-rule bg-hair ${square ? 'grid grid-cols-[1fr_auto]' : 'grid grid-cols-2 sm:flex'}`}>
      {cells.map(([label, value]) => (
        <div key={label} className="grow bg-sheet px-4 py-1.5">
          <dt className="lettering text-soft">{label}</dt>
          <dd className="break-words">{value}</dd>
        </div>
      ))}
    </dl>
  );
}
