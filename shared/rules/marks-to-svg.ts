import type { MarkGeometry, MarkView, PointPx } from '../contracts/marks.ts';
import type { ScaleView } from '../contracts/fractographs.ts';
import { markKindTable, type MarkKindRow } from '../vocabulary/mark-kinds.ts';
import { formatNumber } from '../wording/quantity.ts';

// Marks drawn into a figure as SVG text, for what is kept, sealed and printed: no page and no style sheet is needed, so
// the colours of the marks (src/theme/tokens.css) stand here as they are. Strokes have one width whatever the image.

const inks: Readonly<Record<string, string>> = {
  '--m-origin': '#ff7a1a',
  '--m-flaw': '#f0e442',
  '--m-mirror': '#56b4e9',
  '--m-mist': '#00c08b',
  '--m-hackle': '#e69f00',
  '--m-wallner': '#e08cbb',
  '--m-arrest': '#0072b2',
  '--m-curl': '#ffffff',
};
const halo = '#0b0e10';
const umPerMm = 1000;
// The bar is at most this part of the figure's width.
const longestBarShare = 0.22;
// The bar stands on a strip of its own under the picture, so that it never lies over one burned into the image.
const barStripPx = 30;

export type FramePx = { readonly x: number; readonly y: number; readonly width: number; readonly height: number };
export type DrawnMark = Pick<MarkView, 'number' | 'kind' | 'geometry'>;

export type FigureDrawing = {
  readonly marks: readonly DrawnMark[];
  /** Part of the image that is shown, image px. */
  readonly framePx: FramePx;
  readonly widthPx: number;
  readonly heightPx: number;
  /** Absent where no bar is wanted; null where the image has no scale, and then the figure says so. */
  readonly scale?: Pick<ScaleView, 'pixelSizeXUm'> | null;
  /** The picture itself, as an address or as data. */
  readonly picture: string;
  /** What stands for the figure where it cannot be seen. */
  readonly words: string;
};

/** The figure whole: picture, marks with halo and dash, scale bar. */
export function figureSvg(drawing: FigureDrawing): string {
  const { widthPx, heightPx, framePx, picture, words } = drawing;
  const toFigure = ({ x, y }: PointPx): PointPx => ({
    x: ((x - framePx.x) / framePx.width) * widthPx,
    y: ((y - framePx.y) / framePx.height) * heightPx,
  });
  const wholePx = heightPx + (drawing.scale === undefined ? 0 : barStripPx);
  return [
    `<svg xmlns="http://www.w3.org/2000/svg" width="${widthPx}" height="${wholePx}" viewBox="0 0 ${widthPx} ${wholePx}" role="img">`,
    `<title>${escaped(words)}</title>`,
    `<image href="${escaped(picture)}" width="${widthPx}" height="${heightPx}" preserveAspectRatio="none"/>`,
    ...drawing.marks.map((mark) => markSvg(mark, toFigure)),
    drawing.scale === undefined ? '' : barSvg(drawing, drawing.scale),
    '</svg>',
  ].join('');
}

function markSvg(mark: DrawnMark, toFigure: (point: PointPx) => PointPx): string {
  const row: MarkKindRow = markKindTable[mark.kind];
  const ink = inks[row.colour] ?? '#ffffff';
  const line = outline(mark.geometry).map(toFigure);
  const stroke = line.length > 1 ? strokeSvg(pathOf(line), row, ink) : '';
  return `<g fill="none">${stroke}${endsSvg(row, line, ink)}${labelSvg(mark, line, ink)}</g>`;
}

function strokeSvg(path: string, row: MarkKindRow, ink: string): string {
  const isDotted = row.dash[0] !== undefined && row.dash[0] < 1;
  const dash = row.dash.length > 0 ? ` stroke-dasharray="${row.dash.join(' ')}"` : '';
  const cap = isDotted ? 'round' : 'butt';
  const cased = row.casedScreenPx ? `<path d="${path}" stroke="#fff" stroke-width="${row.casedScreenPx}"/>` : '';
  return (
    `<path d="${path}" stroke="${halo}" opacity="0.72" stroke-width="${row.widthScreenPx + 2.6}" stroke-linecap="round"${isDotted ? dash : ''}/>` +
    cased +
    `<path d="${path}" stroke="${ink}" stroke-width="${row.widthScreenPx}" stroke-linecap="${cap}"${dash}/>`
  );
}

