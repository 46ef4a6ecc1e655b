import { linkSync, mkdirSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { dirname } from 'node:path';
import { isAlive, processRecord } from './processes.mjs';
import { sleep } from './run.mjs';

/** Runs `work` while no other process of ours holds the same lock file; a lock left by a killed process is taken over. */
export async function withLock(file, work, onWait) {
  mkdirSync(dirname(file), { recursive: true });
  const own = `${file}.${process.pid}`;
  writeFileSync(own, JSON.stringify(processRecord(process.pid)));
  try {
    for (let told = false; !taken(own, file); ) {
      if (!isAlive(holder(file))) rmSync(file, { force: true });
      else {
        if (!told) onWait?.();
        told = true;
        await sleep(200);
      }
    }
  } finally {
    rmSync(own, { force: true });
  }
  try {
    return await work();
  } finally {
    rmSync(file, { force: true });
  }
}

// A hard link appears with its content or not at all, so nobody ever reads half a lock.
function taken(own, file) {
  try {
    linkSync(own, file);
    return true;
  } catch (error) {
    if (error.code === 'EEXIST') return false;
    throw error;
  }
}

function holder(file) {
  try {
    return JSON.parse(readFileSync(file, 'utf8'));
  } catch {
    return null;
  }
}
