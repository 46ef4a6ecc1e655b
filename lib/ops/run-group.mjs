import { spawn } from 'node:child_process';
import { endGroup, processRecord } from './processes.mjs';

/**
 * Runs a program in a process group of its own and collects its output. When it ends, or when `signal` says stop,
 * whatever it left in its group is ended too: a test that hangs or crashes leaves nothing behind.
 */
export async function runGroup(command, args, { cwd, env, signal }) {
  if (signal?.aborted) return { status: 130, stdout: '', stderr: 'Stopped.' };
  const child = spawn(command, args, { cwd, env, detached: true, stdio: ['ignore', 'pipe', 'pipe'] });
  const record = processRecord(child.pid);
  let stdout = '';
  let stderr = '';
  child.stdout.on('data', (part) => {
    stdout += part;
  });
  child.stderr.on('data', (part) => {
    stderr += part;
  });
  const stop = () => endGroup(record, 5000);
  signal?.addEventListener('abort', stop);
  try {
    const status = await new Promise((resolve, reject) => {
      child.once('error', reject);
      child.once('exit', (code) => resolve(code ?? 128));
    });
    endRest(child.pid);
    await Promise.all(
      [child.stdout, child.stderr].map(
        (stream) => stream.closed || new Promise((resolve) => stream.once('close', resolve)),
      ),
    );
    return { status, stdout, stderr };
  } finally {
    signal?.removeEventListener('abort', stop);
  }
}

/** Ends what is left of a group whose leader is gone. */
function endRest(group) {
  try {
    process.kill(-group, 'SIGKILL');
  } catch {
    // Nothing was left.
  }
}
