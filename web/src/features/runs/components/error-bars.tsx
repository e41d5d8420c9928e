import type { Run } from '../api/runs.ts';
import { sizeOf } from '../model/angle.ts';

/** The four figures against the tolerance, as lengths; the table beside says the same in numbers. */
export function ErrorBars({ run }: { run: Run }) {
  const tolerance = sizeOf(run.tolerance);
  const most = Math.max(run.statistics.max, tolerance) || 1;
  const x = (value: number): number => 90 + (value / most) * 380;
  return (
    <svg viewBox="0 0 480 104" className="w-full max-w-xl" aria-hidden="true" stroke="currentColor" fill="currentColor">
      {(['rms', 'median', 'p95', 'max'] as const).map((name, i) => (
        <g key={name}>
          <text x="0" y={22 + i * 20} stroke="none" className="text-[11px]">{name}</text>
          <path d={`M90 ${18 + i * 20}H${x(run.statistics[name])}`} strokeWidth="7" className={run.statistics[name] > tolerance ? 'text-accent' : ''} stroke="currentColor" />
        </g>
      ))}
      <path d={`M${x(tolerance)} 8V90`} strokeWidth="1" strokeDasharray="4 3" /><text x={Math.min(x(tolerance) + 3, 420)} y="101" stroke="none" className="text-[11px]">tolerance</text>
      <path d="M90 8V90" strokeWidth="1" />
    </svg>
  );
}
