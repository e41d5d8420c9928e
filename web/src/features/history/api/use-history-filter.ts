import { useSearchParams } from 'react-router-dom';
import { NO_FILTER, type HistoryFilter } from './history.ts';

const NAMES = Object.keys(NO_FILTER) as (keyof HistoryFilter)[];

/** The filter lives in the address, so that a view can be linked to; changing it starts again at the newest entry. */
export function useHistoryFilter(): readonly [HistoryFilter, (change: Partial<HistoryFilter>) => void] {
  const [search, setSearch] = useSearchParams();
  const filter = Object.fromEntries(NAMES.map((name) => [name, search.get(name) ?? ''])) as unknown as HistoryFilter;
  function change(values: Partial<HistoryFilter>) {
    setSearch((before) => {
      const next = new URLSearchParams(before);
      if (!('cursor' in values)) next.delete('cursor');
      for (const [name, value] of Object.entries(values)) {
        if (value) next.set(name, value);
        else next.delete(name);
      }
      return next;
    });
  }
  return [filter, change];
}
