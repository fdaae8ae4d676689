/** What a person does in their organisation. One role a person. */
export const ROLES = ["designer", "estimator", "fabricator", "checker", "admin"] as const;
export type Role = (typeof ROLES)[number];
