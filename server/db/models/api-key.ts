import { DataTypes, type Model, type ModelStatic, type Sequelize } from 'sequelize';
import type { Role } from '#shared/api/roles.ts';

export interface ApiKeyRow {
  id: string;
  name: string;
  prefix: string;
  secretHash: string;
  role: Role;
  ownerId: string;
  createdBy: string;
  createdAt: number;
  expiresAt: number | null;
  lastUsedAt: number | null;
  revokedAt: number | null;
  /** Tighter limits than the role's; null for the role's own. */
  requestsPerMinute: number | null;
  attitudesPerMonth: number | null;
  attitudesPerCall: number | null;
  parallelRequests: number | null;
}

export type ApiKeyModel = ModelStatic<Model<ApiKeyRow>>;

export function defineApiKey(sequelize: Sequelize): ApiKeyModel {
  return sequelize.define<Model<ApiKeyRow>>('apiKey', {
    id: { type: DataTypes.TEXT, primaryKey: true },
    name: { type: DataTypes.TEXT, allowNull: false },
    prefix: { type: DataTypes.TEXT, allowNull: false },
    secretHash: { type: DataTypes.TEXT, allowNull: false },
    role: { type: DataTypes.TEXT, allowNull: false },
    ownerId: { type: DataTypes.TEXT, allowNull: false },
    createdBy: { type: DataTypes.TEXT, allowNull: false },
    createdAt: { type: DataTypes.INTEGER, allowNull: false },
    expiresAt: { type: DataTypes.INTEGER },
    lastUsedAt: { type: DataTypes.INTEGER },
    revokedAt: { type: DataTypes.INTEGER },
    requestsPerMinute: { type: DataTypes.INTEGER },
    attitudesPerMonth: { type: DataTypes.INTEGER },
    attitudesPerCall: { type: DataTypes.INTEGER },
    parallelRequests: { type: DataTypes.INTEGER },
  }, { tableName: 'api_keys' });
}
