import { createSectionDistance, createTensileDistance } from './face-outline.ts';
import { createGrain } from './grain.ts';
import { createHackle } from './hackle.ts';
import type { SurfaceNoise } from './noise.ts';
import { smoothStep } from './noise.ts';
import type { BodyTexture, FractureSurfaceSpec } from './surface-spec.ts';
import { createWallnerLines } from './wallner.ts';

export const MIST_RATIO = 1.35;

/** Steepness of the grain inside the mirror, what the mist adds, the long swells, and the strength of the hackle. */
const STEEPNESS: Record<BodyTexture, { mirror: number; rough: number; swell: number; hackle: number }> = {
  glass: { mirror: 0.008, rough: 0.3, swell: 0.012, hackle: 1.1 },
  fine: { mirror: 0.09, rough: 0.32, swell: 0.02, hackle: 1.4 },
  coarse: { mirror: 0.26, rough: 0.1, swell: 0.06, hackle: 0.5 },
  porous: { mirror: 0.3, rough: 0, swell: 0.07, hackle: 0 },
};

/** Steepness by length of wave: grain up to 9 px, its broader forms to 80 px, swells from 100 to 500 px. */
function slopesOf(body: BodyTexture) {
  const steep = STEEPNESS[body];
  return (px: number) => {
    if (px < 9) return { calm: steep.mirror, rough: steep.rough };
    if (px < 80) return { calm: steep.mirror * 0.3, rough: steep.rough * (px < 20 ? 0.4 : 0.16) };
    return { calm: px > 100 && px < 500 ? steep.swell : 0, rough: 0 };
  };
}

export type Relief = {
  /** Height of each pixel, px. */ heightPx: Float32Array;
  /** Distance inside the face, px; negative on the outer surface and the mount. */ insidePx: Float32Array;
};

/** Height over the whole face at a place in µm from the origin (along the tensile edge; up into the section). */
function createFaceHeight(noise: SurfaceNoise, spec: FractureSurfaceSpec) {
  const { pixelSizeUm, mirrorRadiusUm } = spec;
  const steep = STEEPNESS[spec.body];
  const referenceUm = mirrorRadiusUm ?? 4 * (spec.flaw?.halfAxisDepthUm ?? 250);
  const radiusPx = referenceUm / pixelSizeUm;
  const mist = spec.mistRatio ?? MIST_RATIO;
  const grain = createGrain(noise, pixelSizeUm, slopesOf(spec.body));
  const hackle = createHackle(noise, radiusPx);
  const wallner = spec.wallner ? createWallnerLines(noise, radiusPx * spec.wallner) : null;

  /** 0 in the mirror, half the roughness at its boundary, 1 in the mist; the boundary frays by 3 %. */
  const mirrorOnset = (turn: number, ratio: number, logRadius: number): number => {
    if (ratio < 0.7) return 0;
    if (ratio > 1.16) return 1;
    const fray = 0.02 * noise.ring(turn * 16, 0.5, 16, 91) + 0.016 * noise.ring(turn * 64, logRadius * 9, 64, 92);
    const frayed = ratio * (1 - fray);
    return 0.2 * smoothStep(0.74, 1, frayed) + 0.8 * smoothStep(0.94, 1.08, frayed);
  };

  return (alongUm: number, upUm: number): number => {
    const radiusUm = Math.sqrt(alongUm * alongUm + upUm * upUm) + 1e-3;
    const turn = Math.atan2(upUm, alongUm) / (2 * Math.PI) + 1;
    const logRadius = Math.log(radiusUm / referenceUm);
    const ratio = radiusUm / referenceUm;
    const onset = mirrorRadiusUm === null ? 1 : mirrorOnset(turn, ratio, logRadius);
    const reach = onset === 1 ? smoothStep(mist * 0.84, mist * 1.7, ratio) : 0;
    let height = grain(alongUm, upUm, onset * (1 - 0.62 * reach));
    if (wallner && ratio < 1.1)
      height += wallner(alongUm / referenceUm, upUm / referenceUm) * (1 - onset) * smoothStep(0.15, 0.4, ratio);
    if (spec.arrestRadiusUm !== undefined) height += arrestStep((radiusUm - spec.arrestRadiusUm) / pixelSizeUm);
    if (onset < 0.02 || steep.hackle === 0) return height;
    const open =
      mirrorRadiusUm === null
        ? 0.85 * smoothStep(0.2, 1.6, ratio)
        : 0.3 * onset + reach * (0.75 + 0.35 * smoothStep(1.8, 4, ratio));
    const patch = 0.66 + 0.5 * noise.ring(turn * 32, logRadius * 3, 32, 93);
    const wander = 0.0035 * noise.ring(turn * 16, logRadius * 3, 16, 94);
    return (
      height + hackle(turn + wander, logRadius, radiusUm / pixelSizeUm) * open * Math.max(0.25, patch) * steep.hackle
    );
  };
}

/** A narrow step where the crack stood for a while. */
function arrestStep(beyondPx: number): number {
  if (beyondPx < -14) return 0;
  return 2.2 * smoothStep(-3, 3, beyondPx) - 3 * Math.exp((-beyondPx * beyondPx) / 7);
}

/** The crack turns over near the far side and leaves a smooth lip; heightUm: above the tensile edge. */
function createCurl(noise: SurfaceNoise, spec: FractureSurfaceSpec) {
  const { section, curlUm, pixelSizeUm } = spec;
  if (!section || !curlUm) return (height: number) => height;
  return (height: number, alongUm: number, aboveUm: number): number => {
    const shape =
      1 + 0.3 * noise.plane(alongUm / curlUm / 2.4, 4.5, 100) + 0.1 * noise.plane((alongUm / curlUm) * 2, 4.5, 101);
    const into = aboveUm - (section.heightUm - curlUm * shape);
    if (into < -0.4 * curlUm) return height;
    const turned = smoothStep(-0.4 * curlUm, 0.15 * curlUm, into);
    const lip = (Math.max(0, into + 0.3 * curlUm) / curlUm) ** 1.5 * (curlUm / pixelSizeUm) * 0.5;
    return height * (1 - 0.86 * turned) - turned * lip;
  };
}

/** Heights and face distances of every pixel. */
export function raiseRelief(noise: SurfaceNoise, spec: FractureSurfaceSpec): Relief {
  const { widthPx, heightPx: rows, pixelSizeUm, origin } = spec;
  const side = spec.face === 'mate' ? -1 : 1;
  const height = new Float32Array(widthPx * rows);
  const inside = new Float32Array(widthPx * rows);
  const tensile = createTensileDistance(noise, spec);
  const section = createSectionDistance(noise, spec);
  const faceHeight = createFaceHeight(noise, spec);
  const curled = createCurl(noise, spec);
  for (let j = 0; j < rows; j++) {
    const upUm = (origin.yPx - j - 0.5) * pixelSizeUm;
    for (let i = 0; i < widthPx; i++) {
      const k = j * widthPx + i;
      const alongUm = (i + 0.5 - origin.xPx) * pixelSizeUm * side;
      const distance = Math.min(tensile(alongUm, upUm), section(alongUm, upUm));
      inside[k] = distance;
      if (distance > -4) height[k] = side * curled(faceHeight(alongUm, upUm), alongUm, upUm + spec.originDepthUm);
    }
  }
  return { heightPx: height, insidePx: inside };
}
