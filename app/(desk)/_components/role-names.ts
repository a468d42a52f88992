import { type Role, ROLE_NAMES, ROLES } from '@/lib/domain/roles';

/** "Reporter, Editor": always in the same order. */
export function roleNames(roles: readonly Role[]): string {
  return ROLES.filter((role) => roles.includes(role))
    .map((role) => ROLE_NAMES[role])
    .join(', ');
}
