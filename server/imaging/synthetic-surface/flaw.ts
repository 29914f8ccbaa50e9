import { cellAt } from './cells.ts';
import type { SurfaceNoise } from './noise.ts';
import { smoothStep } from './noise.ts';
import type { FractureSurfaceSpec, SyntheticFlaw, SyntheticFlawKind } from './surface-spec.ts';

/** A place in a flaw: reach 1 is its outline; along and up in half-axes; rim: width of a bright rim. */
type Place = {
  reach: number;
  along: number;
  up: number;
  angle: number;
  rim: number;
  noise: SurfaceNoise;
  ground: number;
};

/** How uneven each outline is; the four axis points stay exact. */
const UNEVEN: Record<SyntheticFlawKind, number> = {
  pore: 0.07,
  agglomerate: 0.12,
  'surface-crack': 0.05,
  'grinding-crack': 0.06,
  'impact-scratch': 0.06,
  'edge-chip': 0.05,
  pit: 0.08,
};

/** Outline of a flaw over its ellipse at an angle from its centre: 1 on the axes, uneven between. */
export function flawOutline(noise: SurfaceNoise, kind: SyntheticFlawKind, angle: number): number {
  const turn = angle / (2 * Math.PI) + 1;
  const free = Math.sqrt(Math.abs(Math.sin(2 * angle)));
  return 1 + free * UNEVEN[kind] * (noise.ring(turn * 8, 0.5, 8, 121) + 0.5 * noise.ring(turn * 32, 0.5, 32, 122));
}

function poreGrey({ reach, along, up, angle, rim: width, noise, ground }: Place): number {
  const cell = cellAt(noise, along * 7, up * 7);
  const facing = 16 * cell.own + 34 * (0.45 - cell.nearest) + 10 * noise.plane(along * 17, up * 17, 130);
  const floor =
    18 + smoothStep(0.2, 1, reach) * (22 + facing) + 46 * smoothStep(0.5, 0.96, reach) * smoothStep(-0.1, 0.9, -up);
  const rim = 58 * Math.exp(-(((reach - 1 - 0.6 * width) / width) ** 2)) * (0.65 + 0.35 * Math.sin(angle + 0.6));
  const inner = 1 - smoothStep(0.93, 1.02, reach);
  return ground * (1 - inner) + floor * inner + rim;
}

function agglomerateGrey({ reach, along, up, noise, ground }: Place): number {
  const bent = 0.6 * noise.plane(along * 5, up * 5, 131);
  const grain = cellAt(noise, along * 7 + bent, up * 7 - bent);
  const fine = cellAt(noise, along * 17 + 40 + bent, up * 17 - bent);
  const domes = 70 * (0.42 - grain.nearest) + 44 * (0.42 - fine.nearest);
  const cluster = 132 + 20 * grain.own + domes + 16 * fine.own + 14 * noise.plane(along * 34, up * 34, 134);
  const loose = smoothStep(0.1, 0.5, noise.plane(along * 2.6, up * 2.6, 132));
  const inner = 1 - smoothStep(0.93, 1.01, reach);
  const parting =
    74 *
    Math.exp(-(((reach - 1) / 0.035) ** 2)) *
    (0.45 + 0.55 * smoothStep(-0.3, 0.4, noise.plane(along * 2, up * 2, 133)));
  return ground * (1 - inner) + (cluster - 70 * loose) * inner - parting;
}

function crackGrey({ reach, along, up, rim, noise, ground }: Place): number {
  const plates = cellAt(noise, along * 9 + 0.4 * noise.plane(along * 6, up * 6, 141), up * 7);
  const texture = 8 * plates.own + 13 * noise.plane(along * 22, up * 15, 142) - 9 * Math.exp(-plates.gap * 9);
  const inner = 1 - smoothStep(0.95, 1.02, reach);
  const floor = 84 + texture + 0.35 * (ground - 112) - 22 * smoothStep(0.6, 1, reach);
  return ground * (1 - inner) + floor * inner + 44 * Math.exp(-(((reach - 1 - 0.6 * rim) / (0.6 * rim)) ** 2));
}

/** Several short cracks side by side, joined by steps that run in from the ground surface. */
function grindingGrey(place: Place): number {
  const { reach, along, up, noise } = place;
  const lean = along * 5.5 + 0.5 * noise.plane(along * 2, up * 2.5, 151);
  const step = lean - Math.floor(lean);
  const steps = 60 * Math.exp(-step * 9) - 24 * smoothStep(0.75, 1, step);
  const inner = 1 - smoothStep(0.94, 1.02, reach);
  return crackGrey(place) + inner * steps * (1 - 0.5 * up);
}

