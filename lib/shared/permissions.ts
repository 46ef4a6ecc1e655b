/**
 * Who may do what. Every page and every route handler belongs to exactly one use case here, and a use case says which
 * roles have it; a test compares the table with the files under app/. A use case on the server asks `may` itself,
 * whatever its caller has asked before.
 */

/** guest: has a link to one published study. signedOut: anybody. reader, analyst, lead: members of a team. */
export const roles = ['guest', 'signedOut', 'reader', 'analyst', 'lead'] as const;
export type Role = (typeof roles)[number];

export type Permission = {
  /** Ends the sentence "may …". */
  what: string;
  roles: readonly Role[];
  /** `PAGE /path` for a page, `GET /path` (or another method) for a route handler. */
  routes: readonly string[];
};

export const permissions = {
  'home.read': { what: 'read what Smirr does', roles, routes: ['PAGE /'] },
  'bench.use': { what: 'compute on the bench, in their own browser', roles, routes: ['PAGE /explore'] },
  'licences.read': { what: 'read the licences of what is shipped', roles, routes: ['PAGE /licences'] },
  'health.read': { what: 'ask whether the server can work', roles, routes: ['GET /api/health'] },
} as const satisfies Record<string, Permission>;

export type UseCase = keyof typeof permissions;

/** Whether someone in this role may do this. */
export function may(role: Role, useCase: UseCase): boolean {
  const allowed: readonly Role[] = permissions[useCase].roles;
  return allowed.includes(role);
}
