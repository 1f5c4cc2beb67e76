/**
 * Who may do what. Roles are explicit lists, never a ladder: nothing is implied by a "higher" role.
 * A change here changes the snapshot in tests/lib/auth and so shows in review.
 */
export const ROLES = ['operator', 'consultant', 'manager', 'owner'] as const;
export type Role = (typeof ROLES)[number];

export type Permission =
  | 'plant.read'
  | 'sample.read'
  | 'sample.write'
  | 'plan.read'
  | 'plan.write'
  | 'trend.read'
  | 'target.write'
  | 'feed.read'
  | 'feed.write'
  | 'member.read'
  | 'member.write'
  | 'token.read'
  | 'token.write'
  | 'audit.read';

export const PERMISSIONS = {
  'plant.read': ['operator', 'consultant', 'manager', 'owner'],
  'sample.read': ['operator', 'consultant', 'manager', 'owner'],
  'sample.write': ['operator', 'manager', 'owner'],
  'plan.read': ['operator', 'consultant', 'manager', 'owner'],
  'plan.write': ['operator', 'consultant', 'manager', 'owner'],
  'trend.read': ['operator', 'consultant', 'manager', 'owner'],
  'target.write': ['consultant', 'manager', 'owner'],
  'feed.read': ['operator', 'consultant', 'manager', 'owner'],
  'feed.write': ['operator', 'manager', 'owner'],
  'member.read': ['manager', 'owner'],
  'member.write': ['manager', 'owner'],
  'token.read': ['manager', 'owner'],
  'token.write': ['manager', 'owner'],
  'audit.read': ['manager', 'owner'],
} as const satisfies Record<Permission, readonly Role[]>;

export const roleMay = (role: Role, permission: Permission): boolean =>
  (PERMISSIONS[permission] as readonly Role[]).includes(role);

/** What an API token may be given: data, never people, tokens or money. */
export const TOKEN_SCOPES = [
  'plant.read',
  'sample.read',
  'sample.write',
  'plan.read',
  'plan.write',
  'trend.read',
  'target.write',
  'feed.read',
  'feed.write',
  'audit.read',
] as const satisfies readonly Permission[];

export type TokenScope = (typeof TOKEN_SCOPES)[number];

export const isTokenScope = (text: string): text is TokenScope =>
  (TOKEN_SCOPES as readonly string[]).includes(text);
