import { requireFinite, requireThat } from '../../require.ts';

export type EdgeCrack = {
  /** Depth of the crack over the depth of the section, dimensionless, 0 to 0.6. */
  readonly depthOverSection: number;
};

/** The ratio of an edge crack within the range of both polynomials. */
export function requireEdgeCrack({ depthOverSection }: EdgeCrack): number {
  requireFinite({ depthOverSection });
  requireThat(depthOverSection < 1, 'flaw-deeper-than-section', 'depthOverSection');
  requireThat(depthOverSection >= 0 && depthOverSection <= 0.6, 'outside-validity-range', 'depthOverSection');
  return depthOverSection;
}
