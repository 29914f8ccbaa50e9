import { requireEdges, sharpSecondMomentMm4, type EdgedSection, type SectionStiffness } from './chamfered-section.ts';

/**
 * Second moment of a bar with chamfers of 45° on the two tensile edges only, mm⁴, with the distance of the tensile face from
 * the axis, mm, and the factor by which they raise the stress. Method `bend.chamfer2`.
 *
 * `chamferLegMm`: from the sharp corner along either side, mm, ≥ 0, at most half the smaller side. Exact; rounding only.
 * Source: A = bd − c², δ = c²(d/2 − c/3)/A, I = bd³/12 − 2[c⁴/36 + ½c²(d/2 − c/3)²] − Aδ²; tensile face at d/2 + δ.
 * @throws OutsideDomain, the first that applies: non-finite-input, non-positive-dimension, chamfer-too-large
 * @example halfChamferedSection({ widthMm: 4, depthMm: 3, chamferLegMm: 0.12 }).stressFactor // 1.00460…
 */
export function halfChamferedSection(
  section: EdgedSection & { readonly chamferLegMm: number },
): SectionStiffness & { readonly tensileFibreMm: number } {
  const { widthMm, depthMm, chamferLegMm } = section;
  requireEdges({ widthMm, depthMm, chamferLegMm });
  const areaMm2 = widthMm * depthMm - chamferLegMm ** 2;
  const chamferFromMiddleMm = depthMm / 2 - chamferLegMm / 3;
  const shiftMm = (chamferLegMm ** 2 * chamferFromMiddleMm) / areaMm2;
  const sharpMm4 = sharpSecondMomentMm4(section);
  const chamfersMm4 = 2 * (chamferLegMm ** 4 / 36 + (chamferLegMm ** 2 * chamferFromMiddleMm ** 2) / 2);
  const secondMomentMm4 = sharpMm4 - chamfersMm4 - areaMm2 * shiftMm ** 2;
  const tensileFibreMm = depthMm / 2 + shiftMm;
  const stressFactor = (sharpMm4 / secondMomentMm4) * (tensileFibreMm / (depthMm / 2));
  return { secondMomentMm4, tensileFibreMm, stressFactor };
}
