import { chmodSync, mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';

/** A temporary folder that the database's user may pass through, and its removal. */
export function createTestFolder() {
  const path = mkdtempSync(`${tmpdir()}/smirr-case-`);
  chmodSync(path, 0o755);
  return { path, remove: () => rmSync(path, { recursive: true, force: true }) };
}
