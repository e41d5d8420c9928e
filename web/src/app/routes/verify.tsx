import { useState } from 'react';
import { useLocation, useNavigate } from 'react-router-dom';
import { Button } from '../../components/button.tsx';
import { SelectField, TextField } from '../../components/field.tsx';
import { Notice, ProblemNotice } from '../../components/notice.tsx';
import { PageHeading } from '../../components/page-heading.tsx';
import { useVerify, type Tolerance } from '../../features/runs/api/runs.ts';
import { RecordingEditor } from '../../features/verify/components/recording-editor.tsx';
import { emptyRecording, type Recording } from '../../features/verify/model/recording.ts';
import { useReadRecording } from '../../features/verify/model/use-read-recording.ts';
import { ConventionEditor } from '../../features/workbench/components/convention-editor.tsx';
import { statementOf } from '../../features/workbench/model/workbench-state.ts';

export function Component() {
  const navigate = useNavigate();
  const verify = useVerify();
  // What the identify page hands over.
  const given = useLocation().state as { readonly expected?: Recording; readonly actual?: Recording } | null;
  const [expected, setExpected] = useState(() => given?.expected ?? emptyRecording(statementOf('aircraft-euler-deg')));
  const [actual, setActual] = useState(() => given?.actual ?? emptyRecording(statementOf('aircraft-quaternion')));
  const [diagnose, setDiagnose] = useState(true);
  const [repair, setRepair] = useState(false);
  const [tolerance, setTolerance] = useState({ angle: '0.1', unit: 'deg' as Tolerance['unit'] });
  const [label, setLabel] = useState('');
  const left = useReadRecording(expected);
  const right = useReadRecording(actual);
  const within = Number(tolerance.angle);
  const obstacle = left.error || right.error ? 'Mend what is marked first.'
    : left.attitudes.length === 0 || right.attitudes.length === 0 ? 'Give both the expected and the actual attitudes.'
      : left.attitudes.length !== right.attitudes.length ? `${left.attitudes.length} expected attitudes cannot be compared with ${right.attitudes.length} actual ones.`
        : !(within > 0) ? 'The tolerance must be greater than 0.' : null;

  return (
    <>
      <PageHeading title="Verify">What code computed, against what it should have: the angle between the two attitudes, whatever conventions they come in. The verdict is kept as a run.</PageHeading>
      <form className="space-y-6" onSubmit={(event) => {
        event.preventDefault();
        if (obstacle) return;
        verify.mutate({
          expected: { convention: expected.statement.convention, attitudes: left.attitudes }, actual: { convention: actual.statement.convention, attitudes: right.attitudes },
          tolerance: { angle: within, unit: tolerance.unit }, ...(label.trim() && { label: label.trim() }), diagnose, ...(repair && { repair: 'nearest' as const }),
        }, { onSuccess: ({ run }) => navigate(`/runs/${run}`) });
      }}>
        <div className="grid gap-6 lg:grid-cols-2">
          {([['Expected', expected, setExpected, left], ['Actual', actual, setActual, right]] as const).map(([name, side, set, read]) => (
            <div key={name} className="space-y-4">
              <ConventionEditor legend={name} statement={side.statement} onChange={(statement) => set({ ...side, statement, columns: [] })} />
              <RecordingEditor label={`${name} attitudes`} recording={side} read={read} onChange={set} />
            </div>
          ))}
        </div>
        <div className="grid items-end gap-3 sm:grid-cols-[8rem_8rem_1fr_auto]">
          <TextField label="Tolerance" figures inputMode="decimal" value={tolerance.angle} onChange={(event) => setTolerance({ ...tolerance, angle: event.target.value })} />
          <SelectField label="Unit" value={tolerance.unit} onChange={(event) => setTolerance({ ...tolerance, unit: event.target.value as Tolerance['unit'] })}>{['deg', 'rad', 'arcsec'].map((unit) => <option key={unit}>{unit}</option>)}</SelectField>
          <TextField label="Label" placeholder="what is checked" maxLength={120} value={label} onChange={(event) => setLabel(event.target.value)} />
          <Button kind="main" type="submit" disabled={obstacle !== null} busy={verify.isPending}>Verify</Button>
        </div>
        <label className="flex items-start gap-2"><input type="checkbox" className="mt-1" checked={diagnose} onChange={(event) => setDiagnose(event.target.checked)} />
          <span>If it fails, say which mistake of convention would explain it.</span></label>
        <label className="flex items-start gap-2"><input type="checkbox" className="mt-1" checked={repair} onChange={(event) => setRepair(event.target.checked)} />
          <span>Numbers of few digits: take the nearest rotation. <span className="text-soft">Otherwise a quaternion or a matrix off by more than 10⁻⁶ is refused.</span></span></label>
        {obstacle && <Notice kind="note" title={obstacle} />}
        {verify.error && <ProblemNotice error={verify.error} />}
      </form>
    </>
  );
}
