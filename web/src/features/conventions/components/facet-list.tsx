import type { Convention } from '../../../../../shared/attitude/convention.ts';

/** Every facet of a convention by name. */
export function FacetList({ convention }: { convention: Convention }) {
  return (
    <dl className="grid grid-cols-[8.5rem_1fr] border-t border-hair">
      {Object.entries(convention).map(([facet, value]) => (
        <div key={facet} className="contents">
          <dt className="border-b border-hair py-1.5 text-soft">{facet}</dt>
          <dd className="border-b border-hair py-1.5 break-words"><code>{Array.isArray(value) ? `[${value.join(', ')}]` : String(value)}</code></dd>
        </div>
      ))}
    </dl>
  );
}
