import type { RunDocument } from '#shared/api/runs.ts';

/**
 * A run as JUnit XML: one test for the whole, and one for each failure listed, so that a build's report names them.
 * Names are unique, times plain decimals, and no attribute stands where consumers refuse one.
 */
export function runAsJUnit(run: RunDocument): string {
  const [noun, suite] = run.kind === 'rates' ? ['rate', run.label ?? 'Rate verification'] : ['attitude', run.label ?? 'Attitude verification'];
  const within = `within ${sizeOf(run.tolerance)} ${run.tolerance.unit}`;
  const cases = [
    testCase(suite, `all ${run.count} ${noun}s ${within}`, run.verdict === 'fail' ? `${run.failed} of ${run.count} ${noun}s are off by more. ${run.summary}${diagnosisOf(run)}` : null),
    ...run.failures.map((failure) => testCase(suite, `${noun} ${failure.index} ${within}`, `off by ${sizeOf(failure)} ${run.tolerance.unit}`)),
  ];
  const failed = (run.verdict === 'fail' ? 1 : 0) + run.failures.length;
  const counts = `tests="${cases.length}" failures="${failed}" errors="0" time="0.000"`;
  return `<?xml version="1.0" encoding="UTF-8"?>
<testsuites name="Dextral" ${counts}>
  <testsuite name="${escape(suite)}" ${counts} timestamp="${run.at}">
    <properties>
      <property name="run" value="${escape(run.id)}"/>
      <property name="commit" value="${escape(run.commit ?? '')}"/>
      <property name="engine" value="${escape(run.engine)}"/>
    </properties>
${cases.join('\n')}
  </testsuite>
</testsuites>
`;
}

const sizeOf = (error: { readonly angle: number } | { readonly rate: number }): number => ('angle' in error ? error.angle : error.rate);

function diagnosisOf(run: RunDocument): string {
  const diagnosis = run.kind === 'attitudes' ? run.diagnosis : undefined;
  const [plainest] = diagnosis?.explanations ?? [];
  if (!diagnosis || !plainest || plainest.edits.length === 0) return '';
  return ` ${diagnosis.outcome === 'unique' ? 'Explained by' : `The plainest of ${diagnosis.remaining} explanations`}: ${plainest.edits.join('; ')}.`;
}

function testCase(suite: string, name: string, failure: string | null): string {
  const open = `    <testcase classname="${escape(suite)}" name="${escape(name)}" time="0.000"`;
  return failure === null ? `${open}/>` : `${open}>\n      <failure message="${escape(failure)}"/>\n    </testcase>`;
}

/** XML 1.0 has no way at all to write most control characters: they are left out. */
const escape = (text: string): string => text
  // eslint-disable-next-line no-control-regex
  .replaceAll(/[\u0000-\u0008\u000b\u000c\u000e-\u001f\ufffe\uffff]/g, '')
  .replaceAll('&', '&amp;').replaceAll('<', '&lt;').replaceAll('>', '&gt;').replaceAll('"', '&quot;');
