import { useQuery } from '@tanstack/react-query';
import { Link, useSearchParams } from 'react-router-dom';
import { Button } from '../../components/button.tsx';
import { EmptyState } from '../../components/empty-state.tsx';
import { SelectField } from '../../components/field.tsx';
import { ProblemNotice } from '../../components/notice.tsx';
import { PageHeading } from '../../components/page-heading.tsx';
import { Skeleton } from '../../components/skeleton.tsx';
import { runsQuery } from '../../features/runs/api/runs.ts';
import { RunTable } from '../../features/runs/components/run-table.tsx';

export function Component() {
  const [search, setSearch] = useSearchParams();
  const filter = { verdict: search.get('verdict') ?? '', label: search.get('label') ?? '', cursor: search.get('cursor') ?? '' };
  const { data: page, error, isPending } = useQuery(runsQuery(filter));
  const change = (values: Record<string, string>) => setSearch(Object.entries({ ...filter, cursor: '', ...values }).filter(([, value]) => value !== ''));
  return (
    <>
      <PageHeading title="Runs" action={<Link to="/verify" className="inline-flex min-h-10 items-center border border-rule px-3.5 no-underline hover:bg-well">Verify a recording</Link>}>
        Verdicts of verifications, newest first: what was compared, how far off it was, and by which pipeline.
      </PageHeading>
      <form role="search" aria-label="Filter the runs" className="mb-4 grid max-w-sm gap-3" onSubmit={(event) => event.preventDefault()}>
        <SelectField label="Verdict" value={filter.verdict} onChange={(event) => change({ verdict: event.target.value })}>
          <option value="">every verdict</option><option value="fail">fail</option><option value="pass">pass</option>
        </SelectField>
      </form>
      {isPending ? <Skeleton label="Fetching the runs" lines={10} /> : error ? <ProblemNotice error={error} />
        : page.items.length === 0 ? <EmptyState title="No runs here">A run is made by each call of <code>POST /api/v1/verify</code>, or on the page Verify.</EmptyState> : <RunTable runs={page.items} />}
      <div className="mt-4 flex justify-between gap-3">
        <Button disabled={filter.cursor === ''} onClick={() => change({})}>Newest</Button>
        <Button disabled={!page?.nextCursor} onClick={() => change({ cursor: page!.nextCursor! })}>Older</Button>
      </div>
    </>
  );
}
