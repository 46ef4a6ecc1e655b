import { chmodSync, mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { Client } from 'pg';
import type { TestProject } from 'vitest/node';
import { migrate } from '@/db/migrate';
import { startCluster } from '@/lib/ops/postgres.mjs';
import { databaseUrl } from './test-database';

declare module 'vitest' {
  interface ProvidedContext {
    adminUrl: string;
    template: string;
  }
}

/**
 * A real database for the integration tests: the one `npm test` has started, or one of their own when Vitest is run
 * by hand. One database is migrated here; tests get clones of it, which takes some hundredths of a second each.
 */
// biome-ignore lint/style/noDefaultExport: Vitest takes the clean-up from a default export alone.
export default async function setUp(project: TestProject): Promise<() => Promise<void>> {
  const given = process.env.SMIRR_TEST_ADMIN_URL;
  const own = given ? null : await startOwn();
  const adminUrl = given ?? own?.adminUrl ?? '';
  const template = `template_${process.pid}`;
  const admin = new Client({ connectionString: adminUrl });
  await admin.connect();
  await admin.query(`create database ${template}`);
  await migrate(databaseUrl(adminUrl, template), 'db/migrations');
  project.provide('adminUrl', adminUrl);
  project.provide('template', template);
  return async () => {
    await admin.query(`drop database ${template} with (force)`);
    await admin.end();
    await own?.stop();
  };
}

async function startOwn() {
  const folder = mkdtempSync(`${tmpdir()}/smirr-integration-`);
  chmodSync(folder, 0o755);
  const cluster = await startCluster(folder, { durable: false });
  return {
    adminUrl: cluster.adminUrl,
    stop: async () => {
      await cluster.stop();
      rmSync(folder, { recursive: true, force: true });
    },
  };
}
