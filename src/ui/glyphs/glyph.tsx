import type { ReactNode } from 'react';

type GlyphProps = { width: number; height: number; viewBox?: string; className?: string; children: ReactNode };

/** The frame of every own glyph: drawn in `currentColor`, hidden from a screen reader because its word stands beside it. */
export function Glyph({ width, height, viewBox, className, children }: GlyphProps) {
  return (
    <svg
      width={width}
      height={height}
      viewBox={viewBox ?? `0 0 ${width} ${height}`}
      className={className}
      fill="none"
      aria-hidden
      focusable={false}
    >
      {children}
    </svg>
  );
}
