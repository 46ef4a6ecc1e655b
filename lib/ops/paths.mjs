import { resolve } from 'node:path';
import { fileURLToPath } from 'node:url';

/** The checkout's folder, without a slash at its end. */
export const root = fileURLToPath(new URL('../..', import.meta.url)).replace(/\/$/, '');
/** What must survive: the database and the secrets. Never in git. */
export const dataFolder = resolve(process.env.SMIRR_DATA || `${root}/.data`);
/** What can be made again: bundles and their stamps. Never in git. */
export const buildFolder = `${root}/.build`;
