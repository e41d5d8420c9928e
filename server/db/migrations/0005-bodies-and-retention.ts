import type { Migration } from '../migrate.ts';

/**
 * Of every computing call the SHA-256 of its body; the body itself in a table of its own, so that rows of the history stay
 * short. `request` is the id of a row of `requests`; whoever deletes that deletes this. One row of settings for the whole
 * workspace: nothing is kept, and nothing is pruned, until an administrator says so.
 */
export const bodiesAndRetention: Migration = {
  name: '0005-bodies-and-retention',
  statements: [
    'ALTER TABLE requests ADD COLUMN body_sha256 TEXT CHECK (length(body_sha256) = 64)',
    'ALTER TABLE requests ADD COLUMN body_bytes INTEGER CHECK (body_bytes >= 0)',
    `CREATE TABLE request_bodies (
      request INTEGER PRIMARY KEY,
      body TEXT NOT NULL CHECK (length(CAST(body AS BLOB)) <= 65536)
    ) STRICT`,
    `CREATE TABLE history_settings (
      id INTEGER PRIMARY KEY CHECK (id = 1),
      keep_bodies INTEGER NOT NULL CHECK (keep_bodies IN (0, 1)),
      retention_days INTEGER CHECK (retention_days BETWEEN 1 AND 3650),
      updated_at INTEGER,
      updated_by TEXT REFERENCES people (id)
    ) STRICT`,
    'INSERT INTO history_settings (id, keep_bodies, retention_days) VALUES (1, 0, NULL)',
  ],
};
