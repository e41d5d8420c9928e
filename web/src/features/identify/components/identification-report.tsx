import type { ReactNode } from 'react';
import type { Identification } from '../../../../../shared/attitude/identification/identification.ts';
import { Notice } from '../../../components/notice.tsx';
import { count, plural } from '../../../lib/format.ts';
import { conventionLine, number } from '../model/convention-line.ts';
import { ExplanationEntry } from './explanation-entry.tsx';
import { NextTests } from './next-tests.tsx';

/** Explanations spelled out; the rest are one line each. */
const SPELLED_OUT = 5;

/** What the numbers may be, what else they may be, what the data cannot tell, and what to test next. */
export function IdentificationReport({ identification, action }: { identification: Identification; action?: (explanation: Identification['explanations'][number]) => ReactNode }) {
  const { outcome, explanations, remaining, unobservable, discriminating, runnerUp } = identification;
  const more = explanations.slice(SPELLED_OUT);
  return (
    <div className="space-y-6">
      <Outcome identification={identification} />
      {explanations.length > 0 && (
        <ol className="space-y-4" aria-label="Explanations">
          {explanations.slice(0, SPELLED_OUT).map((explanation, index) => <ExplanationEntry key={index} place={index + 1} explanation={explanation} action={action?.(explanation)} />)}
        </ol>
      )}
      {more.length > 0 && (
        <details>
          <summary className="cursor-pointer font-semibold">{plural(remaining - SPELLED_OUT, 'more explanation')}</summary>
          <ol start={SPELLED_OUT + 1} className="mt-2 list-decimal space-y-1 pl-10">
            {more.map(({ convention, edits }, index) => <li key={index}>{edits.length > 0 ? edits.join('; ') : conventionLine(convention)}</li>)}
          </ol>
          {remaining > explanations.length && <p className="mt-2 text-soft">{count(remaining - explanations.length)} more are not listed.</p>}
        </details>
      )}
      {unobservable.length > 0 && (
        <section><h3 className="mb-1 font-semibold">What these data cannot tell</h3><ul className="list-disc space-y-1 pl-6">{unobservable.map((sentence) => <li key={sentence}>{sentence}</li>)}</ul></section>
      )}
      {discriminating.length > 0 && <NextTests tests={discriminating} />}
      {runnerUp && outcome !== 'ambiguous' && (
        <p className="text-soft">The nearest that was given up: {runnerUp.edits.length > 0 ? runnerUp.edits.join('; ') : conventionLine(runnerUp.convention)}. It leaves {number(runnerUp.residual.rms)} {runnerUp.residual.unit} rms, {number(runnerUp.timesNoise)} times the noise.</p>
      )}
    </div>
  );
}

function Outcome({ identification: { outcome, explanations, remaining } }: { identification: Identification }) {
  switch (outcome) {
    case 'unique': return <Notice kind={explanations[0]!.edits.length === 0 ? 'done' : 'caution'} title={explanations[0]!.edits.length === 0 ? 'The numbers follow what was stated.' : 'One explanation fits, and nothing else does.'} />;
    case 'ambiguous': return <Notice kind="note" title={`${plural(remaining, 'explanation')} ${remaining === 1 ? 'fits' : 'fit'} the data alike.`}><p>Fewest changes first. The data do not say which it is{remaining === 1 ? ' in every part' : ''}.</p></Notice>;
    case 'none': return <Notice kind="problem" title="Nothing explains the numbers within the noise."><p>No convention, offset, lag or scale that was tried turns the reference into them. Is the noise stated too low, or is a row missing on one side?</p></Notice>;
  }
}
