import type { EstimateView } from '#shared/contracts/estimates.ts';

/** A bent bar as it is drawn: lengths in mm, stresses in MPa with U at k = 2. */
export type BarFacts = {
  readonly loadN: number;
  readonly outerSpanMm: number;
  /** Null for a bar on three rollers. */
  readonly innerSpanMm: number | null;
  readonly widthMm: number;
  readonly depthMm: number;
  /** Origin from mid-span, signed; 0 where the method takes it between the rollers. */
  readonly xMm: number;
  /** Origin below the tensile face. */
  readonly yMm: number;
  readonly face: { readonly value: number; readonly expanded: number };
  readonly origin: { readonly value: number; readonly expanded: number };
};

/** The bar of an estimate by the load; nothing for a method that is no bending of a bar. */
export function barOf(estimate: EstimateView): BarFacts | null {
  const valueOf = (name: string) => estimate.inputs.find((input) => input.name === name)?.value;
  const [loadN, outerSpanMm, widthMm, depthMm] = ['load', 'outerSpan', 'width', 'depth'].map(valueOf);
  const face = estimate.outputs.find((output) => output.name === 'outerFibreStress');
  if (loadN === undefined || outerSpanMm === undefined || widthMm === undefined || depthMm === undefined) return null;
  if (!face || face.expandedUncertainty === null) return null;
  return {
    loadN,
    outerSpanMm,
    innerSpanMm: valueOf('innerSpan') ?? null,
    widthMm,
    depthMm,
    xMm: valueOf('x') ?? 0,
    yMm: valueOf('y') ?? 0,
    face: { value: face.value, expanded: face.expandedUncertainty },
    origin: { value: estimate.origin.value, expanded: estimate.origin.expandedUncertainty },
  };
}

/** Bending moment at a distance from mid-span, N mm: full between the inner rollers, falling to nothing at the outer. */
export function momentNmm(bar: BarFacts, xMm: number): number {
  const armMm = (bar.outerSpanMm - Math.max(2 * Math.abs(xMm), bar.innerSpanMm ?? 0)) / 2;
  return (bar.loadN / 2) * Math.max(0, armMm);
}
