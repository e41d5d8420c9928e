import { useId } from 'react';
import { Button } from '../../../components/button.tsx';
import { SelectField } from '../../../components/field.tsx';
import { plural } from '../../../lib/format.ts';
import { numberLabels } from '../../workbench/model/number-labels.ts';
import type { ReadRecording, Recording } from '../model/recording.ts';

/** A file of this many characters is named rather than shown: a text field of megabytes makes the browser slow. */
const SHOWN_AT_MOST = 500_000;

/** Rows of numbers: typed, pasted, chosen or dropped as a file; and which of their columns are meant. */
export function RecordingEditor({ label, recording, read, onChange }: { label: string; recording: Recording; read: ReadRecording; onChange: (recording: Recording) => void }) {
  const id = useId();
  async function take(file: File | undefined) {
    if (file) onChange({ ...recording, text: await file.text(), file: file.name, columns: [] });
  }
  const hidden = recording.text.length > SHOWN_AT_MOST;
  return (
    <div onDragOver={(event) => event.preventDefault()} onDrop={(event) => { event.preventDefault(); void take(event.dataTransfer.files[0]); }}>
      <div className="flex items-end justify-between gap-3">
        <label htmlFor={id} className="lettering mb-1 block text-soft">{label}</label>
        <label className="mb-1 cursor-pointer text-sm underline decoration-rule underline-offset-4 focus-within:outline-2 focus-within:outline-offset-2 focus-within:outline-accent hover:text-accent">
          Choose a file<input type="file" accept=".csv,.tsv,.txt,text/csv,text/plain" className="sr-only" aria-label={`${label}: choose a file`} onChange={(event) => { void take(event.target.files?.[0]); event.target.value = ''; }} />
        </label>
      </div>
      {hidden
        ? <div id={id} className="flex flex-wrap items-center justify-between gap-3 border border-rule bg-well px-3 py-2"><span><span className="font-semibold">{recording.file ?? 'Pasted'}</span>, too long to show</span><Button onClick={() => onChange({ ...recording, text: '', file: null, columns: [] })}>Remove</Button></div>
        : <textarea id={id} value={recording.text} rows={8} spellCheck={false} onChange={(event) => onChange({ ...recording, text: event.target.value, file: null })} aria-invalid={read.error !== null || undefined} aria-describedby={`${id}-state`}
          className="figures block w-full resize-y border border-rule bg-sheet px-2.5 py-1.5 aria-invalid:border-2 aria-invalid:border-accent" />}
      <p id={`${id}-state`} className={`mt-1 text-sm ${read.error ? 'font-medium text-accent' : 'text-soft'}`}>{read.error ?? stateOf(recording, read)}</p>
      {read.table.columns.length > read.columns.length && (
        <fieldset className="mt-3 grid grid-cols-2 gap-3 sm:grid-cols-3">
          <legend className="lettering mb-1 text-soft">Columns of {label.toLowerCase()}</legend>
          {numberLabels(recording.statement.convention).map((name, i) => (
            <SelectField key={i} label={name} value={read.columns[i] ?? ''} onChange={(event) => onChange({ ...recording, columns: read.columns.map((column, j) => (j !== i ? column : event.target.value === '' ? null : Number(event.target.value))) })}>
              <option value="">choose</option>
              {read.table.columns.map((column, k) => <option key={k} value={k}>{column}</option>)}
            </SelectField>
          ))}
        </fieldset>
      )}
    </div>
  );
}

function stateOf({ file }: Recording, { attitudes }: ReadRecording): string {
  if (attitudes.length === 0) return 'One attitude a line; the first line may name the columns. A file can be dropped here.';
  return `${plural(attitudes.length, 'attitude')}${file === null ? '' : ` from ${file}`}.`;
}
