import type { ReactNode } from 'react';
import { ApiError } from '../lib/api-error.ts';

/** A shape for each kind, so that colour says nothing alone. */
const SHAPES = {
  problem: <path d="M3 3l10 10M13 3L3 13" />,
  caution: <path d="M8 2l6.5 12h-13zM8 6v4M8 11.6v.8" />,
  done: <path d="M2.5 8.5l3.5 4 7.5-9" />,
  note: <path d="M8 7v6M8 3.4v1M2 1h12v14H2z" />,
};

export function Notice({ kind, title, children }: { kind: keyof typeof SHAPES; title: string; children?: ReactNode }) {
  return (
    <div role={kind === 'problem' ? 'alert' : 'status'} className={`flex gap-3 border-l-4 px-4 py-3 ${kind === 'problem' || kind === 'caution' ? 'border-accent bg-accent-wash' : 'border-rule bg-well'}`}>
      <svg viewBox="0 0 16 16" width="18" height="18" className="mt-0.5 shrink-0" fill="none" stroke="currentColor" strokeWidth="1.6" aria-hidden="true">{SHAPES[kind]}</svg>
      <div className="min-w-0 break-words">
        <p className="font-semibold">{title}</p>
        {children}
      </div>
    </div>
  );
}

/** What went wrong, in the service's own words, with each field it names. */
export function ProblemNotice({ error }: { error: Error }) {
  if (!(error instanceof ApiError)) return <Notice kind="problem" title="No answer from the service"><p>{error.message}</p></Notice>;
  const { problem } = error;
  return (
    <Notice kind="problem" title={problem.title}>
      <p>{problem.detail}</p>
      {problem.errors.length > 1 && <ul className="mt-1 list-inside list-disc">{problem.errors.slice(0, 10).map(({ pointer, message }, i) => <li key={i}><code>{pointer}</code> {message}</li>)}</ul>}
      <p className="mt-1 text-sm text-soft">Code <code>{problem.code}</code></p>
    </Notice>
  );
}
