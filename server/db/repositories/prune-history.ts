import type { Sequelize, Transaction } from 'sequelize';

/** The oldest calls before a time, so many at most; everything that hangs on them goes with them. Runs and the meter stay. */
const DOOMED = 'SELECT id, at, warning_codes FROM requests INDEXED BY requests_by_time WHERE at < $1 ORDER BY at, id LIMIT $2';

/** Deletes the oldest calls before a time and returns how many. */
export async function pruneRequests(sequelize: Sequelize, before: number, limit: number, transaction: Transaction): Promise<number> {
  const bind = [before, limit];
  await sequelize.query(`DELETE FROM request_bodies WHERE request IN (SELECT id FROM (${DOOMED}))`, { bind, transaction });
  await sequelize.query(`
    DELETE FROM request_warnings WHERE (code, at, request) IN (
      SELECT codes.value, d.at, d.id FROM (${DOOMED}) d, json_each('["' || replace(d.warning_codes, ',', '","') || '"]') AS codes)`, { bind, transaction });
  await sequelize.query(`DELETE FROM requests WHERE id IN (SELECT id FROM (${DOOMED}))`, { bind, transaction });
  const [rows] = await sequelize.query('SELECT changes() AS deleted', { transaction });
  return (rows as { deleted: number }[])[0]!.deleted;
}
