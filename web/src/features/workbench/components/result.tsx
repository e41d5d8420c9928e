import type { Convention } from '../../../../../shared/attitude/convention.ts';
import { CopyButton } from '../../../components/copy-button.tsx';
import { Notice } from '../../../components/notice.tsx';
import type { Computed } from '../model/compute.ts';
import { numberLabels } from '../model/number-labels.ts';
import { LockGauge } from './lock-gauge.tsx';

export function Result({ convention, result }: { convention: Convention; result: Computed }) {
  const unit = 'unit' in convention ? convention.unit : null;
  return (
    <section aria-label="Result" className="space-y-5">
      <div>
        <div className="flex items-center justify-between border-b border-rule pb-1"><h2 className="text-lg font-semibold">Result</h2><CopyButton text={JSON.stringify(result.numbers)} what="result" /></div>
        <Numbers labels={numberLabels(convention)} numbers={result.numbers} matrix={convention.representation === 'dcm'} />
        {unit && <p className="mt-1 text-sm text-soft">{convention.representation === 'axis-angle' ? `The angle in ${unit}.` : `In ${unit}.`}</p>}
      </div>
      <p className="text-lg">{result.reading}</p>
      {result.warnings.map(({ code, message, worst }) => (
        <Notice key={code} kind="caution" title={code}>
          <p>{message}</p>
          {worst.wellConditioned && <p>Well conditioned: {worst.wellConditioned.combination} = <span className="figures">{worst.wellConditioned.angle}</span> {worst.wellConditioned.unit}.</p>}
        </Notice>
      ))}
      <LockGauge marginDeg={result.marginDeg} condition={result.condition} />
    </section>
  );
}

/** Numbers at full precision with their names; a matrix as three rows. */
export function Numbers({ labels, numbers, matrix }: { labels: readonly string[]; numbers: readonly number[]; matrix: boolean }) {
  return (
    <dl className={matrix ? 'grid grid-cols-1 gap-x-4 sm:grid-cols-3' : 'grid grid-cols-1'}>
      {numbers.map((number, i) => (
        <div key={i} className="flex items-baseline gap-3 border-b border-hair py-1">
          <dt className={`shrink-0 text-soft ${matrix ? 'w-9' : 'w-32'}`}>{labels[i]}</dt><dd className="figures min-w-0 break-all">{number}</dd>
        </div>
      ))}
    </dl>
  );
}
