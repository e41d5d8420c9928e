import { Notice } from '../../../components/notice.tsx';
import { TitleBlock } from '../../../components/title-block.tsx';
import { VerdictMark } from '../../../components/verdict-mark.tsx';
import { count, dateTime } from '../../../lib/format.ts';
import { FacetList } from '../../conventions/components/facet-list.tsx';
import { IdentificationReport } from '../../identify/components/identification-report.tsx';
import type { Run } from '../api/runs.ts';
import { angle, sizeOf } from '../model/angle.ts';
import { ErrorBars } from './error-bars.tsx';

/** Everything a run says, for somebody who was not there. */
export function RunReport({ run }: { run: Run }) {
  const { unit } = run.statistics;
  const noun = run.kind === 'rates' ? 'rates' : 'attitudes';
  return (
    <article className="space-y-8">
      <div className="border border-rule">
        <div className="p-4 text-lg"><VerdictMark verdict={run.verdict} /> <span className="ml-2">{run.failed === 0 ? `all ${count(run.count)} ${noun}` : `${count(run.failed)} of ${count(run.count)} ${noun} off by more than the tolerance of`}{run.failed === 0 ? ' within ' : ' '}{angle(sizeOf(run.tolerance), run.tolerance.unit)}</span></div>
        <TitleBlock cells={[['Run', run.id], ['Date', dateTime(run.at)], ['Made by', run.key?.name ?? run.person?.name ?? '—'], ['Commit', run.commit ?? '—'], ['Core', run.engine]]} />
      </div>
      <section>
        <h2 className="mb-2 text-lg font-semibold">Errors</h2>
        {run.failed > 0 && <Notice kind="caution" title={run.summary} />}
        {run.failed === 0 && <p>{run.summary}</p>}
        <div className="mt-4"><ErrorBars run={run} /></div>
        <dl className="mt-4 grid max-w-xl grid-cols-2 border-t border-hair sm:grid-cols-4">
          {(['rms', 'median', 'p95', 'max'] as const).map((name) => (
            <div key={name} className="border-b border-hair py-1.5"><dt className="lettering text-soft">{name === 'p95' ? '95th percentile' : name}</dt><dd className="figures">{angle(run.statistics[name], unit)}</dd></div>
          ))}
        </dl>
      </section>
      {run.kind === 'attitudes' && run.diagnosis && (
        <section>
          <h2 className="mb-2 text-lg font-semibold">Why</h2>
          <IdentificationReport identification={run.diagnosis} />
        </section>
      )}
      {run.failures.length > 0 && (
        <section>
          <h2 className="mb-2 text-lg font-semibold">{run.failed > run.failures.length ? `The first ${run.failures.length} failures` : 'Failures'}</h2>
          <ol className="figures grid grid-cols-2 gap-x-6 sm:grid-cols-3 lg:grid-cols-5">
            {run.failures.map((failure) => <li key={failure.index} className="flex justify-between gap-3 border-b border-hair py-1"><span className="text-soft">{failure.index}</span>{angle(sizeOf(failure), unit)}</li>)}
          </ol>
        </section>
      )}
      <section className="grid gap-8 lg:grid-cols-2">
        <div><h2 className="mb-2 text-lg font-semibold">Expected, stated as</h2><Stated as={run.expected} /></div>
        <div><h2 className="mb-2 text-lg font-semibold">Actual, stated as</h2><Stated as={run.actual} /></div>
        {run.kind === 'rates' && <div><h2 className="mb-2 text-lg font-semibold">At attitudes stated as</h2><FacetList convention={run.attitude} /></div>}
      </section>
      <p><a href={`/api/v1/runs/${run.id}.junit.xml`} download={`run-${run.id}.junit.xml`}>JUnit XML</a> · <a href={`/api/v1/runs/${run.id}`} download={`run-${run.id}.json`}>JSON</a></p>
    </article>
  );
}

/** A convention, or a form of rate with the angles that it is the rate of. */
function Stated({ as }: { as: Run['expected'] }) {
  if (!('rate' in as)) return <FacetList convention={as} />;
  return (
    <>
      <p className="mb-2">{RATE_NAMES[as.rate]}{'unit' in as && as.unit ? `, ${as.unit}` : ''}</p>
      {as.rate === 'euler' && <FacetList convention={as.angles} />}
    </>
  );
}

const RATE_NAMES = { body: 'Angular velocity in body axes', reference: 'Angular velocity in reference axes', euler: 'Rates of Euler angles', quaternion: 'Derivative of the quaternion', dcm: 'Derivative of the matrix' } as const;
