/** Which edge of the mirror was read: inner = mirror to mist, outer = mist to hackle, branching = first macroscopic branch. */
export const mirrorBoundaries = ['inner', 'outer', 'branching', 'not stated'] as const;
export type MirrorBoundary = (typeof mirrorBoundaries)[number];
