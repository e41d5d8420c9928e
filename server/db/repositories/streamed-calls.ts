import { QueryTypes, type Transaction } from 'sequelize';
import type { Database } from '../database.ts';

/** What one more part of a streamed answer adds to its call. */
export interface StreamAdvance {
  readonly requestId: string;
  /** Whose meter: id of the key or person. */
  readonly subject: string;
  /** When the call began, in milliseconds: its row and its meter belong to that day. */
  readonly at: number;
  readonly attitudes: number;
}

export interface StreamEnd {
  readonly requestId: string;
  /** Null where the answer is whole. */
  readonly code: string | null;
  readonly durationUs: number;
  readonly warnings: number;
  readonly warningCodes: readonly string[];
  readonly refusal: { readonly row: number | null; readonly detail: string } | null;
}

export interface StreamedCallsRepository {
  /** Adds to the call's row and to the meter together; resolves once that is committed. */
  advance(advance: StreamAdvance): Promise<void>;
  end(end: StreamEnd): Promise<void>;
}

/** The history of calls whose answer leaves in parts: their row is there before the first part, and grows with them. */
export function streamedCallsRepository({ sequelize, writes }: Database): StreamedCallsRepository {
  const update = (sql: string, bind: unknown[], transaction: Transaction) => sequelize.query(sql, { bind, transaction, type: QueryTypes.UPDATE });
  return {
    advance: ({ requestId, subject, at, attitudes }) => writes.run(async (transaction) => {
      await update('UPDATE requests SET attitudes = attitudes + $1 WHERE request_id = $2', [attitudes, requestId], transaction);
      await update('UPDATE usage_by_day SET attitudes = attitudes + $1 WHERE subject = $2 AND day = $3', [attitudes, subject, new Date(at).toISOString().slice(0, 10)], transaction);
    }),
    end: ({ requestId, code, durationUs, warnings, warningCodes, refusal }) => writes.run(async (transaction) => {
      await update('UPDATE requests SET code = $1, duration_us = $2, warnings = $3, warning_codes = $4 WHERE request_id = $5', [code, durationUs, warnings, warningCodes.join(','), requestId], transaction);
      for (const warning of warningCodes) {
        await update('INSERT OR IGNORE INTO request_warnings (code, at, request) SELECT $1, at, id FROM requests WHERE request_id = $2', [warning, requestId], transaction);
      }
      if (refusal) await update('INSERT INTO stream_refusals (request, row, detail) SELECT id, $1, $2 FROM requests WHERE request_id = $3', [refusal.row, refusal.detail, requestId], transaction);
    }),
  };
}
