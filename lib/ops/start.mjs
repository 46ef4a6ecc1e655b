import { mkdirSync } from 'node:fs';
import { ensureBuild } from './build.mjs';
import { ensurePackages } from './install.mjs';
import { migrateDatabase, withoutPassword } from './migrate.mjs';
import { dataFolder } from './paths.mjs';
import { webPort } from './ports.mjs';
import { startCluster } from './postgres.mjs';
import { fail, Obstacle, say, seconds, step } from './say.mjs';
import { openSession } from './session.mjs';
import { stopWish } from './signals.mjs';
import { startWeb } from './web.mjs';

/**
 * `npm start`: from a fresh clone to a running Smirr, and back down again in order. What it starts it notes in
 * `undo`, latest first; whatever happens, these are done before it ends.
 */
async function start(development) {
  const since = performance.now();
  const { came, signal } = stopWish();
  const undo = [];
  try {
    const work = bringUp(development, undo, signal);
    const stopped = await Promise.race([work.then(() => null), came]);
    if (stopped) {
      say(`\nStopping (${stopped}) …`);
      // What is half way up must be known before it can be taken down.
      await work.catch(() => {});
      return;
    }
    const web = await work;
    say(`\nSmirr is ready after ${seconds(since)}: ${web.address}\nStop it with Ctrl-C. The log: ${logFile}`);
    const end = await Promise.race([came.then((name) => ({ name })), web.ended.then((how) => ({ how }))]);
    if (end.how)
      throw new Obstacle(`The web server ended by itself (${end.how}). Its log: ${logFile}. Start again: npm start`);
    say(`\nStopping (${end.name}) …`);
  } finally {
    for (const action of undo.reverse()) await action();
    say('Stopped.');
  }
}

const logFile = `${dataFolder}/web.log`;

async function bringUp(development, undo, signal) {
  mkdirSync(dataFolder, { recursive: true });
  const session = await openSession(dataFolder);
  undo.push(session.close);
  // Known at once, not after minutes of installing.
  const port = await webPort();
  await ensurePackages();
  const databaseUrl = await bringDatabase(undo);
  signal.throwIfAborted();
  if (!development) await ensureBuild({ signal });
  signal.throwIfAborted();
  await step('Bringing the database up to date', '', () => migrateDatabase(databaseUrl));
  signal.throwIfAborted();
  const web = await step('Starting the web server', 'a few seconds', () =>
    startWeb({ port, databaseUrl, development, logFile }),
  );
  undo.push(web.stop);
  session.note({ web: web.process, address: web.address });
  return web;
}

async function bringDatabase(undo) {
  const given = process.env.DATABASE_URL;
  if (given) {
    say(`- Using the database ${withoutPassword(given)} (DATABASE_URL); starting none.`);
    return given;
  }
  const cluster = await step('Starting the database', '', () => startCluster(dataFolder));
  undo.push(cluster.stop);
  return cluster.url;
}

if (Number(process.versions.node.split('.')[0]) < 20) {
  fail(new Obstacle(`Smirr needs Node 20 or newer; this is ${process.version}.`));
} else {
  await start(process.argv.includes('--dev')).catch(fail);
}
