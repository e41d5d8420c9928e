import { DataTypes, type Model, type ModelStatic, type Sequelize } from 'sequelize';

export interface SessionRow {
  id: string;
  personId: string;
  createdAt: number;
  expiresAt: number;
  lastSeenAt: number;
  revokedAt: number | null;
  device: string;
}

export type SessionModel = ModelStatic<Model<SessionRow>>;

export function defineSession(sequelize: Sequelize): SessionModel {
  return sequelize.define<Model<SessionRow>>('session', {
    id: { type: DataTypes.TEXT, primaryKey: true },
    personId: { type: DataTypes.TEXT, allowNull: false },
    createdAt: { type: DataTypes.INTEGER, allowNull: false },
    expiresAt: { type: DataTypes.INTEGER, allowNull: false },
    lastSeenAt: { type: DataTypes.INTEGER, allowNull: false },
    revokedAt: { type: DataTypes.INTEGER },
    device: { type: DataTypes.TEXT, allowNull: false },
  }, { tableName: 'sessions' });
}
