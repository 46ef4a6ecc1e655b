import { spawn } from 'node:child_process';

/**
 * Runs a program to its end and collects what it prints.
 * `input` is written to its standard input, which is closed otherwise; `inherit` shows its output as it comes.
 * Never throws for an exit status: the caller decides what one means. `signal` ends it early.
 */
export function run(command, args, { cwd, env, input, inherit = false, terminal = false, signal } = {}) {
  return new Promise((resolve, reject) => {
    const child = spawn(command, args, {
      cwd,
      env: env ?? process.env,
      signal,
      stdio: [
        input === undefined ? (terminal ? 'inherit' : 'ignore') : 'pipe',
        inherit ? 'inherit' : 'pipe',
        inherit ? 'inherit' : 'pipe',
      ],
    });
    let stdout = '';
    let stderr = '';
    child.stdout?.on('data', (part) => {
      stdout += part;
    });
    child.stderr?.on('data', (part) => {
      stderr += part;
    });
    child.on('error', (error) => {
      if (error.code === 'ENOENT') resolve({ status: 127, stdout, stderr: `${command}: not found` });
      else reject(error);
    });
    child.on('close', (status, killedBy) => resolve({ status: status ?? 128, killedBy, stdout, stderr }));
    if (input !== undefined) child.stdin.end(input);
  });
}

/** The last lines of a longer output, for an error message. */
export function tail(text, lines = 30) {
  return text.trimEnd().split('\n').slice(-lines).join('\n');
}

export function sleep(milliseconds) {
  return new Promise((resolve) => setTimeout(resolve, milliseconds));
}
