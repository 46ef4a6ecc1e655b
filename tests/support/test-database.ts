import { randomBytes } from 'node:crypto';
import { Client } from 'pg';

/** The address of another database on the same server. */
export function databaseUrl(adminUrl: string, name: string): string {
  const url = new URL(adminUrl);
  url.pathname = `/${name}`;
  return url.href;
}

/** A database of its own: a clone of `template`, or an empty one. */
export async function createTestDatabase(adminUrl: string, template?: string) {
  const name = `test_${randomBytes(6).toString('hex')}`;
  await query(adminUrl, `create database ${name}${template ? ` template ${template}` : ''}`);
  return {
    url: databaseUrl(adminUrl, name),
    drop: async () => {
      await query(adminUrl, `drop database if exists ${name} with (force)`);
    },
  };
}

/** One statement on a connection of its own. */
export async function query<Row extends object>(url: string, text: string, values: unknown[] = []): Promise<Row[]> {
  const client = new Client({ connectionString: url });
  await client.connect();
  try {
    return (await client.query(text, values)).rows as Row[];
  } finally {
    await client.end();
  }
}
