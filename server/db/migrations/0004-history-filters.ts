import type { Migration } from '../migrate.ts';

/**
 * The history in order of time, newest first, by every filter: each index ends in the time (and, as every index of
 * SQLite, the row's id), so that a page is read straight off it and a range of time is a range of any index.
 * A row keeps the role it was called with, since people and keys change theirs; `verdict` repeats its run's.
 * `request_warnings` has one row for each code of a request; without a foreign key, whose check would need an index
 * of its own: whoever deletes requests deletes these.
 */
export const historyFilters: Migration = {
  name: '0004-history-filters',
  statements: [
    `ALTER TABLE requests ADD COLUMN role TEXT CHECK (role IN ('administrator', 'integrator', 'engineer', 'reviewer'))`,
    `ALTER TABLE requests ADD COLUMN verdict TEXT CHECK (verdict IN ('pass', 'fail'))`,
    `UPDATE requests SET role = COALESCE((SELECT role FROM api_keys WHERE id = key_id), (SELECT role FROM people WHERE id = person_id))`,
    'UPDATE requests SET verdict = runs.verdict FROM runs WHERE runs.request_id = requests.request_id',
    `CREATE TABLE request_warnings (
      code TEXT NOT NULL,
      at INTEGER NOT NULL,
      request INTEGER NOT NULL,
      PRIMARY KEY (code, at, request)
    ) STRICT, WITHOUT ROWID`,
    `INSERT OR IGNORE INTO request_warnings (code, at, request)
      SELECT codes.value, requests.at, requests.id FROM requests, json_each('["' || replace(requests.warning_codes, ',', '","') || '"]') AS codes
      WHERE requests.warning_codes <> ''`,
    'DROP INDEX requests_by_time',
    'DROP INDEX requests_by_key',
    'DROP INDEX requests_by_owner',
    'DROP INDEX requests_by_route',
    'DROP INDEX requests_by_status',
    'CREATE INDEX requests_by_time ON requests (at)',
    'CREATE INDEX requests_by_key ON requests (key_id, at) WHERE key_id IS NOT NULL',
    'CREATE INDEX requests_by_owner ON requests (owner_id, at) WHERE owner_id IS NOT NULL',
    'CREATE INDEX requests_by_owner_and_route ON requests (owner_id, route) WHERE owner_id IS NOT NULL',
    'CREATE INDEX requests_by_route ON requests (route, at)',
    'CREATE INDEX requests_by_status ON requests (status, at)',
    'CREATE INDEX requests_by_status_class ON requests (status / 100, at)',
    'CREATE INDEX requests_by_role ON requests (role, at) WHERE role IS NOT NULL',
    'CREATE INDEX requests_by_verdict ON requests (verdict, at) WHERE verdict IS NOT NULL',
  ],
};
