/** What a person may be in a shop; the same words stand in `memberships.role`. */
export const roles = ['builder', 'designer', 'technician', 'inspector', 'instructor', 'owner'] as const
export type Role = (typeof roles)[number]
