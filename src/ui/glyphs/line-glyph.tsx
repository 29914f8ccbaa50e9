import { Glyph } from './glyph.tsx';

export type LineShape = 'load' | 'mirror' | 'flaw';

const points: Record<LineShape, string> = {
  load: 'M-5-5H5V5H-5Z',
  mirror: 'M-7 4A7 8.4 0 0 1 7 4Z',
  flaw: 'M0-7L7 0 0 7-7 0Z',
};

type LinePointProps = { line: LineShape; x: number; y: number; hollow?: boolean };

/** The point of a line of evidence in a chart: load a square, mirror a half-disc, flaw a diamond; hollow where stale. */
export function LinePoint({ line, x, y, hollow = false }: LinePointProps) {
  return (
    <path
      d={points[line]}
      transform={`translate(${x} ${y})`}
      fill={hollow ? 'var(--sheet)' : 'currentColor'}
      stroke={hollow ? 'currentColor' : undefined}
      strokeWidth={hollow ? 2 : undefined}
    />
  );
}

/** A line of evidence beside its word. */
export function LineGlyph({ line, hollow }: { line: LineShape; hollow?: boolean }) {
  return (
    <Glyph width={16} height={16} viewBox="-8 -8 16 16">
      <LinePoint line={line} x={0} y={0} hollow={hollow} />
    </Glyph>
  );
}
