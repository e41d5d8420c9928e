import { useQuery } from '@tanstack/react-query';
import { Link, useParams } from 'react-router-dom';
import { ProblemNotice } from '../../components/notice.tsx';
import { PageHeading } from '../../components/page-heading.tsx';
import { Skeleton } from '../../components/skeleton.tsx';
import { conventionQuery } from '../../features/conventions/api/conventions.ts';
import { definingEquation } from '../../features/conventions/components/defining-equation.ts';
import { FacetList } from '../../features/conventions/components/facet-list.tsx';

export function Component() {
  const { id = '' } = useParams();
  const { data: preset, error, isPending } = useQuery(conventionQuery(id));
  if (isPending) return <Skeleton label="Fetching the convention" />;
  if (error) return <><PageHeading title="Convention" /><ProblemNotice error={error} /></>;
  const { convention } = preset;
  return (
    <>
      <PageHeading title={preset.title}>{preset.description}</PageHeading>
      <div className="grid gap-8 lg:grid-cols-2">
        <section>
          <h2 className="mb-2 text-lg font-semibold">Every facet</h2>
          <FacetList convention={convention} />
        </section>
        <section className="space-y-6">
          <div>
            <h2 className="mb-2 text-lg font-semibold">What makes it true</h2>
            <p>{definingEquation(convention)}</p>
          </div>
          <div>
            <h2 className="mb-2 text-lg font-semibold">A worked attitude</h2>
            <p className="mb-2">{preset.worked.reading}</p>
            <ol className="figures grid grid-cols-1 gap-x-6 border-t border-hair">
              {preset.worked.numbers.map((number, i) => <li key={i} className="border-b border-hair py-1">{number}</li>)}
            </ol>
            <p className="mt-3"><Link to={`/workbench?from=${encodeURIComponent(preset.id)}${preset.worked.numbers.map((number) => `&n=${number}`).join('')}`}>Open it in the workbench</Link></p>
          </div>
          <div>
            <h2 className="mb-2 text-lg font-semibold">Where it comes from</h2>
            {preset.standard
              ? <p>{preset.standard.name}, {preset.standard.clause}. {preset.standard.checked === 'confirmed' ? 'Compared with the text of the standard.' : 'Written from memory: confirm it before relying on it.'} {preset.standard.note}</p>
              : <p>A preset of this service. Its id is <code>{preset.id}</code>; the facets above never change under it.</p>}
          </div>
          <div>
            <h2 className="mb-2 text-lg font-semibold">Published interfaces</h2>
            <p className="text-soft">{preset.interfaces.length === 0 ? 'No published interface states this convention yet.' : preset.interfaces.map((each) => `${each.interface} v${each.version}`).join(', ')}</p>
          </div>
        </section>
      </div>
    </>
  );
}
