import { readFileSync } from 'node:fs';
import { sleep } from './run.mjs';

/**
 * When a process began, in clock ticks since boot, or null if there is no such process (a zombie counts as none).
 * A process number alone is no proof: numbers are used again. Number and beginning together are.
 */
export function processBegin(pid) {
  try {
    const stat = readFileSync(`/proc/${pid}/stat`, 'utf8');
    // The program's name is in parentheses and may itself hold spaces and parentheses.
    const fields = stat.slice(stat.lastIndexOf(')') + 2).split(' ');
    return fields[0] === 'Z' || fields[0] === 'X' ? null : Number(fields[19]);
  } catch {
    return null;
  }
}

/** A record of a process that can be checked later, also after a restart of the machine. */
export function processRecord(pid) {
  return { pid, begin: processBegin(pid) };
}

export function isAlive(record) {
  return Boolean(record) && record.begin !== null && processBegin(record.pid) === record.begin;
}

/** Asks a process group to end, waits, and ends it by force if it does not. */
export async function endGroup(record, patience = 10_000) {
  if (!isAlive(record)) return;
  signalGroup(record.pid, 'SIGTERM');
  const until = Date.now() + patience;
  while (isAlive(record) && Date.now() < until) await sleep(50);
  if (isAlive(record)) signalGroup(record.pid, 'SIGKILL');
  while (isAlive(record)) await sleep(20);
}

function signalGroup(pid, signal) {
  try {
    process.kill(-pid, signal);
  } catch {
    // It ended in the meantime.
  }
}
