import { requireFinite, requirePositive } from '../require.ts';
import { fourPointBendingStressMPa, type FourPointBar } from './four-point-bending-stress.ts';

type Gauged = FourPointBar & {
  /** Read by the gauge, dimensionless, > 0. */
  readonly gaugeStrain: number;
};

const mpaPerGpa = 1000;

/**
 * Elastic modulus from a strain gauge on a four-point bar, GPa, with the stress under it, MPa. Method `modulus.gauge4`.
 *
 * Holds for a gauge wholly within the inner span, on the tensile face; its thickness is left out.
 * Source: E = sigma_nominal / ε.
 * @throws OutsideDomain, the first that applies: non-finite-input, as `bend4.rect`, outside-validity-range for the strain
 * @example gaugeModulus({ loadN: 300, outerSpanMm: 40, innerSpanMm: 20, widthMm: 4, depthMm: 3, gaugeStrain: 0.000812 }).modulusGPa // 307.88…
 */
export function gaugeModulus(bar: Gauged): { readonly stressMPa: number; readonly modulusGPa: number } {
  requireFinite({ ...bar });
  const stressMPa = fourPointBendingStressMPa(bar);
  requirePositive({ gaugeStrain: bar.gaugeStrain }, 'outside-validity-range');
  return { stressMPa, modulusGPa: stressMPa / bar.gaugeStrain / mpaPerGpa };
}

export type GaugeAgainstBeam = {
  /** Modulus times strain, MPa. */
  readonly gaugeStressMPa: number;
  /** From load and section, MPa. */
  readonly beamStressMPa: number;
  /** Of the first to the second, dimensionless; 1 where they agree. */
  readonly ratio: number;
};

/**
 * The stress by a strain gauge against that by the load on a four-point bar. Method `gauge.consistency4`.
 *
 * Holds as `modulus.gauge4`; the modulus must come from elsewhere.
 * Source: E ε / sigma_nominal.
 * @throws OutsideDomain, the first that applies: non-finite-input, as `bend4.rect`, outside-validity-range for modulus, strain
 * and a load of 0, which leaves nothing to compare
 * @example gaugeAgainstBeam({ loadN: 300, outerSpanMm: 40, innerSpanMm: 20, widthMm: 4, depthMm: 3, gaugeStrain: 0.000812, modulusGPa: 310 }).ratio // 1.00688
 */
export function gaugeAgainstBeam(bar: Gauged & { readonly modulusGPa: number }): GaugeAgainstBeam {
  requireFinite({ ...bar });
  const beamStressMPa = fourPointBendingStressMPa(bar);
  const { modulusGPa, gaugeStrain, loadN } = bar;
  requirePositive({ modulusGPa, gaugeStrain, loadN }, 'outside-validity-range');
  const gaugeStressMPa = modulusGPa * mpaPerGpa * gaugeStrain;
  return { gaugeStressMPa, beamStressMPa, ratio: gaugeStressMPa / beamStressMPa };
}
