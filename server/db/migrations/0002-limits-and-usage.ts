import type { Migration } from '../migrate.ts';

/** What each role may use, what a key may use at most beside that, and what was used: by day and by whose calls. */
export const limitsAndUsage: Migration = {
  name: '0002-limits-and-usage',
  statements: [
    `CREATE TABLE role_limits (
      role TEXT PRIMARY KEY CHECK (role IN ('administrator', 'integrator', 'engineer', 'reviewer')),
      requests_per_minute INTEGER NOT NULL CHECK (requests_per_minute >= 1),
      attitudes_per_month INTEGER NOT NULL CHECK (attitudes_per_month >= 0),
      attitudes_per_call INTEGER NOT NULL CHECK (attitudes_per_call >= 1),
      parallel_requests INTEGER NOT NULL CHECK (parallel_requests >= 1),
      updated_at INTEGER,
      updated_by TEXT REFERENCES people (id)
    ) STRICT`,
    `INSERT INTO role_limits (role, requests_per_minute, attitudes_per_month, attitudes_per_call, parallel_requests) VALUES
      ('administrator', 600, 10000000, 10000, 32),
      ('integrator', 1200, 100000000, 10000, 32),
      ('engineer', 600, 10000000, 10000, 16),
      ('reviewer', 300, 0, 1, 8)`,
    'ALTER TABLE api_keys ADD COLUMN requests_per_minute INTEGER CHECK (requests_per_minute >= 1)',
    'ALTER TABLE api_keys ADD COLUMN attitudes_per_month INTEGER CHECK (attitudes_per_month >= 0)',
    'ALTER TABLE api_keys ADD COLUMN attitudes_per_call INTEGER CHECK (attitudes_per_call >= 1)',
    'ALTER TABLE api_keys ADD COLUMN parallel_requests INTEGER CHECK (parallel_requests >= 1)',
    // subject: id of the key, or of the person signed in.
    `CREATE TABLE usage_by_day (
      subject TEXT NOT NULL,
      day TEXT NOT NULL CHECK (day GLOB '[0-9][0-9][0-9][0-9]-[0-9][0-9]-[0-9][0-9]'),
      requests INTEGER NOT NULL,
      attitudes INTEGER NOT NULL,
      PRIMARY KEY (subject, day)
    ) STRICT, WITHOUT ROWID`,
    'CREATE INDEX usage_by_day_only ON usage_by_day (day)',
    `INSERT INTO usage_by_day (subject, day, requests, attitudes)
      SELECT COALESCE(key_id, person_id), strftime('%Y-%m-%d', at / 1000, 'unixepoch'), COUNT(*), SUM(attitudes)
      FROM requests WHERE COALESCE(key_id, person_id) IS NOT NULL GROUP BY 1, 2`,
  ],
};
