// @vitest-environment jsdom
import { cleanup, render } from '@testing-library/react';
import { afterEach, describe, expect, it } from 'vitest';
import { DestructiveGlyph } from './destructive-glyph.tsx';
import { ExposedGlyph } from './exposed-glyph.tsx';
import { LineGlyph } from './line-glyph.tsx';
import { MarkGlyph } from './mark-glyph.tsx';
import { OriginGlyph } from './origin-glyph.tsx';
import { originShape } from './origin-shape.ts';
import { PieceGlyph } from './piece-glyph.tsx';
import { ProductMark } from './product-mark.tsx';
import { SealGlyph } from './seal-glyph.tsx';
import { sealStrokes } from './seal-strokes.ts';
import { StaleGlyph } from './stale-glyph.tsx';
import { StandingGlyph } from './standing-glyph.tsx';
import { StateGlyph } from './state-glyph.tsx';
import { TransferGlyph } from './transfer-glyph.tsx';
import { VerdictGlyph } from './verdict-glyph.tsx';

afterEach(cleanup);

const digest = '0f'.repeat(32);
const every = [
  <ProductMark />,
  <StateGlyph state="closed" amending />,
  <VerdictGlyph verdict="disagree" />,
  <StaleGlyph />,
  <SealGlyph digestHex={digest} />,
  <OriginGlyph shape="crack" />,
  <MarkGlyph shape="mist" />,
  <StandingGlyph standing="told" />,
  <PieceGlyph piece="section" />,
  <TransferGlyph transfer="offered" />,
  <DestructiveGlyph />,
  <ExposedGlyph />,
  <LineGlyph line="mirror" />,
];

describe('own glyphs', () => {
  it('are hidden from a screen reader, because their word stands beside them', () => {
    for (const glyph of every) {
      const { container } = render(glyph);
      expect(container.querySelector('svg')?.getAttribute('aria-hidden')).toBe('true');
    }
  });

  it('draw as many heavy strokes as the case has come', () => {
    const heavy = (container: HTMLElement) => container.querySelectorAll('path[stroke-width="2"]').length;
    expect(heavy(render(<StateGlyph state="received" />).container)).toBe(1);
    expect(heavy(render(<StateGlyph state="closed" />).container)).toBe(5);
    expect(heavy(render(<StateGlyph state="on hold" cameTo="drafting" />).container)).toBe(3);
  });

  it('tell handling damage at an edge from contact, and give unlisted codes the square of own terms', () => {
    expect(originShape('HD')).toBe('contact damage');
    expect(originShape('HD', true)).toBe('edge damage');
    expect(originShape('PS')).toBe('pore');
    expect(originShape('–')).toBe('not examined');
    expect(originShape('soft seam')).toBe('own term');
  });
});

describe('the strokes of a seal', () => {
  it('are 64, as long as their half-bytes', () => {
    const strokes = sealStrokes(digest);
    const lengths = strokes.map(({ x1, y1, x2, y2 }) => Math.hypot(x2 - x1, y2 - y1));
    expect(strokes).toHaveLength(64);
    expect(lengths[0]).toBeCloseTo(5, 9);
    expect(lengths[1]).toBeCloseTo(26, 9);
  });

  it('are refused for part of a digest', () => {
    expect(() => sealStrokes('0f0f')).toThrow('64 hexadecimal digits');
  });
});
