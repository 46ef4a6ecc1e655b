import { existsSync, mkdirSync, readFileSync, statSync, truncateSync, writeFileSync } from 'node:fs';
import { freePort, portIsFree } from './ports.mjs';
import { admin, describeCluster, makeCluster, resetPassword } from './postgres-make.mjs';
import { readPidFile, removeMark, serverRuns } from './postgres-mark.mjs';
import { isAlive, processRecord } from './processes.mjs';
import { run, sleep, tail } from './run.mjs';
import { Obstacle, say, step } from './say.mjs';
import { ensureSecrets } from './secrets.mjs';

/** The name of the application's user and of its database. */
const user = 'smirr';

/**
 * Makes the cluster under `folder` if there is none, starts it on the loopback address and returns
 * `{ url, adminUrl, port, stop }`. A server that a killed start left running is taken over.
 * `durable: false` is for tests: faster, and a power cut may lose data.
 */
export async function startCluster(folder, { durable = true, wantedPort } = {}) {
  mkdirSync(folder, { recursive: true });
  const cluster = await describeCluster(folder);
  const { secrets, fresh } = ensureSecrets(folder);
  if (!cluster.made) await step('Making the database cluster', 'a second or two', () => makeCluster(cluster, secrets));
  else if (fresh) {
    await stopServer(cluster);
    await resetPassword(cluster, secrets);
  }

  let port = await portOfRunningServer(cluster, secrets);
  if (port === null) {
    port = await choosePort(folder, wantedPort);
    await startServer(cluster, port, durable);
  } else say(`- The database is still running from an earlier start (port ${port}): using it.`);
  try {
    if (!(await isOurs(cluster, port, secrets)))
      throw new Obstacle(`Another database server answers on port ${port}. Start again to choose another port.`);
    await ensureDatabase(cluster, port, secrets);
  } catch (error) {
    await stopServer(cluster);
    throw error;
  }
  const at = `127.0.0.1:${port}`;
  return {
    port,
    url: `postgres://${user}:${secrets.databasePassword}@${at}/${user}`,
    adminUrl: `postgres://${admin}:${secrets.databaseAdminPassword}@${at}/postgres`,
    data: cluster.data,
    process: processRecord(readPidFile(cluster.data)?.pid),
    stop: () => stopServer(cluster),
  };
}

/** The port of our server if it is running already, else null. A postmaster.pid left by a killed server is removed. */
async function portOfRunningServer(cluster, secrets) {
  const noted = readPidFile(cluster.data);
  if (noted === null) return null;
  if (!serverRuns(cluster.data)) {
    say('- Removing the mark of a database server that was killed.');
    removeMark(cluster.data);
    return null;
  }
  // It may still be starting up or shutting down.
  for (let tries = 0; tries < 40; tries++) {
    if (noted.port && (await isOurs(cluster, noted.port, secrets))) return noted.port;
    if (!serverRuns(cluster.data)) return null;
    await sleep(250);
  }
  throw new Obstacle(
    `A database server (process ${noted.pid}) holds ${cluster.data} but does not answer. Stop it, then start again: kill -INT ${noted.pid}`,
  );
}

async function isOurs(cluster, port, secrets) {
  const result = await psql(cluster, port, secrets, 'show data_directory');
  return result.status === 0 && result.stdout.trim() === cluster.data;
}

function psql(cluster, port, secrets, sql, database = 'postgres') {
  return run(
    `${cluster.programs}/psql`,
    [
      '-X',
      '-At',
      '-q',
      '-v',
      'ON_ERROR_STOP=1',
      '-h',
      '127.0.0.1',
      '-p',
      String(port),
      '-U',
      admin,
      '-d',
      database,
      '-f',
      '-',
    ],
    {
      input: sql,
      cwd: '/',
      env: {
        PATH: process.env.PATH ?? '/usr/bin:/bin',
        PGPASSWORD: secrets.databaseAdminPassword,
        PGCONNECT_TIMEOUT: '5',
        LC_ALL: 'C.UTF-8',
      },
    },
  );
}

/** The port of the last start if it is free, so that tools configured for it go on working; else any free one. */
async function choosePort(folder, wanted) {
  const file = `${folder}/database-port`;
  const last = wanted ?? (existsSync(file) ? Number(readFileSync(file, 'utf8')) : 54329);
  const port = last > 0 && (await portIsFree(last)) ? last : await freePort();
  writeFileSync(file, String(port));
  return port;
}

async function startServer(cluster, port, durable) {
  const log = `${cluster.data}/server.log`;
  if (existsSync(log) && statSync(log).size > 10_000_000) truncateSync(log);
  const options = [
    `-p ${port}`,
    '-c listen_addresses=127.0.0.1',
    // No socket file: its path would be too long under deep folders, and nothing here uses it.
    "-c unix_socket_directories=''",
    '-c timezone=UTC',
    ...(durable ? [] : ['-c fsync=off', '-c synchronous_commit=off', '-c full_page_writes=off']),
  ].join(' ');
  // The parts of a server killed a moment ago may need some seconds to go.
  const until = Date.now() + 10_000;
  for (;;) {
    const result = await cluster.call('pg_ctl', [
      '-D',
      cluster.data,
      '-w',
      '-t',
      '60',
      '-s',
      '-l',
      log,
      '-o',
      options,
      'start',
    ]);
    if (result.status === 0) return;
    const words = existsSync(log) ? tail(readFileSync(log, 'utf8'), 15) : result.stderr;
    const passing = /postmaster\.pid" already exists|pre-existing shared memory block/.test(words);
    if (!passing || Date.now() > until)
      throw new Obstacle(`The database did not start. Its last words (${log}):\n\n${words}`);
    removeMark(cluster.data);
    await sleep(250);
  }
}

async function ensureDatabase(cluster, port, secrets) {
  const has = await psql(
    cluster,
    port,
    secrets,
    `select (select count(*) from pg_roles where rolname = '${user}'), (select count(*) from pg_database where datname = '${user}')`,
  );
  const [role, database] = has.stdout.trim().split('|');
  const sql = [
    // Each time, so that a lost and regenerated secrets file heals.
    `${role === '0' ? 'create' : 'alter'} role ${user} with login password '${secrets.databasePassword}';`,
    database === '0' ? `create database ${user} owner ${user};` : '',
  ].join('\n');
  const done = await psql(cluster, port, secrets, sql);
  if (has.status !== 0 || done.status !== 0)
    throw new Obstacle(`The database could not be prepared:\n\n${tail(has.stderr + done.stderr)}`);
}

async function stopServer(cluster) {
  if (!serverRuns(cluster.data)) return;
  const record = processRecord(readPidFile(cluster.data).pid);
  await cluster.call('pg_ctl', ['-D', cluster.data, '-m', 'fast', '-w', '-t', '30', '-s', 'stop']);
  // pg_ctl sees the file go; the process itself ends a moment later.
  for (let tries = 0; isAlive(record) && tries < 200; tries++) await sleep(25);
}
