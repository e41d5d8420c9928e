import { Button } from '../../../components/button.tsx';
import { StatusMark } from '../../../components/status-mark.tsx';
import { Table } from '../../../components/table.tsx';
import { count, milliseconds, time } from '../../../lib/format.ts';
import type { HistoryEntry } from '../api/history.ts';

export function HistoryTable({ entries, onOpen }: { entries: readonly HistoryEntry[]; onOpen: (entry: HistoryEntry) => void }) {
  return (
    <Table wide caption="API calls, newest first" rows={entries} rowKey={({ id }) => id} columns={[
      { title: 'Time, UTC', nowrap: true, cell: (entry) => time(entry.at) },
      { title: 'Caller', cell: (entry) => callerOf(entry) },
      { title: 'Route', cell: (entry) => <code className="break-words">{entry.method} {shortRoute(entry.route)}</code> },
      { title: 'Status', cell: (entry) => <StatusMark status={entry.status} code={entry.code} /> },
      { title: 'Attitudes', numeric: true, minor: true, cell: (entry) => count(entry.attitudes) },
      { title: 'Warnings', numeric: true, minor: true, cell: (entry) => count(entry.warnings) },
      { title: 'Duration', numeric: true, nowrap: true, minor: true, cell: (entry) => milliseconds(entry.durationMs) },
      { title: 'Record', cell: (entry) => <Button kind="link" aria-label={`Open the record of ${entry.id}`} onClick={() => onOpen(entry)}><code>{entry.id.slice(0, 8)}</code></Button> },
    ]} />
  );
}

/** Without the path that all routes begin with; the record shows it whole. */
const shortRoute = (route: string): string => route.replace(/^\/api\/v1(?=\/)/, '');

export function callerOf({ key, person }: HistoryEntry): string {
  return key?.name ?? person?.name ?? 'nobody known';
}
