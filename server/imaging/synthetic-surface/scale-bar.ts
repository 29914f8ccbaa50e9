import { GLYPH_ROWS, isDotSet, textDots } from './bitmap-font.ts';
import type { FractureSurfaceSpec, SurfaceTruth } from './surface-spec.ts';

const HALO_GREY = 10;

/** '200 µm', or mm from a millimetre on. */
export function scaleBarLabel(lengthUm: number): string {
  return lengthUm >= 1000 ? `${lengthUm / 1000} mm` : `${lengthUm} µm`;
}

/** Paints a filled rectangle, clipped to the image. */
function paint(
  grey: Uint8Array,
  spec: FractureSurfaceSpec,
  box: { x: number; y: number; w: number; h: number },
  value: number,
) {
  const lastRow = Math.min(spec.heightPx, box.y + box.h);
  const lastColumn = Math.min(spec.widthPx, box.x + box.w);
  for (let j = Math.max(0, box.y); j < lastRow; j++)
    grey.fill(value, j * spec.widthPx + Math.max(0, box.x), j * spec.widthPx + lastColumn);
}

/**
 * Burns the scale bar with its length into the lower left corner, white on a dark halo.
 *
 * Whole px are full white (255, which nothing else in the image is but the label); the last px is as white as the part
 * of it the bar covers.
 */
export function burnScaleBar(grey: Uint8Array, spec: FractureSurfaceSpec): SurfaceTruth['scaleBar'] {
  if (spec.scaleBarUm === null) return null;
  const dot = Math.max(2, Math.round(spec.widthPx / 700));
  const halo = dot + 1;
  const thickness = dot * 3;
  const margin = Math.round(spec.widthPx / 50);
  const lengthPx = spec.scaleBarUm / spec.pixelSizeUm;
  const whole = Math.floor(lengthPx + 1e-9);
  const part = Math.max(0, lengthPx - whole);
  const label = scaleBarLabel(spec.scaleBarUm);
  const y = spec.heightPx - margin - thickness;
  paint(
    grey,
    spec,
    { x: margin - halo, y: y - halo, w: Math.ceil(lengthPx) + 2 * halo, h: thickness + 2 * halo },
    HALO_GREY,
  );
  paint(grey, spec, { x: margin, y, w: whole, h: thickness }, 255);
  if (part > 1e-6)
    paint(grey, spec, { x: margin + whole, y, w: 1, h: thickness }, Math.round(HALO_GREY + part * (255 - HALO_GREY)));
  const textY = y - halo - dot * (GLYPH_ROWS + 1);
  for (const spread of [halo - 1, 0])
    for (let row = 0; row < GLYPH_ROWS; row++)
      for (let column = 0; column < textDots(label); column++)
        if (isDotSet(label, column, row)) {
          const corner = { x: margin + column * dot - spread, y: textY + row * dot - spread };
          paint(grey, spec, { ...corner, w: dot + 2 * spread, h: dot + 2 * spread }, spread > 0 ? HALO_GREY : 255);
        }
  return { xPx: margin, yPx: y, lengthPx, thicknessPx: thickness, lengthUm: spec.scaleBarUm, label };
}
