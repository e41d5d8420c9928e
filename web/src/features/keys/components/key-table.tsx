import { Button } from '../../../components/button.tsx';
import { Table } from '../../../components/table.tsx';
import { date, time } from '../../../lib/format.ts';
import { stateOf, type ApiKey } from '../api/keys.ts';

export function KeyTable({ keys, onRevoke }: { keys: readonly ApiKey[]; onRevoke: ((key: ApiKey) => void) | null }) {
  return (
    <Table wide caption="API keys, newest first" rows={keys} rowKey={({ id }) => id} columns={[
      { title: 'Name', cell: (key) => <><span className="font-semibold">{key.name}</span><br /><code className="text-soft">{key.prefix}…</code></> },
      { title: 'Role', cell: (key) => key.role },
      { title: 'State', cell: (key) => <KeyState apiKey={key} /> },
      { title: 'Issued', nowrap: true, cell: (key) => <>{date(key.createdAt)}<br /><span className="text-soft">by {key.createdBy.name}</span></> },
      { title: 'Expires', nowrap: true, cell: (key) => (key.expiresAt === null ? 'never' : date(key.expiresAt)) },
      { title: 'Last used, UTC', nowrap: true, cell: (key) => (key.lastUsedAt === null ? 'never' : time(key.lastUsedAt)) },
      ...(onRevoke ? [{ title: 'Change', cell: (key: ApiKey) => (key.revokedAt === null ? <Button onClick={() => onRevoke(key)} aria-label={`Revoke ${key.name}`}>Revoke</Button> : <span className="text-soft">none left</span>) }] : []),
    ]} />
  );
}

/** A state by word and by line: struck through where the key no longer works. */
function KeyState({ apiKey }: { apiKey: ApiKey }) {
  const state = stateOf(apiKey);
  if (state === 'revoked') return <><s>revoked</s> <span className="text-soft">{date(apiKey.revokedAt!)}</span></>;
  return state === 'expired' ? <s>expired</s> : <>{state}</>;
}
