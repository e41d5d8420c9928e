import type { ButtonHTMLAttributes } from 'react';

type Kind = 'main' | 'plain' | 'quiet' | 'link';

const LOOK: Record<Kind, string> = {
  main: 'min-h-10 px-3.5 py-1.5 font-medium border-accent bg-accent text-accent-ink hover:brightness-110',
  plain: 'min-h-10 px-3.5 py-1.5 font-medium border-rule bg-transparent hover:bg-well',
  quiet: 'min-h-10 px-3.5 py-1.5 font-medium border-transparent underline decoration-rule underline-offset-4 hover:text-accent',
  /** Reads as a link within a row of text or a table. */
  link: '-my-1 min-h-8 border-transparent text-left underline decoration-rule underline-offset-4 hover:text-accent',
};

/** A button; `busy` keeps its place and says that the work is under way. */
export function Button({ kind = 'plain', busy = false, className = '', children, disabled, ...rest }: ButtonHTMLAttributes<HTMLButtonElement> & { kind?: Kind; busy?: boolean }) {
  return (
    <button type="button" {...rest} disabled={disabled === true || busy} aria-busy={busy || undefined}
      className={`inline-flex cursor-pointer items-center justify-center gap-2 border disabled:cursor-not-allowed disabled:opacity-60 ${LOOK[kind]} ${className}`}>
      {busy ? 'Working…' : children}
    </button>
  );
}
