import type { Sequelize } from 'sequelize';
import { defineFirm } from './Firm';
import { defineRefreshToken } from './RefreshToken';
import { defineUser } from './User';

/** Every table, bound to one connection pool. A new model is one line here, and its ties to others below. */
export function defineModels(sequelize: Sequelize) {
  const models = {
    Firm: defineFirm(sequelize),
    RefreshToken: defineRefreshToken(sequelize),
    User: defineUser(sequelize),
  };
  models.User.belongsTo(models.Firm, { as: 'firm', foreignKey: 'firmId' });
  return models;
}

export type Models = ReturnType<typeof defineModels>;
