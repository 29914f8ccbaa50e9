import { OutsideDomain } from '../outside-domain.ts';
import { requireFinite, requirePositive, requireThat } from '../require.ts';
import { bisect } from '../special-functions/bisect.ts';
import { rootMetresFromMm } from '../units/root-metres.ts';
import { surfaceCrackFront } from './shape-factors/surface-crack-front.ts';

export type SurfaceFlawInBending = {
  /** Fracture toughness, MPa√m, > 0. */
  readonly toughnessMPaRootM: number;
  /** Outer-fibre stress at that place along the bar, MPa, > 0. */
  readonly stressMPa: number;
  /** Depth over half-length of the flaw, dimensionless, > 0, at most 2. */
  readonly depthOverHalfLength: number;
  /** Section along the depth, mm, > 0. */
  readonly thicknessMm: number;
  /** Half of the section along the surface, mm, > 0; left out for a wide section. */
  readonly halfWidthMm?: number | undefined;
};

export type SurfaceFlawSize = { readonly depthMm: number; readonly shapeFactor: number };

// Steps along the depth in which the first crossing is looked for: K rises over each of them where it rises at all.
const scanSteps = 200;

/**
 * Depth of the smallest surface flaw of a given shape that became unstable in bending, mm, with its largest shape factor.
 * Method `flaw.size.surface.bending`.
 *
 * Holds as `Y.surface.newmanRaju`; found to the last digit. Where K falls again with depth, the first depth counts.
 * Source: root of Ymax(a) sigma √a = K_Ic at constant a/c.
 * @throws OutsideDomain, the first that applies: non-finite-input, non-positive-dimension, non-positive-stress,
 * non-positive-toughness, outside-validity-range (a/c ≤ 0 or > 2; or no such flaw within the range of the shape factor,
 * named at the stress)
 * @example surfaceFlawSizeInBending({ toughnessMPaRootM: 3.5, stressMPa: 350, depthOverHalfLength: 1, thicknessMm: 3, halfWidthMm: 2 }).depthMm // 0.06101…
 */
export function surfaceFlawSizeInBending(flaw: SurfaceFlawInBending): SurfaceFlawSize {
  requireSurfaceFlaw(flaw);
  const { toughnessMPaRootM, stressMPa } = flaw;
  const excess = (depthMm: number) =>
    shapeFactorAt(flaw, depthMm) * stressMPa * rootMetresFromMm(depthMm) - toughnessMPaRootM;
  const deepestMm = deepestInRangeMm(flaw);
  for (let step = 1; step <= scanSteps; step += 1) {
    const to = (deepestMm * step) / scanSteps;
    if (excess(to) < 0) continue;
    const depthMm = bisect({ from: (deepestMm * (step - 1)) / scanSteps, to, of: excess });
    return { depthMm, shapeFactor: shapeFactorAt(flaw, depthMm) };
  }
  // the stress is too low for any flaw that the shape factor describes
  throw new OutsideDomain('outside-validity-range', 'stressMPa');
}

function requireSurfaceFlaw(flaw: SurfaceFlawInBending): void {
  const { toughnessMPaRootM, stressMPa, depthOverHalfLength, thicknessMm, halfWidthMm } = flaw;
  const width: Record<string, number> = halfWidthMm === undefined ? {} : { halfWidthMm };
  requireFinite({ toughnessMPaRootM, stressMPa, depthOverHalfLength, thicknessMm, ...width });
  requirePositive({ thicknessMm, ...width }, 'non-positive-dimension');
  requirePositive({ stressMPa }, 'non-positive-stress');
  requirePositive({ toughnessMPaRootM }, 'non-positive-toughness');
  const described = depthOverHalfLength > 0 && depthOverHalfLength <= 2;
  requireThat(described, 'outside-validity-range', 'depthOverHalfLength');
}

function shapeFactorAt(flaw: SurfaceFlawInBending, flawDepthMm: number): number {
  const { depthOverHalfLength, thicknessMm, halfWidthMm } = flaw;
  // a depth divided by its own ratio may come out a digit too short for a ratio of 2
  const flawHalfLengthMm = Math.max(flawDepthMm / depthOverHalfLength, flawDepthMm / 2);
  const crack = { flawDepthMm, flawHalfLengthMm, thicknessMm, halfWidthMm, mode: 'bending' } as const;
  return surfaceCrackFront(crack).largestFactor;
}

/** Just inside the three bounds of the shape factor: through the section, too long for the width, too shallow and deep. */
function deepestInRangeMm(flaw: SurfaceFlawInBending): number {
  const { depthOverHalfLength: shape, thicknessMm, halfWidthMm } = flaw;
  const byShape = shape < 0.2 ? Math.min(1, 1.25 * (shape + 0.6)) : 1;
  const byWidthMm = halfWidthMm === undefined ? Number.POSITIVE_INFINITY : 0.5 * halfWidthMm * shape;
  return Math.min(byShape * thicknessMm, byWidthMm) * (1 - 1e-9);
}
