import { DataTypes, type Model, type ModelStatic, type Sequelize } from 'sequelize';
import type { Role } from '#shared/api/roles.ts';

export interface PersonRow {
  id: string;
  email: string;
  name: string;
  role: Role;
  passwordHash: string;
  createdAt: number;
  deactivatedAt: number | null;
}

export type PersonModel = ModelStatic<Model<PersonRow>>;

/** Defined on one connection rather than as a class of the module, so that several databases can be open at once. */
export function definePerson(sequelize: Sequelize): PersonModel {
  return sequelize.define<Model<PersonRow>>('person', {
    id: { type: DataTypes.TEXT, primaryKey: true },
    email: { type: DataTypes.TEXT, allowNull: false },
    name: { type: DataTypes.TEXT, allowNull: false },
    role: { type: DataTypes.TEXT, allowNull: false },
    passwordHash: { type: DataTypes.TEXT, allowNull: false },
    createdAt: { type: DataTypes.INTEGER, allowNull: false },
    deactivatedAt: { type: DataTypes.INTEGER },
  }, { tableName: 'people' });
}
