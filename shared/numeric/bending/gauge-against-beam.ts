import { requireFinite, requirePositive } from '../require.ts';
import { fourPointBendingStressMPa } from './four-point-bending-stress.ts';
import { mpaPerGpa, type GaugedBar } from './gauge-modulus.ts';

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
export function gaugeAgainstBeam(bar: GaugedBar & { readonly modulusGPa: number }): GaugeAgainstBeam {
  requireFinite({ ...bar });
  const beamStressMPa = fourPointBendingStressMPa(bar);
  const { modulusGPa, gaugeStrain, loadN } = bar;
  requirePositive({ modulusGPa, gaugeStrain, loadN }, 'outside-validity-range');
  const gaugeStressMPa = modulusGPa * mpaPerGpa * gaugeStrain;
  return { gaugeStressMPa, beamStressMPa, ratio: gaugeStressMPa / beamStressMPa };
}
