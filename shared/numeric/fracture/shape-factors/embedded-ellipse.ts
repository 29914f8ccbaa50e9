import { requireFinite, requirePositive, requireThat } from '../../require.ts';
import { ellipticE } from '../../special-functions/elliptic-e.ts';

export type EmbeddedEllipse = {
  /** Minor half-axis, mm, > 0. */
  readonly minorHalfAxisMm: number;
  /** Major half-axis, mm, at least the minor one. */
  readonly majorHalfAxisMm: number;
};

/**
 * Shape factors of an elliptical crack far inside a body in even tension, √π inside: at the end of the minor axis, where it
 * is largest, and at the end of the major axis. Method `Y.embedded.ellipse`. For the circle both are 2/√π.
 *
 * Exact for a crack small against its distance to every face. Rounding only.
 * Source: Irwin 1962: Y = √π / E(k) · [sin² φ + (a/c)² cos² φ]^¼, k² = 1 − (a/c)².
 * @throws OutsideDomain, the first that applies: non-finite-input, non-positive-flaw-size, outside-validity-range (a > c)
 * @example embeddedEllipse({ minorHalfAxisMm: 0.03, majorHalfAxisMm: 0.06 }).minorEndFactor // 1.4635…
 */
export function embeddedEllipse(ellipse: EmbeddedEllipse): {
  readonly minorEndFactor: number;
  readonly majorEndFactor: number;
} {
  const { minorHalfAxisMm, majorHalfAxisMm } = ellipse;
  requireFinite({ minorHalfAxisMm, majorHalfAxisMm });
  requirePositive({ minorHalfAxisMm, majorHalfAxisMm }, 'non-positive-flaw-size');
  requireThat(minorHalfAxisMm <= majorHalfAxisMm, 'outside-validity-range', 'minorHalfAxisMm');
  const ratio = minorHalfAxisMm / majorHalfAxisMm;
  const minorEndFactor = Math.sqrt(Math.PI) / ellipticE(ratio);
  return { minorEndFactor, majorEndFactor: minorEndFactor * Math.sqrt(ratio) };
}
