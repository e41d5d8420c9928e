import { useQuery } from '@tanstack/react-query';
import { Link } from 'react-router-dom';
import { ProblemNotice } from '../../components/notice.tsx';
import { PageHeading } from '../../components/page-heading.tsx';
import { Skeleton } from '../../components/skeleton.tsx';
import { Table } from '../../components/table.tsx';
import { conventionsQuery } from '../../features/conventions/api/conventions.ts';
import { ConventionComparison } from '../../features/conventions/components/convention-comparison.tsx';

export function Component() {
  const { data: presets, error, isPending } = useQuery(conventionsQuery);
  return (
    <>
      <PageHeading title="Conventions">Presets: conventions with a name, each with every facet stated. A call may name one instead of listing its facets.</PageHeading>
      {isPending ? <Skeleton label="Fetching the conventions" /> : error ? <ProblemNotice error={error} /> : (
        <>
        <Table caption="Presets" rows={presets} rowKey={({ id }) => id} columns={[
          { title: 'Preset', cell: (preset) => <><Link to={`/conventions/${preset.id}`} className="font-semibold">{preset.title}</Link><br /><code className="text-soft">{preset.id}</code></> },
          { title: 'Axes', cell: ({ convention }) => <>{convention.reference} to {convention.body}</> },
          { title: 'Representation', cell: ({ convention }) => convention.representation },
          { title: 'Stated by', cell: ({ standard }) => (standard ? <>{standard.name}<br /><span className="text-soft">{standard.clause}; {standard.checked}</span></> : 'Dextral') },
        ]} />
        <ConventionComparison presets={presets} />
        </>
      )}
    </>
  );
}
