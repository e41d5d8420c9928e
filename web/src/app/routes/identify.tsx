import { useMemo, useState } from 'react';
import { useNavigate } from 'react-router-dom';
import { Button } from '../../components/button.tsx';
import { SelectField, TextField } from '../../components/field.tsx';
import { Notice, ProblemNotice } from '../../components/notice.tsx';
import { PageHeading } from '../../components/page-heading.tsx';
import { useIdentify } from '../../features/identify/api/identify.ts';
import { IdentificationReport } from '../../features/identify/components/identification-report.tsx';
import { timesIn, timesOf } from '../../features/identify/model/times.ts';
import { RecordingEditor } from '../../features/verify/components/recording-editor.tsx';
import { emptyRecording } from '../../features/verify/model/recording.ts';
import { useReadRecording } from '../../features/verify/model/use-read-recording.ts';
import { ConventionEditor } from '../../features/workbench/components/convention-editor.tsx';
import { statementOf } from '../../features/workbench/model/workbench-state.ts';

export function Component() {
  const navigate = useNavigate();
  const identify = useIdentify();
  const [reference, setReference] = useState(() => emptyRecording(statementOf('aircraft-euler-deg')));
  const [observed, setObserved] = useState(() => emptyRecording(statementOf('aircraft-quaternion')));
  const [believed, setBelieved] = useState(true);
  const [timeColumn, setTimeColumn] = useState<string | null>(null);
  const [noise, setNoise] = useState({ angle: '0.05', unit: 'deg' as 'deg' | 'rad' });
  const left = useReadRecording(reference);
  const right = useReadRecording(observed);
  const column = timeColumn ?? timesIn(left.table, left.columns);
  const times = useMemo(() => timesOf(left.table, column), [left.table, column]);
  const sigma = Number(noise.angle);
  const obstacle = left.error || right.error ? 'Mend what is marked first.'
    : left.attitudes.length === 0 || right.attitudes.length === 0 ? 'Give both the reference and what was observed.'
      : left.attitudes.length !== right.attitudes.length ? `${left.attitudes.length} reference attitudes do not match ${right.attitudes.length} observed ones: one observed row for each.`
        : noise.angle.trim() === '' || !(sigma >= 0) ? 'The noise must be 0 or more.' : null;

  function ask() {
    const { convention } = observed.statement;
    identify.mutate({
      reference: { convention: reference.statement.convention, attitudes: left.attitudes },
      observed: { representation: convention.representation, numbers: right.attitudes, ...(believed ? { stated: convention } : {}) },
      ...(times ? { times } : {}), noise: { angle: sigma, unit: noise.unit },
    });
  }

  return (
    <>
      <PageHeading title="Identify">Which convention a unit’s numbers really follow: give attitudes that are trusted and what the unit listed at the same moments. Every reading, axis set, order, sign and unit is tried, then offsets, a time lag and a scale.</PageHeading>
      <form className="space-y-6" onSubmit={(event) => { event.preventDefault(); if (!obstacle) ask(); }}>
        <div className="grid gap-6 lg:grid-cols-2">
          {([['Reference', reference, setReference, left], ['Observed', observed, setObserved, right]] as const).map(([name, side, set, read]) => (
            <div key={name} className="space-y-4">
              <ConventionEditor legend={name} statement={side.statement} onChange={(statement) => set({ ...side, statement, columns: [] })} />
              {name === 'Observed' && (
                <label className="flex items-start gap-2"><input type="checkbox" className="mt-1" checked={believed} onChange={(event) => setBelieved(event.target.checked)} />
                  <span>This convention is what the interface sheet states. <span className="text-soft">The answer then says what to change in it. It is not believed either way.</span></span></label>
              )}
              <RecordingEditor label={`${name} attitudes`} recording={side} read={read} onChange={set} />
            </div>
          ))}
        </div>
        <div className="grid items-end gap-3 sm:grid-cols-[8rem_6rem_14rem_1fr]">
          <TextField label="Noise (1 σ)" figures inputMode="decimal" value={noise.angle} onChange={(event) => setNoise({ ...noise, angle: event.target.value })} />
          <SelectField label="Unit" value={noise.unit} onChange={(event) => setNoise({ ...noise, unit: event.target.value as 'deg' | 'rad' })}><option>deg</option><option>rad</option></SelectField>
          <SelectField label="Times, in seconds" value={column} onChange={(event) => setTimeColumn(event.target.value)}>
            <option value="">none: no lag is looked for</option>
            {left.table.columns.map((title, k) => <option key={k} value={k}>{title}</option>)}
          </SelectField>
          <div className="sm:justify-self-end"><Button kind="main" type="submit" disabled={obstacle !== null} busy={identify.isPending}>Identify</Button></div>
        </div>
        {obstacle && <Notice kind="note" title={obstacle} />}
        {identify.error && <ProblemNotice error={identify.error} />}
      </form>
      {identify.data && (
        <section className="mt-10" aria-live="polite">
          <h2 className="mb-3 text-lg font-semibold">What the numbers are</h2>
          <IdentificationReport identification={identify.data} action={(explanation) => (explanation.constantOffset || explanation.timeLag || explanation.scale !== undefined || explanation.numbersAre ? null : (
            <Button onClick={() => navigate('/verify', { state: { expected: reference, actual: { ...observed, statement: { preset: null, convention: explanation.convention } } } })}>Verify in this convention</Button>
          ))} />
        </section>
      )}
    </>
  );
}
