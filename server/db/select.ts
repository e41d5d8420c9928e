import { QueryTypes, type Sequelize } from 'sequelize';

type Value = string | number | null | undefined;

/** Runs a reading statement with named values (`$name`). The driver refuses values that the statement does not use, so only those it names are given. */
export function select<Row extends object>(sequelize: Sequelize, sql: string, values: Readonly<Record<string, Value>> = {}): Promise<Row[]> {
  const names = new Set([...sql.matchAll(/\$([a-z]\w*)/gi)].map(([, name]) => name!));
  const bind = Object.fromEntries([...names].map((name) => [name, values[name]]));
  return sequelize.query<Row>(sql, { ...(names.size > 0 ? { bind } : {}), type: QueryTypes.SELECT });
}
