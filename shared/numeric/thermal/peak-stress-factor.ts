import { requireFinite, requireThat } from '../require.ts';

/**
 * Largest stress in the face of a plate that is cooled by a fluid, over that of instant cooling, dimensionless, 0 to 1.
 * Method `thermal.psi`. The Biot number is h × half thickness / conductivity.
 *
 * Within 5 % of the conduction series for 0.1 ≤ Bi ≤ 50; as Bi → 0 it tends to Bi/3.25, against the exact Bi/3.
 * Source: ψ = 1 / [1.5 + 3.25/Bi − 0.5 exp(−16/Bi)] (from memory), compared with the series of the infinite plate.
 * @throws OutsideDomain non-finite-input, outside-validity-range (Bi ≤ 0)
 * @example peakStressFactor({ biotNumber: 1 }) // 0.21052…
 */
export function peakStressFactor({ biotNumber }: { readonly biotNumber: number }): number {
  requireFinite({ biotNumber });
  requireThat(biotNumber > 0, 'outside-validity-range', 'biotNumber');
  return 1 / (1.5 + 3.25 / biotNumber - 0.5 * Math.exp(-16 / biotNumber));
}
