import { useState } from 'react';
import { useForm } from 'react-hook-form';
import { Button } from '../../../components/button.tsx';
import { Dialog } from '../../../components/dialog.tsx';
import { TextField } from '../../../components/field.tsx';
import { ProblemNotice } from '../../../components/notice.tsx';
import { atFields } from '../../../lib/field-problems.ts';
import { useChangeLimits, type Limits, type RoleLimits } from '../api/usage.ts';

/** Names and bounds as the contract has them. */
const FIELDS: readonly (readonly [keyof Limits, string, number, number])[] = [
  ['requestsPerMinute', 'Requests a minute', 1, 1_000_000], ['attitudesPerMonth', 'Attitudes a month', 0, 1_000_000_000_000],
  ['attitudesPerCall', 'Attitudes a call', 1, 100_000], ['parallelRequests', 'Requests at once', 1, 1_000],
];
const POINTERS = Object.fromEntries(FIELDS.map(([name]) => [`/${name}`, name])) as Record<string, keyof Limits>;

export function LimitsDialog({ limits, onClose }: { limits: RoleLimits; onClose: () => void }) {
  const change = useChangeLimits();
  const { role, ...values } = limits;
  const [elsewhere, setElsewhere] = useState<Error | null>(null);
  const { register, handleSubmit, setError, formState: { errors } } = useForm<Record<keyof Limits, string>>({ defaultValues: Object.fromEntries(Object.entries(values).map(([name, value]) => [name, String(value)])) });
  const submit = handleSubmit((texts) => change.mutate({ role, ...(Object.fromEntries(FIELDS.map(([name]) => [name, Number(texts[name])])) as unknown as Limits) }, {
    onSuccess: onClose,
    onError: (error) => setElsewhere(atFields(error, POINTERS, (name, message) => setError(name, { message }, { shouldFocus: true })) ? null : error),
  }));
  return (
    <Dialog title={`Limits of the role ${role}`} onClose={onClose}>
      <form className="space-y-4" noValidate onSubmit={(event) => void submit(event)}>
        <p className="text-soft">For each key of the role, and each person signed in with it. In force on the next request.</p>
        {FIELDS.map(([name, label, least, most]) => (
          <TextField key={name} label={label} figures inputMode="numeric" error={errors[name]?.message}
            {...register(name, { validate: (text) => (/^\d+$/.test(text.trim()) && Number(text) >= least && Number(text) <= most) || `A whole number from ${least} to ${most}.` })} />
        ))}
        {elsewhere && <ProblemNotice error={elsewhere} />}
        <div className="flex justify-end gap-3"><Button onClick={onClose}>Cancel</Button><Button kind="main" type="submit" busy={change.isPending}>Change limits</Button></div>
      </form>
    </Dialog>
  );
}
