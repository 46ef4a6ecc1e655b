import { readdirSync, readFileSync } from 'node:fs';
import { describe, expect, test } from 'vitest';
import { may, type Permission, permissions, roles, type UseCase } from '@/lib/shared/permissions';

const app = new URL('../../../../app/', import.meta.url);

/** Every page and route handler on disk, as the table writes them. */
function routesOnDisk(): string[] {
  return readdirSync(app, { recursive: true, encoding: 'utf8' }).flatMap((file) => {
    const match = /^(?:(.*)\/)?(page|route)\.tsx?$/.exec(file);
    if (!match) return [];
    const path = `/${(match[1] ?? '')
      .split('/')
      .filter((part) => !/^\(.*\)$/.test(part))
      .join('/')}`;
    if (match[2] === 'page') return [`PAGE ${path}`];
    const source = readFileSync(new URL(file, app), 'utf8');
    const methods = [
      ...source.matchAll(/export (?:async )?(?:function|const) (GET|HEAD|POST|PUT|PATCH|DELETE|OPTIONS)\b/g),
    ];
    expect(methods, `${file} exports no method this test can read`).not.toHaveLength(0);
    return methods.map((method) => `${method[1]} ${path}`);
  });
}

const rows = Object.entries(permissions) as [UseCase, Permission][];

describe('the permission table', () => {
  test('has exactly one row for every page and route handler on disk, and none for others', () => {
    expect(rows.flatMap(([, row]) => row.routes).sort()).toEqual(routesOnDisk().sort());
  });

  test.each(rows)('%s is given to known roles, each once', (_name, row) => {
    expect(row.roles.every((role) => roles.includes(role))).toBe(true);
    expect(new Set(row.roles).size).toBe(row.roles.length);
  });

  test('answers for every role as its rows say', () => {
    for (const [useCase, row] of rows) {
      for (const role of roles) expect(may(role, useCase), `${role} ${useCase}`).toBe(row.roles.includes(role));
    }
  });
});
