import { requireFinite, requirePositive, requireThat } from '../require.ts';
import { peakStressFactor } from './peak-stress-factor.ts';
import { plateInstantStressMPa, type QuenchedPlate } from './plate-instant-stress.ts';

const mmPerMetre = 1000;

export type CooledPlate = QuenchedPlate & {
  /** Heat transfer at the face, W/(m²·K), > 0; rarely known better than to a factor of 2. */
  readonly heatTransferWPerM2K: number;
  /** Half of the thickness of the plate, mm, > 0. */
  readonly halfThicknessMm: number;
  /** Heat conductivity of the plate, W/(m·K), > 0. */
  readonly conductivityWPerMK: number;
};

export type CooledPlateStress = {
  readonly biotNumber: number;
  readonly peakFactor: number;
  readonly stressMPa: number;
};

/**
 * Largest stress in the face of a plate cooled on both sides by a fluid, MPa, tension positive. Method `thermal.plateBiot`.
 *
 * Holds as `thermal.psi`; an upper estimate only, since the heat transfer is rarely known. Source: ψ E α ΔT / (1 − ν).
 * @throws OutsideDomain, the first that applies: non-finite-input, non-positive-dimension (half thickness),
 * outside-validity-range (E, h or conductivity ≤ 0), poisson-out-of-range
 * @example plateCooledStress({ modulusGPa: 390, expansionPerK: 8e-6, temperatureDropK: 200, poissonRatio: 0.22, heatTransferWPerM2K: 2000, halfThicknessMm: 1.5, conductivityWPerMK: 30 }).stressMPa // 23.529…
 */
export function plateCooledStress(plate: CooledPlate): CooledPlateStress {
  const { heatTransferWPerM2K, halfThicknessMm, conductivityWPerMK, ...quenched } = plate;
  requireFinite({ ...quenched, heatTransferWPerM2K, halfThicknessMm, conductivityWPerMK });
  requirePositive({ halfThicknessMm }, 'non-positive-dimension');
  requireThat(heatTransferWPerM2K > 0, 'outside-validity-range', 'heatTransferWPerM2K');
  requireThat(conductivityWPerMK > 0, 'outside-validity-range', 'conductivityWPerMK');
  const biotNumber = (heatTransferWPerM2K * halfThicknessMm) / (mmPerMetre * conductivityWPerMK);
  const peakFactor = peakStressFactor({ biotNumber });
  return { biotNumber, peakFactor, stressMPa: peakFactor * plateInstantStressMPa(quenched) };
}
