import { bigint, pgTable, text, timestamp } from 'drizzle-orm/pg-core';

/** Which version ran since when: a number computed a year ago was computed by the version of that day. */
export const serverStart = pgTable('server_start', {
  id: bigint({ mode: 'number' }).primaryKey().generatedAlwaysAsIdentity(),
  startedAt: timestamp('started_at', { withTimezone: true }).notNull().defaultNow(),
  version: text().notNull(),
  runtime: text().notNull(),
});
