import { useState } from 'react';
import { Button } from './button.tsx';

export function CopyButton({ text, what }: { text: string; what: string }) {
  const [state, setState] = useState<'idle' | 'copied' | 'failed'>('idle');
  async function copy() {
    try {
      await navigator.clipboard.writeText(text);
      setState('copied');
    } catch {
      setState('failed');
    }
    setTimeout(() => setState('idle'), 3000);
  }
  return (
    <Button kind="quiet" onClick={() => void copy()} aria-label={`Copy: ${what}`}>
      <span aria-live="polite">{state === 'copied' ? 'Copied' : state === 'failed' ? 'Select and copy by hand' : 'Copy'}</span>
    </Button>
  );
}
