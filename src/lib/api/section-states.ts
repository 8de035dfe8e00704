/** A section's standing on the Rack; only approved ones are offered to others. */
export const sectionStates = ['draft', 'approved', 'withdrawn'] as const;
export type SectionState = (typeof sectionStates)[number];
