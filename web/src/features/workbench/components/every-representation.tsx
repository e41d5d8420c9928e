import type { Computed } from '../model/compute.ts';
import { numberLabels } from '../model/number-labels.ts';
import { Numbers } from './result.tsx';

const NAMES = { euler: 'Euler angles', quaternion: 'Quaternion', dcm: 'Direction cosine matrix', 'rotation-vector': 'Rotation vector', 'axis-angle': 'Axis and angle', mrp: 'Modified Rodrigues parameters', gibbs: 'Gibbs vector' };

/** The same attitude in all representations between the target's axes. */
export function EveryRepresentation({ every }: { every: Computed['every'] }) {
  return (
    <div className="grid gap-x-8 gap-y-6 md:grid-cols-2 xl:grid-cols-3">
      {every.map(({ convention, numbers }) => (
        <section key={convention.representation} className={convention.representation === 'dcm' ? 'md:col-span-2' : ''}>
          <h3 className="border-b border-rule pb-1 font-semibold">{NAMES[convention.representation]}</h3>
          {typeof numbers === 'string' ? <p className="py-1 text-soft">It {numbers}.</p> : <Numbers labels={numberLabels(convention)} numbers={numbers} matrix={convention.representation === 'dcm'} />}
          <p className="mt-1 text-sm text-soft">{summary(convention)}</p>
        </section>
      ))}
    </div>
  );
}

function summary({ representation: _representation, reference, body, ...facets }: Computed['every'][number]['convention']): string {
  return [`${reference} to ${body}`, ...Object.values(facets).map((value) => (Array.isArray(value) ? `[${value.join(', ')}]` : String(value)))].join(', ');
}
