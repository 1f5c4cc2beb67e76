import { describe, expect, it } from 'vitest';
import { PERMISSIONS, roleMay, ROLES } from '@/lib/auth/permissions';

describe('the permission table', () => {
  it('is exactly this; a change must show in review', () => {
    expect(PERMISSIONS).toMatchInlineSnapshot(`
      {
        "audit.read": [
          "manager",
          "owner",
        ],
        "plan.read": [
          "operator",
          "consultant",
          "manager",
          "owner",
        ],
        "plan.write": [
          "operator",
          "consultant",
          "manager",
          "owner",
        ],
        "plant.read": [
          "operator",
          "consultant",
          "manager",
          "owner",
        ],
        "sample.read": [
          "operator",
          "consultant",
          "manager",
          "owner",
        ],
        "sample.write": [
          "operator",
          "manager",
          "owner",
        ],
        "trend.read": [
          "operator",
          "consultant",
          "manager",
          "owner",
        ],
      }
    `);
  });

  it('lets a consultant read samples but not write them', () => {
    expect(ROLES.filter((role) => roleMay(role, 'sample.read'))).toContain('consultant');
    expect(roleMay('consultant', 'sample.write')).toBe(false);
  });
});
