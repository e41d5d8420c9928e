import { Button } from '../../../components/button.tsx';
import { StatusMark } from '../../../components/status-mark.tsx';
import { Table } from '../../../components/table.tsx';
import { count, dateTime, milliseconds } from '../../../lib/format.ts';
import type { HistoryEntry } from '../api/history.ts';

export function HistoryTable({ entries, onOpen }: { entries: readonly HistoryEntry[]; onOpen: (entry: HistoryEntry) => void }) {
  return (
    <Table caption="API calls, newest first" rows={entries} rowKey={({ id }) => id} columns={[
      { title: 'Time', cell: (entry) => dateTime(entry.at) },
      { title: 'Caller', cell: (entry) => callerOf(entry) },
      { title: 'Route', cell: (entry) => <code className="break-all">{entry.method} {entry.route}</code> },
      { title: 'Status', cell: (entry) => <StatusMark status={entry.status} code={entry.code} /> },
      { title: 'Attitudes', numeric: true, cell: (entry) => count(entry.attitudes) },
      { title: 'Warnings', numeric: true, cell: (entry) => count(entry.warnings) },
      { title: 'Duration', numeric: true, cell: (entry) => milliseconds(entry.durationMs) },
      { title: 'Record', cell: (entry) => <Button kind="quiet" className="-my-2 px-0" aria-label={`Open the record of ${entry.id}`} onClick={() => onOpen(entry)}><code>{entry.id.slice(0, 8)}</code></Button> },
    ]} />
  );
}

export function callerOf({ key, person }: HistoryEntry): string {
  return key?.name ?? person?.name ?? 'nobody known';
}
