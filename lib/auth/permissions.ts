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
  | 'audit.read';

export const PERMISSIONS = {
  'plant.read': ['operator', 'consultant', 'manager', 'owner'],
  'sample.read': ['operator', 'consultant', 'manager', 'owner'],
  'sample.write': ['operator', 'manager', 'owner'],
  'plan.read': ['operator', 'consultant', 'manager', 'owner'],
  'plan.write': ['operator', 'consultant', 'manager', 'owner'],
  'trend.read': ['operator', 'consultant', 'manager', 'owner'],
  'audit.read': ['manager', 'owner'],
} as const satisfies Record<Permission, readonly Role[]>;

export const roleMay = (role: Role, permission: Permission): boolean =>
  (PERMISSIONS[permission] as readonly Role[]).includes(role);
