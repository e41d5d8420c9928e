import { useQuery } from '@tanstack/react-query';
import { useState } from 'react';
import { Link } from 'react-router-dom';
import { Notice, ProblemNotice } from '../../components/notice.tsx';
import { PageHeading } from '../../components/page-heading.tsx';
import { Skeleton } from '../../components/skeleton.tsx';
import { historyQuery, NO_FILTER, type HistoryEntry } from '../../features/history/api/history.ts';
import { HistoryTable } from '../../features/history/components/history-table.tsx';
import { RecordDialog } from '../../features/history/components/record-dialog.tsx';
import { keysQuery } from '../../features/keys/api/keys.ts';
import { runsQuery } from '../../features/runs/api/runs.ts';
import { RunTable } from '../../features/runs/components/run-table.tsx';
import { sessionQuery } from '../../features/session/api/session.ts';
import { usageByKeyQuery } from '../../features/usage/api/usage.ts';
import { count, date } from '../../lib/format.ts';

const SOON = 14 * 86_400_000;
/** From this share of its monthly quota on, a key is worth a word. */
const NEARLY_SPENT = 0.8;

export function Component() {
  const { data: person } = useQuery(sessionQuery);
  const failed = useQuery(runsQuery({ verdict: 'fail', label: '', cursor: '' }, 5));
  const refused = useQuery(historyQuery({ ...NO_FILTER, status: '4xx' }, 5));
  const seesKeys = person != null && person.role !== 'reviewer';
  const keys = useQuery({ ...keysQuery, enabled: seesKeys });
  const usage = useQuery(usageByKeyQuery(''));
  const [opened, setOpened] = useState<HistoryEntry | null>(null);
  const [now] = useState(Date.now);
  const expiring = keys.data?.filter(({ expiresAt, revokedAt }) => revokedAt === null && expiresAt !== null && Date.parse(expiresAt) > now && Date.parse(expiresAt) - now < SOON) ?? [];
  const spent = usage.data?.keys.filter(({ attitudes, attitudesPerMonth }) => attitudesPerMonth > 0 && attitudes >= NEARLY_SPENT * attitudesPerMonth) ?? [];
  const settled = (keys.isSuccess || !seesKeys) && usage.isSuccess;
  return (
    <>
      <PageHeading title="Overview">What needs attention.</PageHeading>
      <section className="mb-8 space-y-3">
        <h2 className="text-lg font-semibold">{seesKeys ? 'Keys and quotas' : 'Quotas'}</h2>
        {keys.error && <ProblemNotice error={keys.error} />}
        {usage.error && <ProblemNotice error={usage.error} />}
        {expiring.map((key) => (
          <Notice key={key.id} kind="caution" title={`${key.name} expires on ${date(key.expiresAt!)}`}><p>Calls with <code>{key.prefix}…</code> are refused from then on. <Link to="/keys">See the keys</Link></p></Notice>
        ))}
        {spent.map((key) => (
          <Notice key={key.id} kind="caution" title={`${key.name} has used ${Math.floor((100 * key.attitudes) / key.attitudesPerMonth)} % of its month`}><p>{count(key.attitudes)} of {count(key.attitudesPerMonth)} attitudes. <Link to="/usage">See the usage</Link></p></Notice>
        ))}
        {settled && expiring.length + spent.length === 0 && <Notice kind="done" title={seesKeys ? 'No key expires within two weeks, and none is near its quota' : 'No key is near its quota'} />}
      </section>
      <section className="mb-8">
        <h2 className="mb-2 text-lg font-semibold">Failed runs, newest first</h2>
        {failed.isPending ? <Skeleton label="Fetching failed runs" lines={4} /> : failed.error ? <ProblemNotice error={failed.error} />
          : failed.data.items.length === 0 ? <Notice kind="done" title="No run has failed" /> : <RunTable runs={failed.data.items} />}
        <p className="mt-3"><Link to="/runs?verdict=fail">All failed runs</Link></p>
      </section>
      <section>
        <h2 className="mb-2 text-lg font-semibold">Refused calls, newest first</h2>
        {refused.isPending ? <Skeleton label="Fetching refused calls" lines={4} /> : refused.error ? <ProblemNotice error={refused.error} />
          : refused.data.items.length === 0 ? <Notice kind="done" title="No call has been refused" /> : <HistoryTable entries={refused.data.items} onOpen={setOpened} />}
        <p className="mt-3"><Link to="/history?status=4xx">All refused calls in the history</Link></p>
      </section>
      {opened && <RecordDialog entry={opened} onClose={() => setOpened(null)} />}
    </>
  );
}
