import { describe, expect, test } from 'vitest';
import { homeFor, navigationFor, settingsFor } from '@/lib/auth/navigation';
import { may, PERMITTED, type Permission } from '@/lib/auth/permissions';
import { ROLES } from '@/lib/auth/roles';

const labels = (places: { label: string }[]) => places.map(({ label }) => label);

describe('the navigation', () => {
  test.each([
    [['technician'], ['Cases', 'Units', 'Bench', 'Compressor models', 'Settings']],
    [['trainer'], ['Units', 'Bench', 'Compressor models', 'Settings']],
    [['administrator'], ['Units', 'Bench', 'Compressor models', 'Settings']],
    [['administrator', 'manager'], ['Cases', 'Units', 'Bench', 'Compressor models', 'Settings']],
    [[], []],
  ] as const)('of %j is %j', (roles, expected) => {
    expect(labels(navigationFor(roles))).toEqual(expected);
  });

  test('has the administrator\'s settings for administrators alone', () => {
    expect(labels(settingsFor(['administrator']))).toEqual(['You', 'Units of measure', 'Notices', 'Tokens', 'People', 'Sites', 'Organisation', 'Jobs', 'Audit']);
    expect(labels(settingsFor(['technician', 'engineer', 'manager', 'trainer']))).toEqual(['You', 'Units of measure', 'Notices', 'Tokens', 'Limits']);
  });

  test('begins where the work is', () => {
    expect([homeFor(['technician']), homeFor(['trainer']), homeFor([])]).toEqual(['/cases', '/units', '/settings']);
  });
});

test('nothing is for nobody, and no role is for nothing', () => {
  const permissions = Object.keys(PERMITTED) as Permission[];
  for (const permission of permissions) expect(PERMITTED[permission].length).toBeGreaterThan(0);
  for (const role of ROLES) expect(permissions.some((permission) => may([role], permission))).toBe(true);
});
