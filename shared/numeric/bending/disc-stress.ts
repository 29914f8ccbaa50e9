/** The two stresses in the tensile face of a disc at some distance from its centre. */
export type DiscStress = {
  /** Along the radius, MPa. */
  readonly radialStressMPa: number;
  /** Across the radius, MPa; never less than the radial one. */
  readonly tangentialStressMPa: number;
};
