import type { DiscriminatingAttitude } from '../../../../../shared/attitude/identification/identification.ts';
import { number } from '../model/convention-line.ts';

const SHOWN = 6;

/** Attitudes to put the box in, with what each explanation says it would list there. */
export function NextTests({ tests }: { tests: readonly DiscriminatingAttitude[] }) {
  return (
    <section>
      <h3 className="mb-2 font-semibold">Test next</h3>
      <ol className="space-y-4">
        {tests.map(({ attitude, reading, separates }, index) => (
          <li key={index} className="border border-rule px-4 py-3">
            <p className="font-semibold first-letter:uppercase">{reading}</p>
            <p className="text-sm text-soft">In the reference’s convention: <span className="figures">{attitude.map(number).join(', ')}</span>. It splits {separates.explanations} explanations into {separates.answers} answers.</p>
            <dl className="mt-2 grid gap-x-4 gap-y-1 sm:grid-cols-[1fr_auto]">
              {separates.predictions.slice(0, SHOWN).map(({ numbers, explanations }, k) => (
                <div key={k} className="contents">
                  <dt className="figures break-words">{numbers.map(number).join(', ')}</dt>
                  <dd className="text-soft">would mean {explanations.length === 1 ? 'explanation' : 'explanations'} {explanations.slice(0, 5).map((place) => place + 1).join(', ')}{explanations.length > 5 ? ` and ${explanations.length - 5} more` : ''}</dd>
                </div>
              ))}
            </dl>
            {separates.predictions.length > SHOWN && <p className="mt-1 text-sm text-soft">and {separates.predictions.length - SHOWN} other answers.</p>}
          </li>
        ))}
      </ol>
    </section>
  );
}
