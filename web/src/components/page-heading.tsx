import type { ReactNode } from 'react';
import { useTitle } from '../lib/use-title.ts';

/** A page's name, one sentence on what it is for, and its main action. */
export function PageHeading({ title, children, action }: { title: string; children?: ReactNode; action?: ReactNode }) {
  useTitle(title);
  return (
    <div className="mb-6 flex flex-wrap items-end justify-between gap-x-8 gap-y-3 border-b border-rule pb-4">
      <div>
        <h1 className="text-2xl font-semibold">{title}</h1>
        {children && <p className="mt-1 max-w-[68ch] text-soft">{children}</p>}
      </div>
      {action}
    </div>
  );
}
