/** The strip of named cells at the foot of a drawing. */
export function TitleBlock({ cells }: { cells: readonly (readonly [label: string, value: string])[] }) {
  return (
    <dl className="grid grid-cols-2 border-t border-rule sm:flex">
      {cells.map(([label, value]) => (
        <div key={label} className="grow border-r border-b border-hair px-4 py-1.5 last:border-r-0 sm:border-b-0">
          <dt className="lettering text-soft">{label}</dt>
          <dd className="break-words">{value}</dd>
        </div>
      ))}
    </dl>
  );
}
