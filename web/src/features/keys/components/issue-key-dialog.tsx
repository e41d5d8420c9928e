import { useState } from 'react';
import { useForm } from 'react-hook-form';
import { Button } from '../../../components/button.tsx';
import { Dialog } from '../../../components/dialog.tsx';
import { CodeBlock } from '../../../components/code-block.tsx';
import { SelectField, TextField } from '../../../components/field.tsx';
import { Notice, ProblemNotice } from '../../../components/notice.tsx';
import { atFields } from '../../../lib/field-problems.ts';
import { useIssueKey, type IssueKeyInput } from '../api/keys.ts';

interface FormValues {
  name: string;
  role: IssueKeyInput['role'];
  expires: string;
}

const FIELDS = { '/name': 'name', '/role': 'role', '/expiresAt': 'expires' } as const;

/** Issues a key; its secret is shown here once and is nowhere to be had afterwards. */
export function IssueKeyDialog({ onClose }: { onClose: () => void }) {
  const issue = useIssueKey();
  const [elsewhere, setElsewhere] = useState<Error | null>(null);
  const { register, handleSubmit, setError, formState: { errors } } = useForm<FormValues>({ defaultValues: { name: '', role: 'engineer', expires: '' } });
  if (issue.data) return <SecretDialog name={issue.data.key.name} secret={issue.data.secret} onClose={onClose} />;

  const submit = handleSubmit(({ name, role, expires }) => issue.mutate({ name, role, expiresAt: expires === '' ? null : `${expires}T23:59:59Z` }, {
    onError: (error) => setElsewhere(atFields(error, FIELDS, (field, message) => setError(field, { message }, { shouldFocus: true })) ? null : error),
  }));
  return (
    <Dialog title="Issue an API key" onClose={onClose}>
      <form className="space-y-4" noValidate onSubmit={(event) => void submit(event)}>
        <TextField label="Name" hint="What uses it: a pipeline, a rig." maxLength={80} error={errors.name?.message} {...register('name', { validate: (name) => name.trim() !== '' || 'Give the key a name.' })} />
        <SelectField label="Role" hint="What calls with this key may do; a reviewer reads only." {...register('role')}>
          {['engineer', 'integrator', 'reviewer', 'administrator'].map((role) => <option key={role}>{role}</option>)}
        </SelectField>
        <TextField label="Last day" type="date" hint="The key stops working after this day (UTC). Empty: it does not expire." error={errors.expires?.message}
          {...register('expires', { validate: (day) => day === '' || `${day}T23:59:59Z` > new Date().toISOString() || 'This day has passed.' })} />
        {elsewhere && <ProblemNotice error={elsewhere} />}
        <div className="flex justify-end gap-3"><Button onClick={onClose}>Cancel</Button><Button kind="main" type="submit" busy={issue.isPending}>Issue key</Button></div>
      </form>
    </Dialog>
  );
}

function SecretDialog({ name, secret, onClose }: { name: string; secret: string; onClose: () => void }) {
  return (
    <Dialog title={`Key issued: ${name}`} onClose={onClose}>
      <div className="space-y-4">
        <Notice kind="caution" title="Copy it now"><p>Only a hash of it is stored: it cannot be shown again.</p></Notice>
        <CodeBlock label="Secret" text={secret} />
        <CodeBlock label="A first call" text={firstCall(location.origin, secret)} />
        <div className="flex justify-end"><Button kind="main" onClick={onClose}>I have copied it</Button></div>
      </div>
    </Dialog>
  );
}

export const firstCall = (origin: string, secret: string): string => `curl -s ${origin}/api/v1/convert \\
  -H 'Authorization: Bearer ${secret}' \\
  -H 'Content-Type: application/json' \\
  -d '{"from":{"preset":"aircraft-euler-deg"},"to":{"preset":"aircraft-quaternion"},"attitudes":[[30,10,20]]}'`;
