import { readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { markKinds, markKindTable } from '../vocabulary/mark-kinds.ts';
import { figureSvg, type FigureDrawing } from './marks-to-svg.ts';

const drawing: FigureDrawing = {
  marks: [
    { number: 1, kind: 'origin', geometry: { shape: 'point', at: { x: 500, y: 400 } } },
    {
      number: 3,
      kind: 'mirror',
      geometry: {
        shape: 'chain',
        points: [
          { x: 300, y: 400 },
          { x: 500, y: 200 },
          { x: 700, y: 400 },
        ],
      },
    },
  ],
  framePx: { x: 0, y: 0, width: 1000, height: 500 },
  widthPx: 500,
  heightPx: 250,
  scale: { pixelSizeXUm: 0.55 },
  picture: 'data:image/webp;base64,AAAA',
  words: 'Origin & mirror on "F1" <seen>',
};

describe('a figure drawn for the text', () => {
  it('shows its marks by number where they lie, and the scale at the size of the figure', () => {
    const svg = figureSvg(drawing);
    expect(svg).toContain('>m1<');
    expect(svg).toContain('>m3<');
    expect(svg).toContain('M243 200a7 7'); // the origin's ring about (250, 200)
    expect(svg).toContain('100\u00a0µm'); // 110 px of 1.1 µm are 121 µm at most
    expect(svg).toContain('m0-5h90.9m'); // 100 µm / 1.1 µm
  });

  it('says that it is uncalibrated where the image has no scale', () => {
    expect(figureSvg({ ...drawing, scale: null })).toContain('uncalibrated');
    expect(figureSvg({ ...drawing, scale: undefined })).not.toContain('uncalibrated');
  });

  it('keeps words as words, whatever stands in them', () => {
    expect(figureSvg(drawing)).toContain('Origin &amp; mirror on &quot;F1&quot; &lt;seen&gt;');
  });

  it('draws each kind of mark in the colour that it has on the bench', () => {
    const tokens = readFileSync('src/theme/tokens.css', 'utf8');
    for (const kind of markKinds) {
      const [, colour] = new RegExp(`${markKindTable[kind].colour}: (#[0-9a-f]+)`).exec(tokens) ?? [];
      const at = { x: 10, y: 10 };
      const svg = figureSvg({
        ...drawing,
        marks: [{ number: 1, kind, geometry: { shape: 'segment', from: at, to: { x: 90, y: 10 } } }],
      });
      expect(svg).toContain(colour);
    }
  });
});
