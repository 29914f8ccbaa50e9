import { createTensileDistance } from './face-outline.ts';
import { createMicrostructure } from './microstructure.ts';
import type { SurfaceNoise } from './noise.ts';
import { smoothStep } from './noise.ts';
import type { Relief } from './relief.ts';
import type { FractureSurfaceSpec } from './surface-spec.ts';

const TONE = 122;

/** Grey of the outer surface seen at a grazing angle, fading into the mount; belowPx: under the tensile edge. */
function outerGrey(noise: SurfaceNoise, spec: FractureSurfaceSpec, alongUm: number, belowPx: number): number {
  const alongPx = alongUm / spec.pixelSizeUm;
  const mount = 13 + 3 * noise.plane(alongPx / 60, belowPx / 60, 110);
  const within = !spec.section || (alongUm > -spec.section.leftUm && alongUm < spec.section.rightUm);
  if (belowPx < 0 || belowPx > 240 || !within) return mount;
  const scratches =
    13 + 9 * noise.plane(alongPx / 2.3, belowPx / 70, 111) + 6 * noise.plane(alongPx / 9, belowPx / 160, 112);
  return mount + 54 * Math.exp(-belowPx / 3.5) + scratches * Math.exp(-belowPx / 44);
}

/**
 * Light over the relief, as unclipped grey round a middle tone: slope toward the light, weaker light from both other
 * sides, steep places brighter as secondary electrons make them, hollows darker, the rim bright, the outer surface dark.
 */
export function shadeRelief(noise: SurfaceNoise, spec: FractureSurfaceSpec, relief: Relief): Float32Array {
  const { widthPx, heightPx: rows, pixelSizeUm, origin } = spec;
  const { heightPx: height, insidePx: inside } = relief;
  const grey = new Float32Array(widthPx * rows);
  const side = spec.face === 'mate' ? -1 : 1;
  const light = ((spec.lightDegrees ?? 118) * Math.PI) / 180;
  const lightX = Math.cos(light);
  const lightY = -Math.sin(light);
  const tensile = createTensileDistance(noise, spec);
  const microstructure = createMicrostructure(noise, spec);
  const at = (k: number, own: number) => ((inside[k] ?? -9) > -4 ? (height[k] ?? own) : own);

  for (let j = 0; j < rows; j++) {
    const up = j > 0 ? -widthPx : 0;
    const down = j < rows - 1 ? widthPx : 0;
    for (let i = 0; i < widthPx; i++) {
      const k = j * widthPx + i;
      const depth = inside[k] ?? 0;
      const cover = smoothStep(-0.7, 0.7, depth);
      let outer = 0;
      if (cover < 1) {
        const alongUm = (i + 0.5 - origin.xPx) * pixelSizeUm * side;
        outer = outerGrey(noise, spec, alongUm, -tensile(alongUm, (origin.yPx - j - 0.5) * pixelSizeUm));
      }
      if (cover === 0) {
        grey[k] = outer;
        continue;
      }
      const own = height[k] ?? 0;
      const west = at(i > 0 ? k - 1 : k, own);
      const east = at(i < widthPx - 1 ? k + 1 : k, own);
      const north = at(k + up, own);
      const south = at(k + down, own);
      const slopeX = (east - west) / 2;
      const slopeY = (south - north) / 2;
      const steep2 = slopeX * slopeX + slopeY * slopeY;
      const toward = -(slopeX * lightX + slopeY * lightY);
      const across = slopeX * lightY - slopeY * lightX;
      const hollow = west + east + north + south - 4 * own;
      let value = TONE - 11 + (96 * toward + 44 * Math.abs(across)) / Math.sqrt(1 + 1.1 * steep2);
      value += (38 * steep2) / (0.35 + steep2) - (16 * hollow) / (1 + 0.8 * Math.abs(hollow));
      if (microstructure)
        value = microstructure(
          value,
          (i + 0.5 - origin.xPx) * pixelSizeUm * side,
          (origin.yPx - j - 0.5) * pixelSizeUm,
        );
      if (depth < 24) value += 44 * Math.exp(-Math.max(0, depth) / 2.6) + 10 * Math.exp(-Math.max(0, depth) / 9);
      grey[k] = value * cover + outer * (1 - cover);
    }
  }
  return grey;
}

/** Contrast, fall of light toward the corners and detector noise; never full white, which the scale bar keeps. */
export function developGrey(noise: SurfaceNoise, spec: FractureSurfaceSpec, shaded: Float32Array): Uint8Array {
  const { widthPx, heightPx: rows } = spec;
  const grey = new Uint8Array(widthPx * rows);
  const middle = 112;
  for (let j = 0; j < rows; j++) {
    const down = j / rows - 0.5;
    for (let i = 0; i < widthPx; i++) {
      const k = j * widthPx + i;
      const across = i / widthPx - 0.5;
      const contrast = middle + ((shaded[k] ?? 0) - middle) * 1.1;
      const lit = contrast * (1 - 0.34 * (across * across + down * down));
      const detector = (2.2 + 0.018 * lit) * (noise.speck(i, j) + noise.speck(i + 31337, j - 271));
      grey[k] = Math.min(243, Math.max(4, lit + detector));
    }
  }
  return grey;
}
