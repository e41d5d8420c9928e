import type { Representation } from '../../../../../shared/attitude/convention.ts';
import type { Convention } from '../../../../../shared/attitude/convention.ts';
import { PRESETS } from '../../../../../shared/attitude/presets.ts';
import { SelectField } from '../../../components/field.tsx';
import { BODY_CHOICES, FACETS, inRepresentation, REFERENCE_CHOICES, REPRESENTATIONS } from '../model/facet-choices.ts';
import { statementOf, type Statement } from '../model/workbench-state.ts';

const show = (value: unknown): string => (Array.isArray(value) ? `[${value.join(', ')}]` : String(value));

/** States a convention: a preset, or every facet by hand. Changing a facet leaves the preset. */
export function ConventionEditor({ legend, statement, onChange }: { legend: string; statement: Statement; onChange: (statement: Statement) => void }) {
  const { convention } = statement;
  const facets = convention as unknown as Record<string, unknown>;
  const restate = (changed: Convention) => onChange({ preset: null, convention: changed });
  return (
    <fieldset className="border border-hair p-4">
      <legend className="px-1 text-lg font-semibold">{legend}</legend>
      <SelectField label="Stated by" value={statement.preset ?? ''} onChange={(event) => (event.target.value === '' ? restate(convention) : onChange(statementOf(event.target.value)))}>
        <option value="">every facet by hand</option>
        {PRESETS.map(({ id, title }) => <option key={id} value={id}>{title} ({id})</option>)}
      </SelectField>
      <details className="mt-3" open={statement.preset === null}>
        <summary className="cursor-pointer py-1">Facets: {convention.representation}, {convention.reference} to {convention.body}</summary>
        <div className="mt-2 grid grid-cols-2 gap-3">
          <SelectField label="representation" className="col-span-2" value={convention.representation} onChange={(event) => restate(inRepresentation(convention, event.target.value as Representation))}>
            {REPRESENTATIONS.map((representation) => <option key={representation}>{representation}</option>)}
          </SelectField>
          <SelectField label="reference" value={convention.reference} onChange={(event) => restate({ ...convention, reference: event.target.value })}>
            {REFERENCE_CHOICES.map((axes) => <option key={axes}>{axes}</option>)}
          </SelectField>
          <SelectField label="body" value={convention.body} onChange={(event) => restate({ ...convention, body: event.target.value })}>
            {BODY_CHOICES.map((axes) => <option key={axes}>{axes}</option>)}
          </SelectField>
          {FACETS[convention.representation].map(([facet, choices]) => (
            <SelectField key={facet} label={facet} value={show(facets[facet])} onChange={(event) => restate({ ...convention, [facet]: choices.find((choice) => show(choice) === event.target.value) } as Convention)}>
              {choices.map((choice) => <option key={show(choice)}>{show(choice)}</option>)}
            </SelectField>
          ))}
        </div>
      </details>
    </fieldset>
  );
}
