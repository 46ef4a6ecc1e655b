import {
  chmodSync,
  chownSync,
  existsSync,
  mkdirSync,
  readdirSync,
  readFileSync,
  realpathSync,
  renameSync,
  rmSync,
  statSync,
  writeFileSync,
} from 'node:fs';
import { removeMark } from './postgres-mark.mjs';
import { ensurePostgres } from './postgres-programs.mjs';
import { postgresPrefix } from './postgres-user.mjs';
import { run, tail } from './run.mjs';
import { Obstacle } from './say.mjs';

/** The administrator's name in clusters of our own. */
export const admin = 'postgres';

/** Where the cluster under `folder` lies, whether it has been made, and how to run its programs. */
export async function describeCluster(folder) {
  const data = `${realpathSync(folder)}/postgres`;
  const made = existsSync(`${data}/PG_VERSION`);
  if (!made && existsSync(data) && readdirSync(data).length > 0) {
    throw new Obstacle(
      `${data} holds files but no PG_VERSION, so it is no database folder. Move it away, then start again.`,
    );
  }
  const programs = await ensurePostgres(made ? readFileSync(`${data}/PG_VERSION`, 'utf8').trim() : undefined);
  const owner = await clusterOwner();
  if (made && statSync(data).uid !== owner.uid) {
    throw new Obstacle(
      `${data} belongs to another user. Start as the one who made it, or give it away as root: chown -R ${owner.uid}:${owner.gid} ${data}`,
    );
  }
  const prefix = await postgresPrefix(realpathSync(folder));
  const call = (program, args, options = {}) => {
    const [command, ...rest] = [...prefix, `${programs}/${program}`, ...args];
    // From /, since the user postgres may not be able to enter the present folder; without the caller's PG* settings.
    return run(command, rest, {
      ...options,
      cwd: '/',
      env: { PATH: process.env.PATH ?? '/usr/bin:/bin', LC_ALL: 'C.UTF-8' },
    });
  };
  return { folder, data, made, owner, programs, call };
}

/** Who owns data folders: the user postgres where root starts things, else whoever does. */
async function clusterOwner() {
  if (process.getuid() !== 0) return { uid: process.getuid(), gid: process.getgid() };
  const ids = await Promise.all(['-u', '-g'].map((flag) => run('id', [flag, 'postgres'])));
  if (ids.some((result) => result.status !== 0))
    throw new Obstacle(
      'There is no user "postgres" on this system. Debian\'s package makes one: apt-get install postgresql',
    );
  return { uid: Number(ids[0].stdout), gid: Number(ids[1].stdout) };
}

/** Makes the cluster beside its place and moves it there when it is complete: an interrupted attempt leaves no half. */
export async function makeCluster({ folder, data, owner, call }, secrets) {
  const draft = `${data}.new`;
  // initdb takes the password from a real file that its user can read.
  const file = `${folder}/initial-password`;
  rmSync(draft, { recursive: true, force: true });
  mkdirSync(draft, { mode: 0o700 });
  chownSync(draft, owner.uid, owner.gid);
  try {
    writeFileSync(file, secrets.databaseAdminPassword, { mode: 0o600 });
    chownSync(file, owner.uid, owner.gid);
    const result = await call('initdb', [
      `--pgdata=${draft}`,
      `--username=${admin}`,
      '--auth=scram-sha-256',
      `--pwfile=${file}`,
      '--encoding=UTF8',
      '--locale=C.UTF-8',
    ]);
    if (result.status !== 0)
      throw new Obstacle(
        `PostgreSQL could not make its data folder ${data}:\n\n${tail(result.stderr || result.stdout)}`,
      );
    rmSync(data, { recursive: true, force: true });
    renameSync(draft, data);
    chmodSync(data, 0o700);
  } finally {
    rmSync(file, { force: true });
    rmSync(draft, { recursive: true, force: true });
  }
}

/** Gives the administrator a new password without the old one: for a stopped cluster whose secrets file was lost. */
export async function resetPassword({ data, call }, secrets) {
  removeMark(data);
  const sql = `ALTER ROLE ${admin} PASSWORD '${secrets.databaseAdminPassword}';\n`;
  const result = await call('postgres', ['--single', '-D', data, 'postgres'], { input: sql });
  if (result.status !== 0) throw new Obstacle(`The database did not take a new password:\n\n${tail(result.stderr)}`);
}
