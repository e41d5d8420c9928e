import { Link, useSearchParams } from 'react-router-dom';
import { SelectField } from '../../../components/field.tsx';
import { Table } from '../../../components/table.tsx';
import type { Preset } from '../api/conventions.ts';
import { compareConventions } from '../model/compare-conventions.ts';

/** Two presets side by side, chosen in the address: what differs, and one worked attitude in both. */
export function ConventionComparison({ presets }: { presets: readonly Preset[] }) {
  const [search, setSearch] = useSearchParams();
  const chosen = (side: string, otherwise: string): Preset => [search.get(side), otherwise].map((id) => presets.find((preset) => preset.id === id)).find((preset) => preset !== undefined) ?? presets[0]!;
  const left = chosen('left', 'aircraft-euler-deg');
  const right = chosen('right', 'aircraft-quaternion');
  const facets = compareConventions(left.convention, right.convention);
  const different = facets.filter(({ differs }) => differs).length;
  return (
    <section className="mt-10" aria-label="Compare two conventions">
      <h2 className="mb-3 text-lg font-semibold">Compare two</h2>
      <div className="mb-4 grid gap-3 sm:grid-cols-2">
        {([['First', 'left', left], ['Second', 'right', right]] as const).map(([label, side, preset]) => (
          <SelectField key={side} label={label} value={preset.id} onChange={(event) => setSearch({ left: left.id, right: right.id, [side]: event.target.value }, { replace: true })}>
            {presets.map(({ id, title }) => <option key={id} value={id}>{title} ({id})</option>)}
          </SelectField>
        ))}
      </div>
      <p className="mb-3" aria-live="polite">{different === 0 ? 'Every facet is the same.' : `${different} of ${facets.length} facets ${different === 1 ? 'differs' : 'differ'}.`}</p>
      <Table caption="Facets of the two conventions" rows={facets} rowKey={({ facet }) => facet} columns={[
        { title: 'Facet', cell: ({ facet }) => facet },
        { title: 'First', cell: ({ left: value }) => (value === null ? 'no such facet' : <code>{value}</code>) },
        { title: 'Second', cell: ({ right: value }) => (value === null ? 'no such facet' : <code>{value}</code>) },
        { title: 'Compared', cell: ({ differs }) => (differs ? <strong>differs</strong> : <span className="text-soft">same</span>) },
      ]} />
      <div className="mt-4 grid gap-6 sm:grid-cols-2">
        {[left, right].map((preset, i) => (
          <div key={i}>
            <h3 className="font-semibold">Worked attitude, {i === 0 ? 'first' : 'second'}</h3>
            <p className="text-soft">{preset.worked.reading}</p>
            <ol className="figures">{preset.worked.numbers.map((number, k) => <li key={k} className="border-b border-hair py-1 break-all">{number}</li>)}</ol>
          </div>
        ))}
      </div>
      <p className="mt-3"><Link to={`/workbench?${new URLSearchParams([['from', left.id], ['to', right.id], ...left.worked.numbers.map((number) => ['n', String(number)])])}`}>Convert it from the first to the second in the workbench</Link></p>
    </section>
  );
}
