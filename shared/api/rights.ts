/** Who may do what (a right is one row of the table in the README); a person has the rights of all their roles. */
import type { Role } from './session';

export const RIGHTS = {
  'manage-workshop': ['owner'],
  'edit-commissions': ['owner', 'designer'],
  'edit-pattern': ['owner', 'designer'],
  'edit-joint': ['owner', 'maker'],
  'keep-versions': ['owner', 'designer', 'maker'],
  'export-bundle': ['owner', 'maker'],
  'see-commissions': ['owner', 'designer', 'maker'],
} as const satisfies Record<string, readonly Role[]>;

export type Right = keyof typeof RIGHTS;

/** True when any of the roles has the right. */
export function may(roles: readonly Role[], right: Right): boolean {
  const holders: readonly Role[] = RIGHTS[right];
  return roles.some((role) => holders.includes(role));
}
