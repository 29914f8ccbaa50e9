import { requireFinite, requireNotNegative, requirePositive, requireThat } from '../require.ts';

export type EdgedSection = {
  /** Section across the load, mm, > 0. */
  readonly widthMm: number;
  /** Section along the load, mm, > 0. */
  readonly depthMm: number;
};

/** A section whose edges are not sharp, against the sharp one. */
export type SectionStiffness = {
  /** About the axis through the centroid, mm⁴. */
  readonly secondMomentMm4: number;
  /** True stress on the tensile face over the stress of the sharp section, dimensionless, ≥ 1. */
  readonly stressFactor: number;
};

/**
 * Second moment of a bar with four equal chamfers of 45°, mm⁴, and the factor by which they raise the stress.
 * Method `bend.chamfer4`.
 *
 * `chamferLegMm`: from the sharp corner along either side, mm, ≥ 0, at most half the smaller side. Exact; rounding only.
 * Source: form of the ASTM C1161 annex (from memory), equal to integrating the width:
 * I = bd³/12 − (c²/9)[c² + ½(3d − 2c)²].
 * @throws OutsideDomain, the first that applies: non-finite-input, non-positive-dimension, chamfer-too-large
 * @example chamferedSection({ widthMm: 4, depthMm: 3, chamferLegMm: 0.12 }).stressFactor // 1.00687…
 */
export function chamferedSection(section: EdgedSection & { readonly chamferLegMm: number }): SectionStiffness {
  const { widthMm, depthMm, chamferLegMm } = section;
  requireEdges({ widthMm, depthMm, chamferLegMm });
  const sharpMm4 = sharpSecondMomentMm4(section);
  const missingMm4 = (chamferLegMm ** 2 / 9) * (chamferLegMm ** 2 + (3 * depthMm - 2 * chamferLegMm) ** 2 / 2);
  const secondMomentMm4 = sharpMm4 - missingMm4;
  return { secondMomentMm4, stressFactor: sharpMm4 / secondMomentMm4 };
}

/** bd³/12, mm⁴. */
export function sharpSecondMomentMm4({ widthMm, depthMm }: EdgedSection): number {
  return (widthMm * depthMm ** 3) / 12;
}

/** Refuses a section that is none, and edges (chamfer legs or radii, the one further name) that leave no flat side. */
export function requireEdges(section: EdgedSection & Readonly<Record<string, number>>): void {
  const { widthMm, depthMm, ...edges } = section;
  requireFinite({ widthMm, depthMm, ...edges });
  requirePositive({ widthMm, depthMm }, 'non-positive-dimension');
  requireNotNegative(edges, 'non-positive-dimension');
  for (const [field, sizeMm] of Object.entries(edges)) {
    requireThat(sizeMm <= Math.min(widthMm, depthMm) / 2, 'chamfer-too-large', field);
  }
}
