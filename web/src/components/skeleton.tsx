/** Holds the place of what is being fetched. */
export function Skeleton({ lines = 6, label }: { lines?: number; label: string }) {
  return (
    <div role="status" aria-label={label} className="space-y-3 py-2">
      {Array.from({ length: lines }, (_, i) => <div key={i} className="h-6 animate-pulse bg-well" />)}
    </div>
  );
}
