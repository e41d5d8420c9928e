/** A verdict by word and shape: a tick in a circle for a pass, a cross in a square for a failure. */
export function VerdictMark({ verdict }: { verdict: 'pass' | 'fail' }) {
  return (
    <span className={`inline-flex items-center gap-1.5 font-semibold ${verdict === 'fail' ? 'text-accent' : ''}`}>
      <svg viewBox="0 0 16 16" width="15" height="15" fill="none" stroke="currentColor" strokeWidth="1.6" aria-hidden="true">
        {verdict === 'pass' ? <><circle cx="8" cy="8" r="7" /><path d="M4.5 8.5l2.5 3 4.5-6.5" /></> : <path d="M1 1h14v14H1zM5 5l6 6M11 5l-6 6" />}
      </svg>
      {verdict}
    </span>
  );
}
