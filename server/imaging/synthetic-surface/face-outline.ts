import type { SurfaceNoise } from './noise.ts';
import type { FractureSurfaceSpec } from './surface-spec.ts';

/** How far the tensile edge of a round part falls back at a distance along it, µm. */
export function edgeFallUm(curveRadiusUm: number | undefined, alongUm: number): number {
  if (curveRadiusUm === undefined) return 0;
  const inside = Math.max(0, curveRadiusUm * curveRadiusUm - alongUm * alongUm);
  return curveRadiusUm - Math.sqrt(inside);
}

/** Edges waver by less than this, px: further off they need no second look. */
const WAVER_PX = 6;

/** Height above the tensile edge, px (negative below it, on the outer surface), for a place in µm from the origin. */
export function createTensileDistance(noise: SurfaceNoise, spec: FractureSurfaceSpec) {
  const { pixelSizeUm, originDepthUm, tensileCurveRadiusUm } = spec;
  return (alongUm: number, upUm: number): number => {
    const straight = (upUm + originDepthUm - edgeFallUm(tensileCurveRadiusUm, alongUm)) / pixelSizeUm;
    if (Math.abs(straight) > WAVER_PX) return straight;
    const alongPx = alongUm / pixelSizeUm;
    const waver = 1.1 * noise.plane(alongPx / 46, 3.5, 1) + 0.6 * noise.plane(alongPx / 9, 5.5, 2);
    return straight + waver * (1 - (straight / WAVER_PX) ** 2);
  };
}

/** Distance into the face from its nearest other edge, px; large where no section is drawn. */
export function createSectionDistance(noise: SurfaceNoise, spec: FractureSurfaceSpec) {
  const { section, pixelSizeUm, originDepthUm } = spec;
  if (!section) return () => 1e6;
  return (alongUm: number, upUm: number): number => {
    const left = alongUm + section.leftUm;
    const right = section.rightUm - alongUm;
    const height = upUm + originDepthUm;
    const far = section.heightUm - height;
    const corner = (Math.min(left, right) + Math.min(height, far) - section.cornerUm) * 0.7071;
    const straight = Math.min(left, right, far, corner) / pixelSizeUm;
    if (Math.abs(straight) > WAVER_PX) return straight;
    return straight + 0.7 * noise.plane(upUm / pixelSizeUm / 40, alongUm / pixelSizeUm / 40, 7);
  };
}
