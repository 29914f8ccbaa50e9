/** A shape factor offered by practice, with √π inside. */
export type PracticeShapeFactor = {
  readonly shape: string;
  /** As it is typed. */
  readonly text: string;
  /** What the full equation gives for a flaw small against the section, dimensionless. */
  readonly fullEquation: number;
  /** The full equation in words. */
  readonly equation: string;
};

/**
 * Practice values for the usual shapes of an origin, K = Y σ √c with √π inside Y. The full-equation values are those of
 * the Newman–Raju fit at the surface (half-round), of its corner form (quarter-round), and of the penny crack, 2/√π.
 */
export const practiceShapeFactors: readonly PracticeShapeFactor[] = [
  { shape: 'half-round at the surface', text: '1.29', fullEquation: 1.2918, equation: 'Newman–Raju, at the surface' },
  { shape: 'round inside', text: '1.128', fullEquation: 1.1284, equation: 'penny crack, 2/√π' },
  { shape: 'quarter-round at an edge', text: '1.28', fullEquation: 1.28, equation: 'Newman–Raju, corner' },
  { shape: 'long shallow scratch', text: '1.99', fullEquation: 1.988, equation: 'edge crack, 1.1215 √π' },
];

/** The practice value that was typed, or nothing. */
export function findPracticeShapeFactor(value: number): PracticeShapeFactor | undefined {
  return practiceShapeFactors.find((each) => Number(each.text) === value);
}
