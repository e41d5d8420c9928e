import { useEffect, useId, useRef, type ReactNode } from 'react';

/** A modal dialog of the browser's own: it holds the focus, closes on Escape, and gives the focus back. Without `onClose` it stays until its work is done. */
export function Dialog({ title, onClose, children }: { title: string; onClose: (() => void) | null; children: ReactNode }) {
  const dialog = useRef<HTMLDialogElement>(null);
  const id = useId();
  useEffect(() => {
    const element = dialog.current;
    if (element && !element.open) element.showModal();
    return () => element?.close();
  }, []);
  return (
    <dialog ref={dialog} aria-labelledby={id} onCancel={(event) => { event.preventDefault(); onClose?.(); }}
      // A browser cancels a dialog that refuses once all the same when Escape is pressed again.
      onKeyDown={(event) => { if (event.key === 'Escape' && onClose === null) event.preventDefault(); }}
      className="m-auto w-[min(36rem,calc(100vw-2rem))] border border-rule bg-sheet p-0 text-ink">
      <div className="border-b border-rule px-5 py-3"><h2 id={id} className="text-lg font-semibold">{title}</h2></div>
      <div className="p-5">{children}</div>
    </dialog>
  );
}
