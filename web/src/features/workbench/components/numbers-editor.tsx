import type { Convention } from '../../../../../shared/attitude/convention.ts';
import { TextField } from '../../../components/field.tsx';
import { numberLabels } from '../model/number-labels.ts';

/** One field a number; several numbers pasted into one are spread over the fields from there on. */
export function NumbersEditor({ convention, numbers, bad, onChange }: { convention: Convention; numbers: readonly string[]; bad: readonly number[]; onChange: (numbers: string[]) => void }) {
  const labels = numberLabels(convention);
  function spread(at: number, text: string): boolean {
    const parts = text.trim().split(/[\s,;[\]()]+/).filter(Boolean);
    if (parts.length < 2) return false;
    onChange(numbers.map((number, i) => parts[i - at] ?? number));
    return true;
  }
  return (
    <div className={`grid gap-3 ${numbers.length === 4 ? 'grid-cols-2' : 'grid-cols-1 sm:grid-cols-3'}`}>
      {labels.map((label, i) => (
        <TextField key={`${convention.representation}${i}`} label={label} figures inputMode="text" autoComplete="off" spellCheck={false} value={numbers[i] ?? ''}
          error={bad.includes(i) ? 'a number, such as -12.5' : undefined}
          onPaste={(event) => { if (spread(i, event.clipboardData.getData('text'))) event.preventDefault(); }}
          onChange={(event) => onChange(numbers.map((number, j) => (j === i ? event.target.value : number)))} />
      ))}
    </div>
  );
}
