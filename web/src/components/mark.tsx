/** The product's mark: a right-handed triad, its axes told apart by line style. */
export function Mark() {
  return (
    <svg viewBox="0 0 32 32" width="26" height="26" aria-hidden="true" fill="none" stroke="currentColor" strokeWidth="2">
      <path d="M9 23V5" /><path d="M9 23h18" strokeDasharray="4 2.5" /><path d="M9 23l10-10" strokeDasharray="1.6 2.4" />
      <path d="M9 2l3 5H6zM30 23l-5 3v-6zM22 10l-1 5-4-4z" fill="currentColor" stroke="none" />
    </svg>
  );
}
