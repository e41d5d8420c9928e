import { useQuery } from '@tanstack/react-query';
import { useParams } from 'react-router-dom';
import { ProblemNotice } from '../../components/notice.tsx';
import { PageHeading } from '../../components/page-heading.tsx';
import { Skeleton } from '../../components/skeleton.tsx';
import { runQuery } from '../../features/runs/api/runs.ts';
import { RunReport } from '../../features/runs/components/run-report.tsx';

export function Component() {
  const { id = '' } = useParams();
  const { data: run, error, isPending } = useQuery(runQuery(id));
  return (
    <>
      <PageHeading title={run?.label ?? 'Run'} />
      {isPending ? <Skeleton label="Fetching the run" /> : error ? <ProblemNotice error={error} /> : <RunReport run={run} />}
    </>
  );
}
