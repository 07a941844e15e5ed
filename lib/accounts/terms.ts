/** Who someone is to the maker. Everyone who signs in has a shelf of their own; staff and admins have more besides. */
export const ROLES = ['owner', 'staff', 'admin'] as const
export type Role = (typeof ROLES)[number]
