import type { Convention } from '../../../../../shared/attitude/convention.ts';
import { Button } from '../../../components/button.tsx';
import { Notice, ProblemNotice } from '../../../components/notice.tsx';
import { Table } from '../../../components/table.tsx';
import { useCrossCheck } from '../api/cross-check.ts';

const small = (value: number): string => (value === 0 ? '0' : value < 1e-3 ? value.toExponential(2) : value.toFixed(3));

/** Dissimilar redundancy on demand: the service answers, computes the answer again by other code, and reports the differences. */
export function CrossCheckPanel({ from, to, input, shown }: { from: Convention; to: Convention; input: readonly number[]; shown: readonly number[] }) {
  const check = useCrossCheck();
  const sameAsShown = check.data?.numbers.every((number, i) => Object.is(number, shown[i])) ?? false;
  return (
    <section aria-label="Cross-check" className="space-y-3">
      <div className="flex flex-wrap items-center justify-between gap-3 border-b border-rule pb-1">
        <h2 className="text-lg font-semibold">Cross-check</h2>
        <Button busy={check.isPending} onClick={() => check.mutate({ from, to, numbers: input })}>Compute it again by other code</Button>
      </div>
      {check.error && <ProblemNotice error={check.error} />}
      {check.data && (
        <>
          <Table caption="Differences from independent recomputation" rows={check.data.crossCheck.methods} rowKey={({ method }) => method} columns={[
            { title: 'Method', cell: ({ method }) => method },
            { title: 'Last places', numeric: true, cell: ({ maxUlp }) => <span className="figures">{maxUlp === undefined ? '—' : small(maxUlp)}</span> },
            { title: 'Angle, rad', numeric: true, cell: ({ maxAngleRad }) => <span className="figures">{small(maxAngleRad)}</span> },
          ]} />
          {sameAsShown
            ? <Notice kind="done" title="The service and this browser agree to the last bit"><p>Half a unit in the last place is as near as a double can be.</p></Notice>
            : <Notice kind="problem" title="The service and this browser differ"><p>They run the same core and must not: keep this page’s address and report it.</p></Notice>}
        </>
      )}
    </section>
  );
}
