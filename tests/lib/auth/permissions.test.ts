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
        "feed.read": [
          "operator",
          "consultant",
          "manager",
          "owner",
        ],
        "feed.write": [
          "operator",
          "manager",
          "owner",
        ],
        "member.read": [
          "manager",
          "owner",
        ],
        "member.write": [
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
        "target.write": [
          "consultant",
          "manager",
          "owner",
        ],
        "token.read": [
          "manager",
          "owner",
        ],
        "token.write": [
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
