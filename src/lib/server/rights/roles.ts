/** What a person may be in a firm, from the most to the least. */
export const roles = ['owner', 'librarian', 'designer', 'checker', 'reader'] as const;
export type Role = (typeof roles)[number];
