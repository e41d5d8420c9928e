import { useForm } from 'react-hook-form';
import { Button } from '../../../components/button.tsx';
import { Dialog } from '../../../components/dialog.tsx';
import { TextField } from '../../../components/field.tsx';
import { ProblemNotice } from '../../../components/notice.tsx';
import { useChangeHistorySettings, type HistorySettings } from '../api/history-settings.ts';

const MOST_DAYS = 3650;

/** What the history keeps, and for how long: for the whole workspace, in force on the next call. */
export function HistorySettingsDialog({ settings, onClose }: { settings: HistorySettings; onClose: () => void }) {
  const change = useChangeHistorySettings();
  const { register, handleSubmit, formState: { errors } } = useForm({ defaultValues: { keepBodies: settings.keepBodies, days: settings.retentionDays === null ? '' : String(settings.retentionDays) } });
  const submit = handleSubmit(({ keepBodies, days }) => change.mutate({ keepBodies, retentionDays: days.trim() === '' ? null : Number(days) }, { onSuccess: onClose }));
  return (
    <Dialog title="What the history keeps" onClose={onClose}>
      <form className="space-y-4" noValidate onSubmit={(event) => void submit(event)}>
        <label className="flex items-start gap-2"><input type="checkbox" className="mt-1" {...register('keepBodies')} />
          <span>Keep the bodies of calls that compute, up to 64 KiB each. <span className="text-soft">A conversion can then be opened and sent again. Otherwise only the SHA-256 of a body is kept.</span></span></label>
        <TextField label="Forget calls after days" figures inputMode="numeric" hint="Empty for never. Usage and runs stay. What is forgotten cannot be brought back." error={errors.days?.message}
          {...register('days', { validate: (text) => text.trim() === '' || (/^\d+$/.test(text.trim()) && Number(text) >= 1 && Number(text) <= MOST_DAYS) || `A whole number from 1 to ${MOST_DAYS}, or nothing.` })} />
        {change.error && <ProblemNotice error={change.error} />}
        <div className="flex justify-end gap-3"><Button onClick={onClose}>Cancel</Button><Button kind="main" type="submit" busy={change.isPending}>Keep so</Button></div>
      </form>
    </Dialog>
  );
}
