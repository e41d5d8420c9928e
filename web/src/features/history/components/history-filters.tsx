import { ROLES } from '../../../../../shared/api/roles.ts';
import { Button } from '../../../components/button.tsx';
import { SelectField, TextField } from '../../../components/field.tsx';
import type { ApiKey } from '../../keys/api/keys.ts';
import { NO_FILTER, type HistoryFilter } from '../api/history.ts';

const STATUSES = [['2xx', '2xx answered'], ['4xx', '4xx refused'], ['5xx', '5xx failed'], ['401', '401'], ['403', '403'], ['404', '404'], ['409', '409'], ['413', '413'], ['415', '415'], ['422', '422'], ['429', '429'], ['503', '503']] as const;
const WARNINGS = ['near-gimbal-lock', 'severe-gimbal-lock', 'gimbal-lock', 'renormalised', 'reorthonormalised'] as const;

export function HistoryFilters({ filter, onChange, keys, routes }: {
  filter: HistoryFilter; onChange: (change: Partial<HistoryFilter>) => void; keys: readonly ApiKey[]; routes: readonly string[];
}) {
  const set = (name: keyof HistoryFilter) => (event: { target: { value: string } }) => onChange({ [name]: event.target.value });
  const filtered = Object.entries(filter).some(([name, value]) => name !== 'cursor' && value !== '');
  const shortId = filter.id !== '' && filter.id.trim().length < 8;
  return (
    <form role="search" aria-label="Filter the history" className="mb-4 grid grid-cols-1 items-start gap-3 sm:grid-cols-2 lg:grid-cols-5" onSubmit={(event) => event.preventDefault()}>
      <SelectField label="Key" value={filter.key} onChange={set('key')}>
        <option value="">every key</option>{keys.map(({ id, name }) => <option key={id} value={id}>{name}</option>)}
      </SelectField>
      <SelectField label="Role" value={filter.role} onChange={set('role')}>
        <option value="">every role</option>{ROLES.map((role) => <option key={role}>{role}</option>)}
      </SelectField>
      <SelectField label="Route" value={filter.route} onChange={set('route')}>
        <option value="">every route</option>{routes.map((route) => <option key={route}>{route}</option>)}
      </SelectField>
      <SelectField label="Status" value={filter.status} onChange={set('status')}>
        <option value="">every status</option>{STATUSES.map(([value, label]) => <option key={value} value={value}>{label}</option>)}
      </SelectField>
      <SelectField label="Verdict" value={filter.verdict} onChange={set('verdict')}>
        <option value="">with or without</option><option value="fail">fail</option><option value="pass">pass</option>
      </SelectField>
      <SelectField label="Warning" value={filter.warning} onChange={set('warning')}>
        <option value="">with or without</option>{WARNINGS.map((code) => <option key={code}>{code}</option>)}
      </SelectField>
      <TextField label="Request id" value={filter.id} onChange={set('id')} spellCheck={false} autoComplete="off" {...(shortId ? { hint: 'Eight characters or more.' } : {})} />
      <TextField label="From (UTC)" type="datetime-local" value={filter.from} onChange={set('from')} />
      <TextField label="Before (UTC)" type="datetime-local" value={filter.to} onChange={set('to')} />
      <Button className="lg:mt-6" disabled={!filtered} onClick={() => onChange(NO_FILTER)}>Clear</Button>
    </form>
  );
}
