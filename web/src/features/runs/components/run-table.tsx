import { Link } from 'react-router-dom';
import { Table } from '../../../components/table.tsx';
import { VerdictMark } from '../../../components/verdict-mark.tsx';
import { count, time } from '../../../lib/format.ts';
import { angle, sizeOf } from '../model/angle.ts';
import type { Run } from '../api/runs.ts';

export function RunTable({ runs }: { runs: readonly Run[] }) {
  return (
    <Table wide caption="Runs, newest first" rows={runs} rowKey={({ id }) => id} columns={[
      { title: 'Verdict', cell: (run) => <VerdictMark verdict={run.verdict} /> },
      { title: 'What', cell: (run) => <Link to={`/runs/${run.id}`} className="font-semibold">{run.label ?? 'unlabelled'}</Link> },
      { title: 'Time, UTC', nowrap: true, cell: (run) => time(run.at) },
      { title: 'By', cell: (run) => run.key?.name ?? run.person?.name ?? '—' },
      { title: 'Commit', cell: (run) => (run.commit === null ? '—' : <code>{run.commit.slice(0, 8)}</code>) },
      { title: 'Failed', numeric: true, nowrap: true, cell: (run) => <span className="figures">{count(run.failed)} of {count(run.count)}</span> },
      { title: 'Worst', numeric: true, nowrap: true, cell: (run) => <span className="figures">{angle(sizeOf(run.worst), run.worst.unit)}</span> },
    ]} />
  );
}
