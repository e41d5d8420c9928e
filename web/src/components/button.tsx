import type { ButtonHTMLAttributes } from 'react';

type Kind = 'main' | 'plain' | 'quiet';

const LOOK: Record<Kind, string> = {
  main: 'border-accent bg-accent text-accent-ink hover:brightness-110',
  plain: 'border-rule bg-transparent hover:bg-well',
  quiet: 'border-transparent underline decoration-rule underline-offset-4 hover:text-accent',
};

/** A button; `busy` keeps its place and says that the work is under way. */
export function Button({ kind = 'plain', busy = false, className = '', children, disabled, ...rest }: ButtonHTMLAttributes<HTMLButtonElement> & { kind?: Kind; busy?: boolean }) {
  return (
    <button type="button" {...rest} disabled={disabled === true || busy} aria-busy={busy || undefined}
      className={`inline-flex min-h-10 cursor-pointer items-center justify-center gap-2 border px-3.5 py-1.5 font-medium disabled:cursor-not-allowed disabled:opacity-60 ${LOOK[kind]} ${className}`}>
      {busy ? 'Working…' : children}
    </button>
  );
}