function endsSvg(row: MarkKindRow, line: readonly PointPx[], ink: string): string {
  const [first, last] = [line[0], line.at(-1)];
  if (!first || !last) return '';
  const [second, before] = [line[1] ?? first, line.at(-2) ?? last];
  const across = (at: PointPx, from: PointPx) => {
    const length = Math.hypot(at.x - from.x, at.y - from.y) || 1;
    const [x, y] = [(-(at.y - from.y) / length) * 6, ((at.x - from.x) / length) * 6];
    return `M${r(at.x - x)} ${r(at.y - y)}L${r(at.x + x)} ${r(at.y + y)}`;
  };
  const { x, y } = first;
  switch (row.ends) {
    case 'ring':
      return haloed(
        `M${r(x - 7)} ${r(y)}a7 7 0 1 1 14 0a7 7 0 1 1 -14 0M${r(x - 13)} ${r(y)}h9m8 0h9M${r(x)} ${r(y - 13)}v9`,
        ink,
      );
    case 'bars':
      return haloed(across(first, second), ink) + haloed(across(last, before), ink);
    case 'arrow':
    case 'triangle':
      return haloed(arrow(last, before), ink);
    case 'squares':
      return [first, last]
        .map((at) => `<rect x="${r(at.x - 3.4)}" y="${r(at.y - 3.4)}" width="6.8" height="6.8" fill="${ink}"/>`)
        .join('');
    case 'circles':
    case 'disc':
      return [first, last]
        .map(
          (at) => `<circle cx="${r(at.x)}" cy="${r(at.y)}" r="4" stroke="${ink}" stroke-width="1.6" fill="${halo}"/>`,
        )
        .join('');
    case 'none':
      return '';
  }
}

function arrow(at: PointPx, from: PointPx): string {
  const angle = Math.atan2(at.y - from.y, at.x - from.x);
  const wing = (turn: number) => `${r(at.x - 11 * Math.cos(angle + turn))} ${r(at.y - 11 * Math.sin(angle + turn))}`;
  return `M${wing(0.45)}L${r(at.x)} ${r(at.y)}L${wing(-0.45)}`;
}

const haloed = (d: string, ink: string) =>
  `<path d="${d}" stroke="${halo}" opacity="0.72" stroke-width="4.6" stroke-linecap="round"/>` +
  `<path d="${d}" stroke="${ink}" stroke-width="2" stroke-linecap="round"/>`;

function labelSvg(mark: DrawnMark, line: readonly PointPx[], ink: string): string {
  const top = line.reduce((highest, point) => (point.y < highest.y ? point : highest), line[0] ?? { x: 0, y: 0 });
  const away = mark.geometry.shape === 'point' ? { x: 18, y: -8 } : { x: 0, y: -9 };
  const anchor = mark.geometry.shape === 'point' ? 'start' : 'middle';
  return textSvg({ x: top.x + away.x, y: top.y + away.y }, `m${mark.number}`, { ink, anchor });
}

