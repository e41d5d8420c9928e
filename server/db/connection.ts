import { Sequelize } from 'sequelize';
import sqlite3 from 'sqlite3';

/**
 * What every connection sets before it is used. Sequelize opens one shared connection and one more for each
 * transaction, and has no hook that sees them all; a subclass of the driver's Database does.
 *
 * synchronous=FULL: an acknowledged commit survives a power cut, not only a killed process.
 */
const CONNECTION_PRAGMAS = `
  PRAGMA journal_mode = WAL;
  PRAGMA synchronous = FULL;
  PRAGMA foreign_keys = ON;
  PRAGMA busy_timeout = 5000;
`;

class PreparedDatabase extends sqlite3.Database {
  constructor(filename: string, mode: number, callback: (error: Error | null) => void) {
    super(filename, mode, (error) => {
      if (error) return callback(error);
      this.exec(CONNECTION_PRAGMAS, callback);
    });
  }
}

const driver = { ...sqlite3, Database: PreparedDatabase };

/** Opens the SQLite file, creating it if need be. Everything above server/db works on what this returns. */
export function openDatabase(file: string): Sequelize {
  return new Sequelize({
    dialect: 'sqlite',
    dialectModule: driver,
    storage: file,
    logging: false,
    define: { underscored: true, timestamps: false, freezeTableName: true },
  });
}
