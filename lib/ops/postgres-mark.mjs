import { readFileSync, readlinkSync, rmSync } from 'node:fs';
import { processBegin } from './processes.mjs';

/** What postmaster.pid says: its process, and its port once it has one. */
export function readPidFile(data) {
  try {
    const lines = readFileSync(`${data}/postmaster.pid`, 'utf8').split('\n');
    return { pid: Number(lines[0]), port: Number(lines[3]) || null };
  } catch {
    return null;
  }
}

/**
 * Whether the process in postmaster.pid is our server. After a power cut the number may belong to any program; a
 * server always has its data folder as working folder, which nothing else has.
 */
export function serverRuns(data) {
  const pid = readPidFile(data)?.pid;
  if (!pid || processBegin(pid) === null) return false;
  try {
    return readlinkSync(`/proc/${pid}/cwd`) === data;
  } catch {
    return false;
  }
}

/** Removes postmaster.pid, once it is proved that no server of ours stands behind it. */
export function removeMark(data) {
  if (!serverRuns(data)) rmSync(`${data}/postmaster.pid`, { force: true });
}
