/** Roles of a member of a shop; a person may hold several. */
export const ROLES = ['technician', 'lead', 'trainer', 'apprentice', 'verifier', 'admin'] as const;
export type Role = (typeof ROLES)[number];
