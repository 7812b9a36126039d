import { Op } from 'sequelize';

/** Wildcards of LIKE in what a person typed stand for themselves. */
export const contains = (words: string) => ({
  [Op.like]: `%${words.replace(/[\\%_]/g, (character) => `\\${character}`)}%`,
});
