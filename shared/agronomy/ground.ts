/** How fit a field is for its next work: may be worked, fit within 24 hours, too wet, too cold to plant, frozen. */
export type Ground = 'fit' | 'close' | 'wet' | 'cold' | 'frozen'

/** The passes of a field, in the order in which they follow each other. */
export const PASSES = ['dig', 'rocks', 'plant', 'roll', 'spray'] as const
export type Pass = (typeof PASSES)[number]
