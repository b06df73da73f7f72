import { Sequelize } from 'sequelize';
import { initModels } from '../models/index.ts';

/** Opens the database for serving and binds the models to it. */
export function connectDatabase(url: string): Sequelize {
  const database = new Sequelize(url, {
    dialect: 'postgres',
    logging: false,
    define: { underscored: true, timestamps: false },
    dialectOptions: { options: '-c jit=off' },
    pool: { max: 12 },
  });
  initModels(database);
  return database;
}
