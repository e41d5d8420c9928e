import { count } from '../../../lib/format.ts';

/** A share of a quota as a length; the words beside say the same. */
export function QuotaBar({ used, quota }: { used: number; quota: number }) {
  const share = quota === 0 ? 0 : Math.min(1, used / quota);
  return (
    <span className="block min-w-40">
      <svg viewBox="0 0 100 6" preserveAspectRatio="none" className="block h-2 w-full border border-rule" aria-hidden="true"><rect width={Math.max(share * 100, used > 0 ? 0.6 : 0)} height="6" fill="currentColor" className={share >= 0.8 ? 'text-accent' : ''} /></svg>
      <span className="text-sm text-soft">{quota === 0 ? 'computes nothing' : `${share < 0.001 && used > 0 ? 'under 0.1' : (share * 100).toFixed(1)} % of ${count(quota)}`}</span>
    </span>
  );
}
