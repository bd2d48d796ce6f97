import { DipwrightError } from '../errors';
import type { Role } from './roles';

/**
 * Who may do what: the one map. Services ask `requirePermission` first, so that no route can
 * forget it; tests/server/services/role-matrix.test.ts holds the full role × use case matrix.
 */
export const permissions = {
  'workshop.read': ['manager', 'designer', 'fitter', 'owner'],
  'member.list': ['manager', 'fitter'],
  'installation.list': ['manager', 'designer', 'fitter', 'owner'],
  'installation.create': ['manager', 'designer', 'fitter'],
  'tank.list': ['manager', 'designer', 'fitter', 'owner'],
  'tank.read': ['manager', 'designer', 'fitter', 'owner'],
  'tank.create': ['manager', 'designer'],
  'tank.change': ['manager', 'designer'],
  'design.read': ['manager', 'designer', 'fitter'],
  'design.save': ['manager', 'designer'],
  'mesh.upload': ['manager', 'designer'],
  'mesh.read': ['manager', 'designer', 'fitter'],
  'revision.issue': ['manager', 'designer'],
  'revision.read': ['manager', 'designer', 'fitter', 'owner'],
  'chart.print': ['manager', 'designer', 'fitter', 'owner'],
  'tank.hand-over': ['manager', 'fitter'],
  'reading.list': ['manager', 'designer', 'fitter', 'owner'],
  'reading.record': ['manager', 'fitter', 'owner'],
} as const satisfies Record<string, readonly Role[]>;

export type Permission = keyof typeof permissions;

/** Whether the role holds the permission. */
export function may(role: Role, permission: Permission): boolean {
  return (permissions[permission] as readonly Role[]).includes(role);
}

/** Throws `forbidden` unless the role holds the permission. */
export function requirePermission(role: Role, permission: Permission): void {
  if (!may(role, permission)) {
    throw new DipwrightError(
      'forbidden',
      `A member with the role ${role} may not do this. Ask your manager.`,
      { facts: { permission } },
    );
  }
}
