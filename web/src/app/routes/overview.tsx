import { useQuery } from '@tanstack/react-query';
import { useState } from 'react';
import { Link } from 'react-router-dom';
import { Notice, ProblemNotice } from '../../components/notice.tsx';
import { PageHeading } from '../../components/page-heading.tsx';
import { Skeleton } from '../../components/skeleton.tsx';
import { historyQuery, type HistoryEntry } from '../../features/history/api/history.ts';
import { HistoryTable } from '../../features/history/components/history-table.tsx';
import { RecordDialog } from '../../features/history/components/record-dialog.tsx';
import { keysQuery } from '../../features/keys/api/keys.ts';
import { sessionQuery } from '../../features/session/api/session.ts';
import { date } from '../../lib/format.ts';

const SOON = 14 * 86_400_000;
const NO_FILTER = { key: '', route: '', from: '', to: '', cursor: '' };

export function Component() {
  const { data: person } = useQuery(sessionQuery);
  const refused = useQuery(historyQuery({ ...NO_FILTER, status: '4xx' }, 8));
  const { data: keys = [] } = useQuery({ ...keysQuery, enabled: person != null && person.role !== 'reviewer' });
  const [opened, setOpened] = useState<HistoryEntry | null>(null);
  const [now] = useState(Date.now);
  const expiring = keys.filter(({ expiresAt, revokedAt }) => revokedAt === null && expiresAt !== null && Date.parse(expiresAt) > now && Date.parse(expiresAt) - now < SOON);
  return (
    <>
      <PageHeading title="Overview">What needs attention.</PageHeading>
      <section className="mb-8">
        <h2 className="mb-2 text-lg font-semibold">Keys that expire within two weeks</h2>
        {expiring.length === 0 ? <Notice kind="done" title="None" /> : expiring.map((key) => (
          <Notice key={key.id} kind="caution" title={`${key.name} expires on ${date(key.expiresAt!)}`}><p>Calls with <code>{key.prefix}…</code> are refused from then on. <Link to="/keys">See the keys</Link></p></Notice>
        ))}
      </section>
      <section>
        <h2 className="mb-2 text-lg font-semibold">Refused calls, newest first</h2>
        {refused.isPending ? <Skeleton label="Fetching refused calls" /> : refused.error ? <ProblemNotice error={refused.error} />
          : refused.data.items.length === 0 ? <Notice kind="done" title="No call has been refused" /> : <HistoryTable entries={refused.data.items} onOpen={setOpened} />}
        <p className="mt-3"><Link to="/history?status=4xx">All refused calls in the history</Link></p>
      </section>
      {opened && <RecordDialog entry={opened} onClose={() => setOpened(null)} />}
    </>
  );
}
