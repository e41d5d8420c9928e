import type { ReactNode } from 'react';
import type { Explanation } from '../../../../../shared/attitude/identification/identification.ts';
import { plural } from '../../../lib/format.ts';
import { number, statementLine } from '../model/convention-line.ts';

/** One explanation: what to change, the convention that is meant, what is left over, and what else says the same. */
export function ExplanationEntry({ place, explanation, action }: { place: number; explanation: Explanation; action?: ReactNode }) {
  const { edits, residual, sameNumbersAs, timeLag, scale } = explanation;
  return (
    <li className="border border-rule">
      <div className="flex flex-wrap items-start justify-between gap-3 border-b border-hair px-4 py-3">
        <div className="flex min-w-0 gap-3">
          <span className="figures text-soft">{place}</span>
          {edits.length === 0 ? <p className="font-semibold">As stated: nothing to change.</p>
            : edits.length === 1 ? <p className="font-semibold">{capital(edits[0]!)}.</p>
              : <ul className="list-disc space-y-0.5 pl-4 font-semibold">{edits.map((edit) => <li key={edit}>{capital(edit)}.</li>)}</ul>}
        </div>
        {action}
      </div>
      <dl className="grid gap-x-4 px-4 py-2 sm:grid-cols-[8rem_1fr]">
        <dt className="text-soft">The numbers are</dt><dd className="break-words">{statementLine(explanation)}</dd>
        {timeLag && <><dt className="text-soft">Time lag</dt><dd className="figures">{number(timeLag.seconds * 1000)} ms</dd></>}
        {scale !== undefined && <><dt className="text-soft">Scale</dt><dd className="figures">{number(scale)}</dd></>}
        <dt className="text-soft">Left over</dt><dd className="figures">{number(residual.rms)} {residual.unit} rms, {number(residual.max)} {residual.unit} at most</dd>
      </dl>
      {sameNumbersAs.length > 0 && (
        <details className="border-t border-hair px-4 py-2">
          <summary className="cursor-pointer text-soft">{plural(sameNumbersAs.length, 'other statement')} of the same numbers</summary>
          <ul className="mt-1 list-disc space-y-1 pl-6">{sameNumbersAs.map((statement, index) => <li key={index}>{statementLine(statement)}</li>)}</ul>
        </details>
      )}
    </li>
  );
}

const capital = (sentence: string): string => sentence[0]!.toUpperCase() + sentence.slice(1);