function barSvg({ widthPx, heightPx, framePx }: FigureDrawing, scale: Pick<ScaleView, 'pixelSizeXUm'> | null): string {
  const y = heightPx + barStripPx / 2;
  const strip = `<rect y="${heightPx}" width="${widthPx}" height="${barStripPx}" fill="${halo}"/>`;
  if (!scale) return strip + textSvg({ x: 16, y: y + 4 }, 'uncalibrated', { ink: '#ffffff', anchor: 'start' });
  const umPerFigurePx = (scale.pixelSizeXUm * framePx.width) / widthPx;
  const mostUm = widthPx * longestBarShare * umPerFigurePx;
  const power = 10 ** Math.floor(Math.log10(mostUm));
  const lengthUm = ([5, 2, 1].find((step) => step * power <= mostUm) ?? 1) * power;
  const length = lengthUm / umPerFigurePx;
  const bar = `M16 ${y - 5}v10m0-5h${r(length)}m0-5v10`;
  const words =
    lengthUm >= umPerMm ? `${formatNumber(lengthUm / umPerMm)}\u00a0mm` : `${formatNumber(lengthUm)}\u00a0µm`;
  return (
    strip +
    `<path d="${bar}" fill="none" stroke="${halo}" stroke-width="4.5" opacity="0.8"/>` +
    `<path d="${bar}" fill="none" stroke="#fff" stroke-width="1.8"/>` +
    textSvg({ x: 26 + length, y: y + 4.5 }, words, { ink: '#ffffff', anchor: 'start' })
  );
}

function textSvg(at: PointPx, words: string, { ink, anchor }: { ink: string; anchor: string }): string {
  return (
    `<text x="${r(at.x)}" y="${r(at.y)}" text-anchor="${anchor}" font-family="'Source Sans 3', Arial, sans-serif" font-size="14"` +
    ` font-weight="600" fill="${ink}" stroke="${halo}" stroke-width="3.2" stroke-opacity="0.8" stroke-linejoin="round"` +
    ` paint-order="stroke">${escaped(words)}</text>`
  );
}

/** The line of a mark as points near enough to look smooth. */
export function outline(geometry: MarkGeometry): PointPx[] {
  switch (geometry.shape) {
    case 'point':
      return [geometry.at];
    case 'segment':
      return [geometry.from, geometry.to];
    case 'chain':
      return smooth(geometry.points);
    case 'ellipse':
      return ellipse(geometry);
  }
}

function ellipse(geometry: Extract<MarkGeometry, { shape: 'ellipse' }>): PointPx[] {
  const { centre, halfAxisDepthPx: a, halfAxisAlongPx: c, turnDeg, flawShape } = geometry;
  const turn = (turnDeg * Math.PI) / 180;
  const whole = flawShape === 'half-ellipse' ? Math.PI : flawShape === 'quarter-ellipse' ? Math.PI / 2 : 2 * Math.PI;
  return Array.from({ length: 65 }, (_, step) => {
    const angle = whole - (whole * step) / 64;
    const [along, depth] = [c * Math.cos(angle), a * Math.sin(angle)];
    return {
      x: centre.x + along * Math.cos(turn) + depth * Math.sin(turn),
      y: centre.y + along * Math.sin(turn) - depth * Math.cos(turn),
    };
  });
}

/** Through all points, bent smoothly (Catmull-Rom); two points stay a straight line. */
function smooth(points: readonly PointPx[]): PointPx[] {
  if (points.length < 3) return [...points];
  return points.slice(1).reduce<PointPx[]>(
    (line, two, index) => {
      const one = points[index];
      const before = points[index - 1] ?? { x: 2 * one.x - two.x, y: 2 * one.y - two.y };
      const after = points[index + 2] ?? { x: 2 * two.x - one.x, y: 2 * two.y - one.y };
      const at = (t: number, p0: number, p1: number, p2: number, p3: number) =>
        0.5 *
        (2 * p1 + (p2 - p0) * t + (2 * p0 - 5 * p1 + 4 * p2 - p3) * t ** 2 + (3 * p1 - p0 - 3 * p2 + p3) * t ** 3);
      for (let step = 1; step <= 12; step += 1) {
        const t = step / 12;
        line.push({ x: at(t, before.x, one.x, two.x, after.x), y: at(t, before.y, one.y, two.y, after.y) });
      }
      return line;
    },
    [points[0]],
  );
}

const pathOf = (line: readonly PointPx[]) => `M${line.map(({ x, y }) => `${r(x)} ${r(y)}`).join('L')}`;
const r = (number: number) => Number(number.toFixed(1));

function escaped(text: string): string {
  return text.replaceAll('&', '&amp;').replaceAll('<', '&lt;').replaceAll('>', '&gt;').replaceAll('"', '&quot;');
}
