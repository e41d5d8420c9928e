import type { Migration } from '../migrate.ts';

/**
 * People, their sessions, API keys, and the request history.
 * Times are whole milliseconds since 1970-01-01 UTC. Lengths and enumerations are CHECKs: SQLite ignores declared ones.
 */
export const firstTables: Migration = {
  name: '0001-first-tables',
  statements: [
    `CREATE TABLE people (
      id TEXT PRIMARY KEY,
      email TEXT NOT NULL UNIQUE COLLATE NOCASE CHECK (length(email) BETWEEN 3 AND 254),
      name TEXT NOT NULL CHECK (length(name) BETWEEN 1 AND 80),
      role TEXT NOT NULL CHECK (role IN ('administrator', 'integrator', 'engineer', 'reviewer')),
      password_hash TEXT NOT NULL,
      created_at INTEGER NOT NULL,
      deactivated_at INTEGER
    ) STRICT`,
    `CREATE TABLE sessions (
      id TEXT PRIMARY KEY,
      person_id TEXT NOT NULL REFERENCES people (id) ON DELETE CASCADE,
      created_at INTEGER NOT NULL,
      expires_at INTEGER NOT NULL,
      last_seen_at INTEGER NOT NULL,
      revoked_at INTEGER,
      device TEXT NOT NULL
    ) STRICT`,
    'CREATE INDEX sessions_by_person ON sessions (person_id)',
    `CREATE TABLE api_keys (
      id TEXT PRIMARY KEY,
      name TEXT NOT NULL CHECK (length(name) BETWEEN 1 AND 80),
      prefix TEXT NOT NULL UNIQUE,
      secret_hash TEXT NOT NULL UNIQUE CHECK (length(secret_hash) = 64),
      role TEXT NOT NULL CHECK (role IN ('administrator', 'integrator', 'engineer', 'reviewer')),
      owner_id TEXT NOT NULL REFERENCES people (id),
      created_by TEXT NOT NULL REFERENCES people (id),
      created_at INTEGER NOT NULL,
      expires_at INTEGER,
      last_used_at INTEGER,
      revoked_at INTEGER
    ) STRICT`,
    'CREATE INDEX api_keys_by_owner ON api_keys (owner_id)',
    `CREATE TABLE requests (
      id INTEGER PRIMARY KEY AUTOINCREMENT,
      request_id TEXT NOT NULL UNIQUE,
      at INTEGER NOT NULL,
      key_id TEXT REFERENCES api_keys (id),
      person_id TEXT REFERENCES people (id),
      owner_id TEXT REFERENCES people (id),
      method TEXT NOT NULL,
      route TEXT NOT NULL,
      status INTEGER NOT NULL CHECK (status BETWEEN 100 AND 599),
      code TEXT,
      duration_us INTEGER NOT NULL CHECK (duration_us >= 0),
      attitudes INTEGER NOT NULL CHECK (attitudes >= 0),
      warnings INTEGER NOT NULL CHECK (warnings >= 0),
      warning_codes TEXT NOT NULL
    ) STRICT`,
    'CREATE INDEX requests_by_time ON requests (at)',
    'CREATE INDEX requests_by_key ON requests (key_id, id)',
    'CREATE INDEX requests_by_owner ON requests (owner_id, id)',
    'CREATE INDEX requests_by_route ON requests (route, id)',
    'CREATE INDEX requests_by_status ON requests (status, id)',
  ],
};
