import { randomBytes } from 'node:crypto';
import { chmodSync, mkdirSync, readFileSync, renameSync, writeFileSync } from 'node:fs';
import { Obstacle } from './say.mjs';

/** What is generated at the first start. A name added here later is added to existing files at their next start. */
const names = ['databaseAdminPassword', 'databasePassword'];

/**
 * The secrets kept in `folder`, generated where missing; readable by the owner alone.
 * `fresh` tells whether any had to be made: a cluster that already exists then does not know them yet.
 */
export function ensureSecrets(folder) {
  mkdirSync(folder, { recursive: true });
  const file = `${folder}/secrets.json`;
  const secrets = read(file);
  const missing = names.filter((name) => typeof secrets[name] !== 'string');
  for (const name of missing) secrets[name] = randomBytes(32).toString('hex');
  if (missing.length > 0) {
    // Written beside and renamed: a power cut leaves the old file or the new one, never half of one.
    writeFileSync(`${file}.new`, `${JSON.stringify(secrets, null, 2)}\n`, { mode: 0o600 });
    renameSync(`${file}.new`, file);
  }
  chmodSync(file, 0o600);
  return { secrets, fresh: missing.length > 0 };
}

function read(file) {
  try {
    return JSON.parse(readFileSync(file, 'utf8'));
  } catch (error) {
    if (error.code === 'ENOENT') return {};
    throw new Obstacle(
      `The secrets in ${file} cannot be read (${error.message}). Restore the file, or delete it: new ones are then generated.`,
    );
  }
}
