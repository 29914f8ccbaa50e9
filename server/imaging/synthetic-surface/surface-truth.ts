import { edgeFallUm } from './face-outline.ts';
import { flawOutline } from './flaw.ts';
import type { SurfaceNoise } from './noise.ts';
import { MIST_RATIO } from './relief.ts';
import type { FractureSurfaceSpec, PointPx, SurfaceTruth } from './surface-spec.ts';

const inImage = (spec: FractureSurfaceSpec, { xPx, yPx }: PointPx) =>
  xPx >= 0 && yPx >= 0 && xPx <= spec.widthPx && yPx <= spec.heightPx;

/** Row of the tensile edge at a column, px; its waver (within 2 px) is left out. */
function edgeRowPx(spec: FractureSurfaceSpec, xPx: number): number {
  const alongUm = (xPx - spec.origin.xPx) * spec.pixelSizeUm;
  return spec.origin.yPx + (spec.originDepthUm - edgeFallUm(spec.tensileCurveRadiusUm, alongUm)) / spec.pixelSizeUm;
}

/** Whether a point of the image lies on the broken face: above the tensile edge and inside the section. */
export function isOnFace(spec: FractureSurfaceSpec, point: PointPx): boolean {
  if (!inImage(spec, point) || point.yPx > edgeRowPx(spec, point.xPx) + 0.5) return false;
  const { section } = spec;
  if (!section) return true;
  const alongUm = (point.xPx - spec.origin.xPx) * spec.pixelSizeUm * (spec.face === 'mate' ? -1 : 1);
  const heightUm = (spec.origin.yPx - point.yPx) * spec.pixelSizeUm + spec.originDepthUm;
  return (
    alongUm > -section.leftUm && alongUm < section.rightUm && heightUm < section.heightUm - (spec.curlUm ?? 0) * 1.4
  );
}

function outlineOf(noise: SurfaceNoise, spec: FractureSurfaceSpec): PointPx[] {
  const { flaw, pixelSizeUm, origin } = spec;
  if (!flaw) return [];
  const side = spec.face === 'mate' ? -1 : 1;
  const points: PointPx[] = [];
  for (let degrees = 180; degrees > -180; degrees -= 15) {
    const angle = (degrees * Math.PI) / 180;
    const reach = flawOutline(noise, flaw.kind, side === 1 ? angle : Math.PI - angle);
    const xPx = origin.xPx + (reach * flaw.halfAxisAlongUm * Math.cos(angle)) / pixelSizeUm;
    const yPx = origin.yPx - (reach * flaw.halfAxisDepthUm * Math.sin(angle)) / pixelSizeUm;
    if (isOnFace(spec, { xPx, yPx })) points.push({ xPx, yPx });
  }
  return points;
}

function hackleOf(spec: FractureSurfaceSpec): SurfaceTruth['hackle'] {
  if (!spec.flaw || spec.body === 'porous') return [];
  const inner =
    ((spec.mirrorRadiusUm ?? 2.5 * spec.flaw.halfAxisDepthUm) * (spec.mistRatio ?? MIST_RATIO)) / spec.pixelSizeUm;
  const runs = [150, 120, 90, 60, 30, 165, 15].map((directionDegrees) => {
    const angle = (directionDegrees * Math.PI) / 180;
    const at = (radiusPx: number) => ({
      xPx: spec.origin.xPx + radiusPx * Math.cos(angle),
      yPx: spec.origin.yPx - radiusPx * Math.sin(angle),
    });
    const reach = [1.6, 1.4, 1.25, 1.15].find((ratio) => isOnFace(spec, at(inner * ratio))) ?? 0;
    return { from: at(inner * 1.04), to: at(inner * reach), directionDegrees, reach };
  });
  return runs.filter((run) => run.reach > 0).map(({ from, to, directionDegrees }) => ({ from, to, directionDegrees }));
}

/** What the drawn surface is known to hold, in image px and µm. */
export function truthOf(
  noise: SurfaceNoise,
  spec: FractureSurfaceSpec,
  scaleBar: SurfaceTruth['scaleBar'],
): SurfaceTruth {
  const { pixelSizeUm, mirrorRadiusUm, flaw } = spec;
  const mist = spec.mistRatio ?? MIST_RATIO;
  const edge = Array.from({ length: 9 }, (_, step) => (step * spec.widthPx) / 8);
  return {
    pixelSizeUm,
    origin: { ...spec.origin, depthUm: spec.originDepthUm },
    flaw: flaw && {
      ...flaw,
      halfAxisDepthPx: flaw.halfAxisDepthUm / pixelSizeUm,
      halfAxisAlongPx: flaw.halfAxisAlongUm / pixelSizeUm,
      outline: outlineOf(noise, spec),
    },
    mirror:
      mirrorRadiusUm === null
        ? null
        : {
            radiusPx: mirrorRadiusUm / pixelSizeUm,
            radiusUm: mirrorRadiusUm,
            mistOuterRadiusPx: (mirrorRadiusUm * mist) / pixelSizeUm,
            mistOuterRadiusUm: mirrorRadiusUm * mist,
          },
    hackle: hackleOf(spec),
    tensileEdge: edge.map((xPx) => ({ xPx, yPx: edgeRowPx(spec, xPx) })).filter((point) => inImage(spec, point)),
    scaleBar,
  };
}
