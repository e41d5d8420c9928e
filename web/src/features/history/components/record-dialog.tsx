import { useQuery } from '@tanstack/react-query';
import { Button } from '../../../components/button.tsx';
import { CopyButton } from '../../../components/copy-button.tsx';
import { Dialog } from '../../../components/dialog.tsx';
import { StatusMark } from '../../../components/status-mark.tsx';
import { VerdictMark } from '../../../components/verdict-mark.tsx';
import { count, dateTime, milliseconds } from '../../../lib/format.ts';
import type { HistoryEntry } from '../api/history.ts';
import { sessionQuery } from '../../session/api/session.ts';
import { callerOf } from './history-table.tsx';
import { StoredRequest } from './stored-request.tsx';

export function RecordDialog({ entry, onClose }: { entry: HistoryEntry; onClose: () => void }) {
  const { data: person } = useQuery(sessionQuery);
  const rows: readonly (readonly [string, React.ReactNode])[] = [
    ['Request id', <span key="id" className="flex flex-wrap items-center"><code className="break-all">{entry.id}</code><CopyButton text={entry.id} what="request id" /></span>],
    ['Time', dateTime(entry.at)],
    ['Caller', <>{callerOf(entry)}{entry.key && <> <code>{entry.key.prefix}…</code></>}{entry.role && `, ${entry.role}`}</>],
    ['Call', <code key="call" className="break-all">{entry.method} {entry.route}</code>],
    ['Status', <StatusMark key="status" status={entry.status} code={entry.code} />],
    ...(entry.verdict ? [['Verdict', <VerdictMark key="verdict" verdict={entry.verdict} />] as const] : []),
    ['Duration', milliseconds(entry.durationMs)],
    ['Attitudes', count(entry.attitudes)],
    ['Warnings', entry.warnings === 0 ? 'none' : `${count(entry.warnings)} (${entry.warningCodes.join(', ')})`],
  ];
  return (
    <Dialog title="Record of a call" onClose={onClose}>
      <dl className="grid grid-cols-[7rem_1fr] items-baseline gap-x-4 gap-y-2">
        {rows.map(([label, value]) => <div key={label} className="contents"><dt className="lettering text-soft">{label}</dt><dd className="min-w-0">{value}</dd></div>)}
      </dl>
      <StoredRequest entry={entry} computes={person != null && person.role !== 'reviewer'} />
      <div className="mt-5 flex justify-end"><Button kind="main" onClick={onClose}>Close</Button></div>
    </Dialog>
  );
}
