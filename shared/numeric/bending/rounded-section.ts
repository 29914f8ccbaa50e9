import { requireEdges, sharpSecondMomentMm4, type EdgedSection, type SectionStiffness } from './chamfered-section.ts';

/**
 * Second moment of a bar with four edges rounded to a quarter circle, mm⁴, and the factor by which they raise the stress.
 * Method `bend.round4`.
 *
 * `edgeRadiusMm`: mm, ≥ 0, at most half the smaller side. Exact; rounding only.
 * Source: the width integrated over the depth, in closed form: at each corner a square of side r is taken out and a
 * quarter disc put back, whose second moment about the axis at e = d/2 − r from its centre is πr⁴/16 + ⅔er³ + πr²e²/4.
 * @throws OutsideDomain, the first that applies: non-finite-input, non-positive-dimension, chamfer-too-large
 * @example roundedSection({ widthMm: 4, depthMm: 3, edgeRadiusMm: 0.2 }).stressFactor // 1.00815…
 */
export function roundedSection(section: EdgedSection & { readonly edgeRadiusMm: number }): SectionStiffness {
  const { widthMm, depthMm, edgeRadiusMm: r } = section;
  requireEdges({ widthMm, depthMm, edgeRadiusMm: r });
  const sharpMm4 = sharpSecondMomentMm4(section);
  const squareMm4 = r ** 4 / 12 + r ** 2 * (depthMm / 2 - r / 2) ** 2;
  const centreMm = depthMm / 2 - r;
  const quarterDiscMm4 = (Math.PI * r ** 4) / 16 + (2 * centreMm * r ** 3) / 3 + (Math.PI * r ** 2 * centreMm ** 2) / 4;
  const secondMomentMm4 = sharpMm4 - 4 * (squareMm4 - quarterDiscMm4);
  return { secondMomentMm4, stressFactor: sharpMm4 / secondMomentMm4 };
}
