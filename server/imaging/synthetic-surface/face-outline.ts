import type { SurfaceNoise } from './noise.ts';
import type { FractureSurfaceSpec } from './surface-spec.ts';

/** How far the tensile edge of a round part falls back at a distance along it, µm. */
export function edgeFallUm(curveRadiusUm: number | undefined, alongUm: number): number {
  if (curveRadiusUm === undefined) return 0;
  const inside = Math.max(0, curveRadiusUm * curveRadiusUm - alongUm * alongUm);
  return curveRadiusUm - Math.sqrt(inside);
}

/** Height above the tensile edge, px (negative below it, on the outer surface), for a place in µm from the origin. */
export function createTensileDistance(noise: SurfaceNoise, spec: FractureSurfaceSpec) {
  const { pixelSizeUm, originDepthUm, tensileCurveRadiusUm } = spec;
  return (alongUm: number, upUm: number): number => {
    const alongPx = alongUm / pixelSizeUm;
    const waver = 1.1 * noise.plane(alongPx / 46, 3.5, 1) + 0.6 * noise.plane(alongPx / 9, 5.5, 2);
    return (upUm + originDepthUm - edgeFallUm(tensileCurveRadiusUm, alongUm)) / pixelSizeUm + waver;
  };
}

/** Distance into the face from its nearest other edge, px; large where no section is drawn. */
export function createSectionDistance(noise: SurfaceNoise, spec: FractureSurfaceSpec) {
  const { section, pixelSizeUm, originDepthUm } = spec;
  if (!section) return () => 1e6;
  return (alongUm: number, upUm: number): number => {
    const upPx = upUm / pixelSizeUm;
    const left = alongUm + section.leftUm;
    const right = section.rightUm - alongUm;
    const height = upUm + originDepthUm;
    const far = section.heightUm - height;
    const straight = Math.min(left, right, far);
    const corner = (Math.min(left, right) + Math.min(height, far) - section.cornerUm) * 0.7071;
    return Math.min(straight, corner) / pixelSizeUm + 0.7 * noise.plane(upPx / 40, alongUm / pixelSizeUm / 40, 7);
  };
}
