import { Button } from '../../../components/button.tsx';
import { SelectField, TextField } from '../../../components/field.tsx';
import type { ApiKey } from '../../keys/api/keys.ts';
import type { HistoryFilter } from '../api/history.ts';

const STATUSES = [['2xx', '2xx answered'], ['4xx', '4xx refused'], ['5xx', '5xx failed'], ['401', '401'], ['403', '403'], ['404', '404'], ['413', '413'], ['415', '415'], ['422', '422'], ['429', '429']] as const;

export function HistoryFilters({ filter, onChange, keys, routes }: {
  filter: HistoryFilter; onChange: (change: Partial<HistoryFilter>) => void; keys: readonly ApiKey[]; routes: readonly string[];
}) {
  const set = (name: keyof HistoryFilter) => (event: { target: { value: string } }) => onChange({ [name]: event.target.value });
  const filtered = filter.key || filter.route || filter.status || filter.from || filter.to;
  return (
    <form role="search" aria-label="Filter the history" className="mb-4 grid grid-cols-1 gap-3 sm:grid-cols-2 lg:grid-cols-[1fr_1fr_1fr_1fr_1fr_auto] lg:items-end" onSubmit={(event) => event.preventDefault()}>
      <SelectField label="Key" value={filter.key} onChange={set('key')}>
        <option value="">every key</option>{keys.map(({ id, name }) => <option key={id} value={id}>{name}</option>)}
      </SelectField>
      <SelectField label="Route" value={filter.route} onChange={set('route')}>
        <option value="">every route</option>{routes.map((route) => <option key={route}>{route}</option>)}
      </SelectField>
      <SelectField label="Status" value={filter.status} onChange={set('status')}>
        <option value="">every status</option>{STATUSES.map(([value, label]) => <option key={value} value={value}>{label}</option>)}
      </SelectField>
      <TextField label="From (UTC)" type="datetime-local" value={filter.from} onChange={set('from')} />
      <TextField label="Before (UTC)" type="datetime-local" value={filter.to} onChange={set('to')} />
      <Button disabled={!filtered} onClick={() => onChange({ key: '', route: '', status: '', from: '', to: '' })}>Clear</Button>
    </form>
  );
}