/** Conchoidal hollow: smooth, with ribs round the place of contact and a sharp dark rim. */
function chipGrey({ reach, along, up, rim, noise, ground }: Place): number {
  const fromContact = Math.sqrt((along + 0.35) ** 2 + (up + 0.12) ** 2) + 0.03 * noise.plane(along * 3, up * 3, 161);
  const wave = 6.5 * Math.sqrt(fromContact) + 0.35 * noise.plane(along * 1.5, up * 1.5, 164);
  const rib = wave - Math.floor(wave);
  const ribs = (9 + 9 * noise.plane(along * 2 + 7, up * 2, 165)) * Math.sin(2 * Math.PI * rib);
  const rays =
    15 * noise.plane(Math.atan2(up + 0.12, along + 0.35) * 14, fromContact * 2, 162) * smoothStep(0.3, 1, fromContact);
  const crushed = 60 * smoothStep(0.36, 0.1, fromContact) * (0.5 + 0.8 * noise.plane(along * 26, up * 26, 163));
  const inner = 1 - smoothStep(0.96, 1.02, reach);
  const floor = 158 - 52 * reach - 22 * along + ribs + rays + crushed;
  return (
    ground * (1 - inner) +
    floor * inner +
    48 * Math.exp(-(((reach - 1 - 0.6 * rim) / (0.7 * rim)) ** 2)) -
    40 * Math.exp(-(((reach - 0.96) / 0.03) ** 2))
  );
}

/** A scratch seen end on: crushed at the edge, short cracks fanning in. */
function scratchGrey(place: Place): number {
  const { reach, along, up, noise } = place;
  const fan = noise.plane(Math.atan2(up + 0.08, along) * 9, reach * 1.5, 171);
  const inner = 1 - smoothStep(0.95, 1.02, reach);
  const crushed =
    smoothStep(0.42, 0.16, Math.abs(along) * 0.7 + up) * (38 + 60 * noise.plane(along * 24, up * 24, 172));
  return crackGrey(place) + inner * (30 * Math.exp(-fan * fan * 60) - 6 + crushed);
}

function pitGrey({ reach, along, up, noise, ground }: Place): number {
  const inner = 1 - smoothStep(0.88, 1.03, reach);
  const floor = 16 + 50 * smoothStep(0.4, 1, reach) + 14 * noise.plane(along * 5, up * 5, 181);
  return ground * (1 - inner) + floor * inner + 40 * Math.exp(-(((reach - 1.06) / 0.06) ** 2));
}

const GREY_OF: Record<SyntheticFlawKind, (place: Place) => number> = {
  pore: poreGrey,
  agglomerate: agglomerateGrey,
  'surface-crack': crackGrey,
  'grinding-crack': grindingGrey,
  'impact-scratch': scratchGrey,
  'edge-chip': chipGrey,
  pit: pitGrey,
};

/** Draws a flaw centred at alongUm, upUm from the origin into the shaded grey, inside the face only. */
export function drawFlaw(
  noise: SurfaceNoise,
  spec: FractureSurfaceSpec,
  flaw: SyntheticFlaw & { alongUm: number; upUm: number },
  sheet: { shaded: Float32Array; insidePx: Float32Array },
): void {
  const { widthPx, heightPx, pixelSizeUm, origin } = spec;
  const side = spec.face === 'mate' ? -1 : 1;
  const centreX = origin.xPx + (side * flaw.alongUm) / pixelSizeUm;
  const centreY = origin.yPx - flaw.upUm / pixelSizeUm;
  const halfX = flaw.halfAxisAlongUm / pixelSizeUm;
  const halfY = flaw.halfAxisDepthUm / pixelSizeUm;
  const greyOf = GREY_OF[flaw.kind];
  const lastRow = Math.min(heightPx - 1, Math.ceil(centreY + 1.4 * halfY));
  const lastColumn = Math.min(widthPx - 1, Math.ceil(centreX + 1.4 * halfX));
  for (let j = Math.max(0, Math.floor(centreY - 1.4 * halfY)); j <= lastRow; j++)
    for (let i = Math.max(0, Math.floor(centreX - 1.4 * halfX)); i <= lastColumn; i++) {
      const k = j * widthPx + i;
      const cover = smoothStep(-0.7, 0.7, sheet.insidePx[k] ?? -1);
      if (cover === 0) continue;
      const along = (side * (i + 0.5 - centreX)) / halfX;
      const up = (centreY - j - 0.5) / halfY;
      const angle = Math.atan2(up, along);
      const reach = Math.hypot(along, up) / flawOutline(noise, flaw.kind, angle);
      if (reach > 1.3) continue;
      const ground = sheet.shaded[k] ?? 0;
      const rim = Math.min(0.045, 5 / halfY);
      sheet.shaded[k] = ground + cover * (greyOf({ reach, along, up, angle, rim, noise, ground }) - ground);
    }
}
