/** Roles by project, and what each may do. */
import { z } from 'zod';
import type { Role as DatabaseRole } from '../generated/enums.js';

export const Role = z.enum(['owner', 'engineer', 'checker', 'foundation-designer', 'reader']);
export type Role = z.infer<typeof Role>;

export type Right = 'read' | 'write' | 'manage' | 'audit';

const RIGHTS: Readonly<Record<Role, readonly Right[]>> = {
  owner: ['read', 'write', 'manage', 'audit'],
  engineer: ['read', 'write', 'audit'],
  checker: ['read', 'audit'],
  'foundation-designer': ['read'],
  reader: ['read'],
};

export function mayDo(role: Role, right: Right): boolean {
  return RIGHTS[role].includes(right);
}

export function toDatabaseRole(role: Role): DatabaseRole {
  return role === 'foundation-designer' ? 'foundation_designer' : role;
}

export function fromDatabaseRole(role: DatabaseRole): Role {
  return role === 'foundation_designer' ? 'foundation-designer' : role;
}
