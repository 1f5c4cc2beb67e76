import { readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { DEMO_SIGN_INS } from '@/lib/demo/people';

describe('the README', () => {
  it('prints exactly the demo’s sign-ins', () => {
    const readMe = readFileSync('README.md', 'utf8').replace(/ +\|/g, ' |');
    expect(DEMO_SIGN_INS.length).toBe(4);
    for (const { role, email, password } of DEMO_SIGN_INS) {
      expect(readMe).toContain(`| ${role} | ${email} | ${password} |`);
    }
  });
});
