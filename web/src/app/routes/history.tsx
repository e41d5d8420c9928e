import { useQuery } from '@tanstack/react-query';
import { useState } from 'react';
import { Button } from '../../components/button.tsx';
import { EmptyState } from '../../components/empty-state.tsx';
import { ProblemNotice } from '../../components/notice.tsx';
import { PageHeading } from '../../components/page-heading.tsx';
import { Skeleton } from '../../components/skeleton.tsx';
import { exportAddress, historyQuery, type HistoryEntry } from '../../features/history/api/history.ts';
import { historySettingsQuery } from '../../features/history/api/history-settings.ts';
import { useHistoryFilter } from '../../features/history/api/use-history-filter.ts';
import { HistoryFilters } from '../../features/history/components/history-filters.tsx';
import { HistorySettingsDialog } from '../../features/history/components/history-settings-dialog.tsx';
import { HistoryTable } from '../../features/history/components/history-table.tsx';
import { RecordDialog } from '../../features/history/components/record-dialog.tsx';
import { keysQuery } from '../../features/keys/api/keys.ts';
import { sessionQuery } from '../../features/session/api/session.ts';
import { dateTime } from '../../lib/format.ts';

export function Component() {
  const [filter, change] = useHistoryFilter();
  const { data: person } = useQuery(sessionQuery);
  const { data: page, error, isPending } = useQuery(historyQuery(filter));
  const { data: keys = [] } = useQuery({ ...keysQuery, enabled: person != null && person.role !== 'reviewer' });
  const administers = person?.role === 'administrator';
  const { data: settings } = useQuery({ ...historySettingsQuery, enabled: administers });
  const [opened, setOpened] = useState<HistoryEntry | null>(null);
  const [setting, setSetting] = useState(false);
  return (
    <>
      <PageHeading title="Request history" action={(
        <div className="flex flex-wrap gap-3">
          {administers && settings && <Button onClick={() => setSetting(true)}>What is kept</Button>}
          <a href={exportAddress(filter)} download className="inline-flex min-h-10 items-center border border-rule px-3.5 no-underline hover:bg-well">Export as CSV</a>
        </div>
      )}>
        Every API call, refused ones included: what the service has answered is here before the answer leaves it.
      </PageHeading>
      <HistoryFilters filter={filter} onChange={change} keys={keys} routes={page?.routes ?? []} />
      {isPending ? <Skeleton label="Fetching the history" lines={12} /> : error ? <ProblemNotice error={error} />
        : page.items.length === 0 ? <EmptyState title="No calls here">{page.searchedBackTo ? 'Nothing so far; the search goes on with Older.' : 'Nothing matches the filter, or nothing has been called yet.'}</EmptyState>
          : <HistoryTable entries={page.items} onOpen={setOpened} />}
      {page?.searchedBackTo && <p className="mt-3 text-sm text-soft">Few calls pass this filter: searched back to {dateTime(page.searchedBackTo)}.</p>}
      <div className="mt-4 flex justify-between gap-3">
        <Button disabled={filter.cursor === ''} onClick={() => change({ cursor: '' })}>Newest</Button>
        <Button disabled={!page?.nextCursor} onClick={() => change({ cursor: page!.nextCursor! })}>Older</Button>
      </div>
      {setting && settings && <HistorySettingsDialog settings={settings} onClose={() => setSetting(false)} />}
      {opened && <RecordDialog entry={opened} onClose={() => setOpened(null)} />}
    </>
  );
}
