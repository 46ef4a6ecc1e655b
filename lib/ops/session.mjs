import { mkdirSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { endGroup, isAlive, processRecord } from './processes.mjs';
import { Obstacle, say } from './say.mjs';

/**
 * One checkout serves once at a time. `.data/running.json` notes who serves; this ends what a killed start left
 * behind (its web server goes on without it) and refuses while another start is alive. Returns how to keep the note.
 */
export async function openSession(folder) {
  const file = `${folder}/running.json`;
  const before = read(file);
  if (isAlive(before?.start)) {
    throw new Obstacle(
      `Smirr is already running from this folder${before.address ? ` at ${before.address}` : ''} (process ${before.start.pid}).\nStop it there with Ctrl-C, or from here: kill ${before.start.pid}`,
    );
  }
  if (isAlive(before?.web)) {
    say('- Ending the web server that an earlier, killed start left behind.');
    await endGroup(before.web);
  }
  mkdirSync(folder, { recursive: true });
  const start = processRecord(process.pid);
  const note = (more = {}) => writeFileSync(file, JSON.stringify({ start, ...more }));
  note();
  return { note, close: () => rmSync(file, { force: true }) };
}

function read(file) {
  try {
    return JSON.parse(readFileSync(file, 'utf8'));
  } catch {
    return null;
  }
}
