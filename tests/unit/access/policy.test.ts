import { describe, expect, it } from 'vitest';
import { type Member, may, permit, type Role } from '@/lib/access/policy';
import { NotAllowed, SignInNeeded } from '@/lib/errors';

const withRoles = (...roles: Role[]): Member => ({
  id: 'someone',
  name: 'Someone',
  email: 'someone@millrace.example',
  emailVerified: true,
  roles,
});

describe('who may do what', () => {
  it('lets anyone read materials and the library', () => {
    expect(may(null, 'materials.read')).toBe(true);
    expect(may(null, 'library.read')).toBe(true);
  });

  it('asks a visitor to sign in', () => {
    expect(() => permit(null, 'design.own')).toThrow(SignInNeeded);
  });

  it('refuses a member without the role', () => {
    expect(() => permit(withRoles('member', 'host'), 'preset.review')).toThrow(NotAllowed);
    expect(() => permit(withRoles('member', 'librarian'), 'members.manage')).toThrow(NotAllowed);
  });

  it('lets each role do its own work only', () => {
    expect(permit(withRoles('member', 'librarian'), 'preset.review').name).toBe('Someone');
    expect(may(withRoles('member', 'admin'), 'members.manage')).toBe(true);
    expect(may(withRoles('member', 'admin'), 'preset.review')).toBe(false);
  });
});
