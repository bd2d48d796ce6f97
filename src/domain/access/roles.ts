/** What a member of a workshop may be. A manager can do all that the others can. */
export const roles = ['manager', 'designer', 'fitter', 'owner'] as const;
export type Role = (typeof roles)[number];
