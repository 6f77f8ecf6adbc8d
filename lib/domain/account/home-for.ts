import type { StaffRole } from '../access/roles';

/** Where a person lands after signing in: staff at their work, everyone else at their own bookings. */
export function homeFor(roles: readonly { role: StaffRole }[]): '/organise' | '/door' | '/my' {
  if (roles.length === 0) return '/my';
  return roles.every(({ role }) => role === 'door') ? '/door' : '/organise';
}
