import { useState } from 'react';
import { Button } from '../../../components/button.tsx';
import { Dialog } from '../../../components/dialog.tsx';
import { TextField } from '../../../components/field.tsx';
import { ProblemNotice } from '../../../components/notice.tsx';
import { dateTime } from '../../../lib/format.ts';
import { useRevokeKey, type ApiKey } from '../api/keys.ts';

/** Revoking cannot be undone, so it is confirmed by the key's name. */
export function RevokeKeyDialog({ apiKey, onClose }: { apiKey: ApiKey; onClose: () => void }) {
  const revoke = useRevokeKey();
  const [typed, setTyped] = useState('');
  const matches = typed.trim() === apiKey.name;
  return (
    <Dialog title={`Revoke ${apiKey.name}`} onClose={onClose}>
      <form className="space-y-4" onSubmit={(event) => {
        event.preventDefault();
        if (matches) revoke.mutate(apiKey.id, { onSuccess: onClose });
      }}>
        <p>
          Every pipeline that calls with <code>{apiKey.prefix}…</code> is refused from its next call on.{' '}
          {apiKey.lastUsedAt === null ? 'It has never been used.' : `It was last used on ${dateTime(apiKey.lastUsedAt)}.`} This cannot be undone; its history stays.
        </p>
        <TextField label={`Type the name to confirm: ${apiKey.name}`} value={typed} autoComplete="off" onChange={(event) => setTyped(event.target.value)} />
        {revoke.error && <ProblemNotice error={revoke.error} />}
        <div className="flex justify-end gap-3"><Button onClick={onClose}>Keep it</Button><Button kind="main" type="submit" disabled={!matches} busy={revoke.isPending}>Revoke key</Button></div>
      </form>
    </Dialog>
  );
}
