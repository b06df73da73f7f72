import { Sequelize } from 'sequelize';
import { initModels } from '../models/index.ts';

/** Opens the database for serving and binds the models to it. */
export function connectDatabase(url: string): Sequelize {
  const database = new Sequelize(url, {
    dialect: 'postgres',
    logging: false,
    define: { underscored: true, timestamps: false },
    // a register of a hundred thousand buildings is put in order in memory
    dialectOptions: { options: '-c jit=off -c work_mem=16MB' },
    pool: { max: 12 },
  });
  initModels(database);
  return database;
}
