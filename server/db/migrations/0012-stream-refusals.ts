import type { Migration } from '../migrate.ts';

/** Where and why an answer that had begun was ended by a refusal. `request` is the id of a row of `requests` and goes with it. */
export const streamRefusals: Migration = {
  name: '0012-stream-refusals',
  statements: [
    `CREATE TABLE stream_refusals (
      request INTEGER PRIMARY KEY REFERENCES requests (id) ON DELETE CASCADE,
      row INTEGER CHECK (row >= 1),
      detail TEXT NOT NULL
    ) STRICT`,
  ],
};
