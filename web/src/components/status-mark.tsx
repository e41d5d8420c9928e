/** An HTTP status told by word and shape: a tick for an answer, a cross for a refusal, a bar for a failure of the service. */
export function StatusMark({ status, code }: { status: number; code: string | null }) {
  const kind = status < 400 ? 'answered' : status < 500 ? 'refused' : 'failed';
  return (
    <span className="inline-flex items-baseline gap-1.5">
      <svg viewBox="0 0 12 12" width="11" height="11" fill="none" stroke="currentColor" strokeWidth="1.8" aria-hidden="true" className={kind === 'answered' ? '' : 'text-accent'}>
        <path d={kind === 'answered' ? 'M1.5 6.5L4.5 10 10.5 2' : kind === 'refused' ? 'M2 2l8 8M10 2l-8 8' : 'M1 6h10M1 3h10M1 9h10'} />
      </svg>
      <span><span className="figures">{status}</span> {kind}{code !== null && <><br className="hidden md:block" /> <code className="text-soft">{code}</code></>}</span>
    </span>
  );
}
