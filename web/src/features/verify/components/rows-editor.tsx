import { useId } from 'react';
import { plural } from '../../../lib/format.ts';
import type { ParsedRows } from '../model/parse-rows.ts';

/** A field for many rows of numbers: typed, pasted, or dropped as a CSV file. */
export function RowsEditor({ label, text, parsed, onChange }: { label: string; text: string; parsed: ParsedRows; onChange: (text: string) => void }) {
  const id = useId();
  async function take(file: File | undefined) {
    if (file) onChange(await file.text());
  }
  return (
    <div onDragOver={(event) => event.preventDefault()} onDrop={(event) => { event.preventDefault(); void take(event.dataTransfer.files[0]); }}>
      <div className="flex items-end justify-between gap-3">
        <label htmlFor={id} className="lettering mb-1 block text-soft">{label}</label>
        <label className="mb-1 cursor-pointer text-sm underline decoration-rule underline-offset-4 focus-within:outline-2 focus-within:outline-accent hover:text-accent">
          Choose a file<input type="file" accept=".csv,.txt,text/csv,text/plain" className="sr-only" aria-label={`${label}: choose a file`} onChange={(event) => void take(event.target.files?.[0])} />
        </label>
      </div>
      <textarea id={id} value={text} rows={8} spellCheck={false} onChange={(event) => onChange(event.target.value)} aria-invalid={parsed.error !== null || undefined} aria-describedby={`${id}-state`}
        className="figures w-full resize-y border border-rule bg-sheet px-2.5 py-1.5 aria-invalid:border-2 aria-invalid:border-accent" />
      <p id={`${id}-state`} className={`text-sm ${parsed.error ? 'font-medium text-accent' : 'text-soft'}`}>{parsed.error ?? `${plural(parsed.rows.length, 'attitude')}, one a line. A file can be dropped here.`}</p>
    </div>
  );
}
