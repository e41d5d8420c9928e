import type { Migration } from '../migrate.ts';

/** Verdicts of verifications. Conventions and figures are JSON text: they are read whole, never searched. */
export const runs: Migration = {
  name: '0003-runs',
  statements: [
    `CREATE TABLE runs (
      sequence INTEGER PRIMARY KEY AUTOINCREMENT,
      id TEXT NOT NULL UNIQUE,
      at INTEGER NOT NULL,
      request_id TEXT,
      key_id TEXT REFERENCES api_keys (id),
      person_id TEXT REFERENCES people (id),
      owner_id TEXT NOT NULL REFERENCES people (id),
      label TEXT CHECK (length(label) BETWEEN 1 AND 120),
      commit_id TEXT CHECK (length(commit_id) BETWEEN 4 AND 64),
      verdict TEXT NOT NULL CHECK (verdict IN ('pass', 'fail')),
      count INTEGER NOT NULL CHECK (count >= 1),
      failed INTEGER NOT NULL CHECK (failed BETWEEN 0 AND count),
      detail TEXT NOT NULL CHECK (json_valid(detail))
    ) STRICT`,
    'CREATE INDEX runs_by_owner ON runs (owner_id, sequence)',
    'CREATE INDEX runs_by_verdict ON runs (verdict, sequence)',
    'CREATE INDEX runs_by_label ON runs (label, sequence)',
    'CREATE INDEX runs_by_key ON runs (key_id, sequence)',
  ],
};
