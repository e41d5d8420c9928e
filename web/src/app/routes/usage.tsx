import { useQuery } from '@tanstack/react-query';
import { useState } from 'react';
import { useSearchParams } from 'react-router-dom';
import { Button } from '../../components/button.tsx';
import { EmptyState } from '../../components/empty-state.tsx';
import { TextField } from '../../components/field.tsx';
import { ProblemNotice } from '../../components/notice.tsx';
import { PageHeading } from '../../components/page-heading.tsx';
import { Skeleton } from '../../components/skeleton.tsx';
import { Table } from '../../components/table.tsx';
import { sessionQuery } from '../../features/session/api/session.ts';
import { limitsQuery, usageByKeyQuery, type RoleLimits } from '../../features/usage/api/usage.ts';
import { LimitsDialog } from '../../features/usage/components/limits-dialog.tsx';
import { QuotaBar } from '../../features/usage/components/quota-bar.tsx';
import { count, plural } from '../../lib/format.ts';

export function Component() {
  const [search, setSearch] = useSearchParams();
  const month = search.get('month') ?? '';
  const { data: person } = useQuery(sessionQuery);
  const usage = useQuery(usageByKeyQuery(month));
  const limits = useQuery(limitsQuery);
  const [changing, setChanging] = useState<RoleLimits | null>(null);
  return (
    <>
      <PageHeading title="Usage">Attitudes computed, by key and role. Refused requests cost none; a quota starts anew on the first of the month, UTC.</PageHeading>
      <TextField label="Month" type="month" className="mb-4 max-w-52" value={month || (usage.data?.month ?? '')} onChange={(event) => setSearch(event.target.value ? { month: event.target.value } : {})} />
      <section className="mb-10">
        <h2 className="mb-2 text-lg font-semibold">By key</h2>
        {usage.isPending ? <Skeleton label="Fetching the usage" /> : usage.error ? <ProblemNotice error={usage.error} />
          : usage.data.keys.length === 0 ? <EmptyState title="Nothing used in this month" /> : (
            <>
              <p className="mb-3">{usage.data.roles.map(({ role, attitudes, requests }) => `${role}: ${plural(attitudes, 'attitude')} in ${plural(requests, 'request')}`).join('; ')}.</p>
              <Table caption="Usage by key" rows={usage.data.keys} rowKey={({ id }) => id} columns={[
                { title: 'Key', cell: (key) => <><span className="font-semibold">{key.name}</span><br /><code className="text-soft">{key.prefix}…</code></> },
                { title: 'Role', cell: (key) => key.role },
                { title: 'Requests', numeric: true, cell: (key) => count(key.requests) },
                { title: 'Attitudes', numeric: true, cell: (key) => count(key.attitudes) },
                { title: 'Of the quota', cell: (key) => <QuotaBar used={key.attitudes} quota={key.attitudesPerMonth} /> },
              ]} />
            </>
          )}
      </section>
      <section>
        <h2 className="mb-2 text-lg font-semibold">Limits of the roles</h2>
        {limits.isPending ? <Skeleton label="Fetching the limits" lines={4} /> : limits.error ? <ProblemNotice error={limits.error} /> : (
          <Table caption="Limits of the roles" rows={limits.data} rowKey={({ role }) => role} columns={[
            { title: 'Role', cell: ({ role }) => <span className="font-semibold">{role}</span> },
            { title: 'Requests a minute', numeric: true, cell: (row) => count(row.requestsPerMinute) },
            { title: 'Attitudes a month', numeric: true, cell: (row) => count(row.attitudesPerMonth) },
            { title: 'Attitudes a call', numeric: true, cell: (row) => count(row.attitudesPerCall) },
            { title: 'Requests at once', numeric: true, cell: (row) => count(row.parallelRequests) },
            ...(person?.role === 'administrator' ? [{ title: 'Change', cell: (row: RoleLimits) => <Button onClick={() => setChanging(row)} aria-label={`Change the limits of the role ${row.role}`}>Change</Button> }] : []),
          ]} />
        )}
      </section>
      {changing && <LimitsDialog limits={changing} onClose={() => setChanging(null)} />}
    </>
  );
}
