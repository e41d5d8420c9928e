import { useMemo, useState } from 'react';
import { Button } from '../../components/button.tsx';
import { CodeBlock } from '../../components/code-block.tsx';
import { Notice } from '../../components/notice.tsx';
import { PageHeading } from '../../components/page-heading.tsx';
import { CrossCheckPanel } from '../../features/workbench/components/cross-check-panel.tsx';
import { ConventionEditor } from '../../features/workbench/components/convention-editor.tsx';
import { EveryRepresentation } from '../../features/workbench/components/every-representation.tsx';
import { NumbersEditor } from '../../features/workbench/components/numbers-editor.tsx';
import { Result } from '../../features/workbench/components/result.tsx';
import { compute, readNumbers } from '../../features/workbench/model/compute.ts';
import { equivalentCalls } from '../../features/workbench/model/equivalent-calls.ts';
import { useWorkbenchState } from '../../features/workbench/model/workbench-state.ts';

export function Component() {
  const [state, change] = useWorkbenchState();
  const { from, to, numbers } = state;
  const result = useMemo(() => compute(from.convention, to.convention, numbers), [from.convention, to.convention, numbers]);
  const refused = 'refusal' in result;
  return (
    <>
      <PageHeading title="Workbench" action={<Button disabled={refused} onClick={() => { if (!refused) change({ from: to, to: from, numbers: result.numbers.map(String) }); }}>Turn round</Button>}>
        Numbers in one convention, the same attitude in another: computed here by the core that the service runs. The address holds everything you see.
      </PageHeading>
      <div className="grid items-start gap-6 lg:grid-cols-2 xl:grid-cols-[1fr_1fr_1.1fr]">
        <div className="space-y-4">
          <ConventionEditor legend="From" statement={from} onChange={(statement) => change({ from: statement })} />
          <NumbersEditor convention={from.convention} numbers={numbers} bad={refused ? result.bad : []} onChange={(next) => change({ numbers: next })} />
          <p className="text-sm text-soft">Several numbers pasted into one field are spread over the fields.</p>
        </div>
        <ConventionEditor legend="To" statement={to} onChange={(statement) => change({ to: statement })} />
        <div aria-live="polite" className="lg:col-span-2 xl:col-span-1">
          {refused ? <Notice kind="problem" title="No answer for these numbers"><p>{result.refusal}</p></Notice> : <Result convention={to.convention} result={result} />}
        </div>
      </div>
      {!refused && (
        <>
          <div className="mt-10 max-w-3xl">
            {/* A check belongs to the numbers it was made of: others start without one. */}
            <CrossCheckPanel key={JSON.stringify(state)} from={from.convention} to={to.convention} input={readNumbers(numbers).values} shown={result.numbers} />
          </div>
          <section className="mt-10">
            <h2 className="mb-3 text-lg font-semibold">In every representation</h2>
            <EveryRepresentation every={result.every} />
          </section>
          <section className="mt-10">
            <h2 className="mb-3 text-lg font-semibold">The same by API</h2>
            <ApiCall calls={equivalentCalls(location.origin, from, to, readNumbers(numbers).values)} />
          </section>
        </>
      )}
    </>
  );
}

function ApiCall({ calls }: { calls: ReturnType<typeof equivalentCalls> }) {
  const [chosen, setChosen] = useState<string>('curl');
  const [language, text] = calls.find(([name]) => name === chosen)!;
  return (
    <>
      <div role="group" aria-label="Language" className="mb-2 flex">
        {calls.map(([name]) => (
          <button key={name} type="button" aria-pressed={name === chosen} onClick={() => setChosen(name)}
            className={`-ml-px min-h-10 cursor-pointer border border-rule px-4 first:ml-0 ${name === chosen ? 'bg-ink text-sheet' : 'hover:bg-well'}`}>{name}</button>
        ))}
      </div>
      <CodeBlock label={language} text={text} />
    </>
  );
}
