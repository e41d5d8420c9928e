import { useId, type InputHTMLAttributes, type ReactNode, type SelectHTMLAttributes } from 'react';

const BOX = 'w-full min-h-10 border border-rule bg-sheet px-2.5 py-1.5 aria-invalid:border-accent aria-invalid:border-2';

interface Around {
  readonly label: string;
  readonly hint?: ReactNode;
  readonly error?: string | undefined;
  readonly className?: string;
}

function Labelled({ id, label, hint, error, className = '', children }: Around & { id: string; children: ReactNode }) {
  return (
    <div className={className}>
      <label htmlFor={id} className="lettering mb-1 block text-soft">{label}</label>
      {children}
      {hint !== undefined && <p id={`${id}-hint`} className="mt-1 text-sm text-soft">{hint}</p>}
      {error !== undefined && <p id={`${id}-error`} className="mt-1 text-sm font-medium text-accent">{error}</p>}
    </div>
  );
}

const describedBy = (id: string, { hint, error }: Around) => [hint !== undefined && `${id}-hint`, error !== undefined && `${id}-error`].filter(Boolean).join(' ') || undefined;

export function TextField({ label, hint, error, className, figures = false, ...input }: Around & InputHTMLAttributes<HTMLInputElement> & { figures?: boolean; ref?: React.Ref<HTMLInputElement> }) {
  const id = useId();
  const around = { label, hint, error };
  return (
    <Labelled id={id} {...around} {...(className === undefined ? {} : { className })}>
      <input id={id} {...input} className={`${BOX} ${figures ? 'figures' : ''}`} aria-invalid={error !== undefined || undefined} aria-describedby={describedBy(id, around)} />
    </Labelled>
  );
}

export function SelectField({ label, hint, error, className, children, ...select }: Around & SelectHTMLAttributes<HTMLSelectElement> & { ref?: React.Ref<HTMLSelectElement> }) {
  const id = useId();
  const around = { label, hint, error };
  return (
    <Labelled id={id} {...around} {...(className === undefined ? {} : { className })}>
      <select id={id} {...select} className={BOX} aria-invalid={error !== undefined || undefined} aria-describedby={describedBy(id, around)}>{children}</select>
    </Labelled>
  );
}
