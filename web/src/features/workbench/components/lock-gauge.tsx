const NEAR = 1;

/**
 * The margin to gimbal lock as a quarter of a protractor: the needle stands at the angle left. Lock is the vertical;
 * the last degree is drawn as a heavy line, since a true sector of one degree would be too thin to see.
 */
export function LockGauge({ marginDeg, condition }: { marginDeg: number; condition: number | null }) {
  if (Number.isNaN(marginDeg)) return <p className="text-soft">These axes have no Euler angles.</p>;
  const angle = (marginDeg * Math.PI) / 180;
  const x = 12 + 88 * Math.sin(angle);
  const y = 106 - 88 * Math.cos(angle);
  const ticks = [0, 10, 20, 30, 40, 50, 60, 70, 80, 90];
  return (
    <div className="flex flex-wrap items-center gap-x-6 gap-y-2">
      <svg viewBox="0 0 124 118" width="150" height="143" aria-hidden="true" fill="none" stroke="currentColor">
        <path d="M12 106V10M12 106h96" strokeWidth="1" /><path d="M12 18a88 88 0 0 1 88 88" strokeWidth="1" />
        {ticks.map((tick) => {
          const t = (tick * Math.PI) / 180;
          const inner = tick % 30 === 0 ? 80 : 84;
          return <path key={tick} d={`M${12 + inner * Math.sin(t)} ${106 - inner * Math.cos(t)}L${12 + 88 * Math.sin(t)} ${106 - 88 * Math.cos(t)}`} strokeWidth="1" />;
        })}
        <path d="M12 26V12" strokeWidth="5" />
        <path d={`M12 106L${x} ${y}`} strokeWidth="2.4" className="text-accent" /><circle cx={x} cy={y} r="3.4" fill="currentColor" className="text-accent" />
        <g fill="currentColor" stroke="none" className="text-[9px]"><text x="17" y="10">lock</text><text x="99" y="116">90°</text><text x="57" y="27">30°</text><text x="91" y="60">60°</text></g>
      </svg>
      <p className="max-w-[34ch]">
        <span className="figures text-xl">{marginDeg < 0.001 && marginDeg > 0 ? marginDeg.toExponential(2) : marginDeg.toFixed(3)}°</span> left to gimbal lock.{' '}
        {condition === null ? 'At lock only one combination of the first and last angle exists.'
          : <>An attitude error shows up to <span className="figures">{condition < 1e4 ? condition.toFixed(2) : condition.toExponential(2)}</span> times as large in the first and last angle.</>}
        {marginDeg < NEAR && condition !== null && ' That is near lock.'}
      </p>
    </div>
  );
}
