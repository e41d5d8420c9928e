import type { Role } from '#shared/api/roles.ts';
import { DataTypes, type Model, type ModelStatic, type Sequelize } from 'sequelize';

/** One API call. Durations in microseconds; `warningCodes` joined by commas. */
export interface RequestRow {
  /** Order of commit; also the paging cursor. */
  id: number;
  requestId: string;
  at: number;
  keyId: string | null;
  personId: string | null;
  /** Whose call it is: the owner of the key, or the person signed in. Null for calls that nobody could be told from. */
  ownerId: string | null;
  /** Of the caller at the time of the call. */
  role: Role | null;
  method: string;
  route: string;
  status: number;
  code: string | null;
  durationUs: number;
  attitudes: number;
  warnings: number;
  warningCodes: string;
  /** Of the run that the call made, if it made one. */
  verdict: 'pass' | 'fail' | null;
  /** Of the body as it arrived, decompressed; null where the body is none of the history's business. */
  bodySha256: string | null;
  bodyBytes: number | null;
}

export type RequestModel = ModelStatic<Model<RequestRow, Omit<RequestRow, 'id'>>>;

export function defineRequest(sequelize: Sequelize): RequestModel {
  return sequelize.define<Model<RequestRow, Omit<RequestRow, 'id'>>>('request', {
    id: { type: DataTypes.INTEGER, primaryKey: true, autoIncrement: true },
    requestId: { type: DataTypes.TEXT, allowNull: false },
    at: { type: DataTypes.INTEGER, allowNull: false },
    keyId: { type: DataTypes.TEXT },
    personId: { type: DataTypes.TEXT },
    ownerId: { type: DataTypes.TEXT },
    role: { type: DataTypes.TEXT },
    method: { type: DataTypes.TEXT, allowNull: false },
    route: { type: DataTypes.TEXT, allowNull: false },
    status: { type: DataTypes.INTEGER, allowNull: false },
    code: { type: DataTypes.TEXT },
    durationUs: { type: DataTypes.INTEGER, allowNull: false },
    attitudes: { type: DataTypes.INTEGER, allowNull: false },
    warnings: { type: DataTypes.INTEGER, allowNull: false },
    warningCodes: { type: DataTypes.TEXT, allowNull: false },
    verdict: { type: DataTypes.TEXT },
    bodySha256: { type: DataTypes.TEXT },
    bodyBytes: { type: DataTypes.INTEGER },
  }, { tableName: 'requests' });
}
