import { useRef } from 'react';
import type { FractographView } from '#shared/contracts/fractographs.ts';
import type { MarkView, PointPx } from '#shared/contracts/marks.ts';
import { useWidth } from '#src/ui/use-width.ts';
import { DrawnMark } from './drawn-mark.tsx';
import { DrawnScaleBar } from './drawn-scale-bar.tsx';
import { regionOf, type SeenRegion } from './seen-region.ts';

type FigureWithMarksProps = {
  caseNumber: string;
  fractograph: FractographView;
  /** Those to be drawn; taken-off ones are left out by the caller. */
  marks: readonly MarkView[];
};

const usualWidthPx = 560;
const heightOverWidth = 452 / 584;
const sharpness = 2;
const widestCropPx = 1600;
// The bar stands on a strip of its own, so that it never lies across one burned into the image.
const footPx = 28;

/** A fractograph with its marks drawn in: near enough to see them all, strokes and labels of one size whatever the image. */
export function FigureWithMarks({ caseNumber, fractograph, marks }: FigureWithMarksProps) {
  const frame = useRef<HTMLDivElement>(null);
  const width = useWidth(frame, usualWidthPx);
  const { widthPx, heightPx, id, scale, figureNumber } = fractograph;
  if (widthPx === null || heightPx === null) {
    return (
      <div
        ref={frame}
        className="grid place-items-center bg-plate p-8 text-on-plate-2"
        style={{ minHeight: width * heightOverWidth }}
      >
        Fig. {figureNumber} is not read yet.
      </div>
    );
  }
  const region = regionOf({ widthPx, heightPx }, marks, heightOverWidth);
  const screenPerPx = width / region.acrossPx;
  const height = Math.round(region.downPx * screenPerPx);
  const toScreen = ({ x, y }: PointPx): PointPx => ({
    x: width / 2 + (x - region.centre.x) * screenPerPx,
    y: height / 2 + (y - region.centre.y) * screenPerPx,
  });
  return (
    <div ref={frame} className="on-image relative overflow-hidden bg-plate" style={{ height: height + footPx }}>
      <img
        src={cropAddress(caseNumber, id, region)}
        alt={altOf(fractograph, marks)}
        className="absolute inset-x-0 top-0 w-full"
        style={{ height }}
      />
      <svg
        width={width}
        height={height + footPx}
        viewBox={`0 0 ${width} ${height + footPx}`}
        className="absolute inset-0"
        aria-hidden
      >
        {marks.map((mark) => (
          <DrawnMark key={mark.id} mark={mark} toScreen={toScreen} isCrowded={marks.length > 8} />
        ))}
        <DrawnScaleBar pxPerScreen={region.acrossPx / width} scale={scale} x={14} y={height + footPx / 2} />
      </svg>
    </div>
  );
}

function cropAddress(caseNumber: string, id: string, region: SeenRegion): string {
  const width = Math.min(widestCropPx, usualWidthPx * sharpness);
  const asked = {
    x: Math.round(region.centre.x),
    y: Math.round(region.centre.y),
    across: Math.round(region.acrossPx),
    width,
    height: Math.round((width * region.downPx) / region.acrossPx),
  };
  const query = new URLSearchParams(Object.entries(asked).map(([name, value]) => [name, String(value)]));
  return `/api/cases/${caseNumber}/fractographs/${id}/crop?${query.toString()}`;
}

function altOf({ figureNumber, caption }: FractographView, marks: readonly MarkView[]): string {
  const drawn = marks.map((mark) => `m${mark.number} ${mark.kind}`).join(', ');
  return `Fig. ${figureNumber}${caption === '' ? '' : `: ${caption}`}${drawn === '' ? '' : `. Drawn in: ${drawn}`}`;
}
