import { requireFinite, requirePositive } from '../require.ts';
import { fourPointBendingStressMPa, type FourPointBar } from './four-point-bending-stress.ts';

export type GaugedBar = FourPointBar & {
  /** Read by the gauge, dimensionless, > 0. */
  readonly gaugeStrain: number;
};

export const mpaPerGpa = 1000;

/**
 * Elastic modulus from a strain gauge on a four-point bar, GPa, with the stress under it, MPa. Method `modulus.gauge4`.
 *
 * Holds for a gauge wholly within the inner span, on the tensile face; its thickness is left out.
 * Source: E = sigma_nominal / ε.
 * @throws OutsideDomain, the first that applies: non-finite-input, as `bend4.rect`, outside-validity-range for the strain
 * @example gaugeModulus({ loadN: 300, outerSpanMm: 40, innerSpanMm: 20, widthMm: 4, depthMm: 3, gaugeStrain: 0.000812 }).modulusGPa // 307.88…
 */
export function gaugeModulus(bar: GaugedBar): { readonly stressMPa: number; readonly modulusGPa: number } {
  requireFinite({ ...bar });
  const stressMPa = fourPointBendingStressMPa(bar);
  requirePositive({ gaugeStrain: bar.gaugeStrain }, 'outside-validity-range');
  return { stressMPa, modulusGPa: stressMPa / bar.gaugeStrain / mpaPerGpa };
}
