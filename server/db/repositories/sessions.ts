import type { Database } from '../database.ts';
import type { SessionRow } from '../models/session.ts';

export interface SessionsRepository {
  byId(id: string): Promise<SessionRow | null>;
  insert(session: SessionRow): Promise<void>;
  revoke(id: string, at: number): Promise<void>;
}

export function sessionsRepository({ sessions, writes }: Database): SessionsRepository {
  return {
    byId: async (id) => (await sessions.findByPk(id))?.get() ?? null,
    insert: (session) => writes.run(async (transaction) => {
      await sessions.create(session, { transaction });
    }),
    revoke: (id, at) => writes.run(async (transaction) => {
      await sessions.update({ revokedAt: at }, { where: { id, revokedAt: null }, transaction });
    }),
  };
}
