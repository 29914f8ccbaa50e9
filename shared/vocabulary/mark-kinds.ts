import type { StrokeEnd } from './mark-strokes.ts';

/** What is drawn with the pointer for a mark: one point, a segment, a chain of points, or an ellipse by centre and half-axes. */
export type MarkShape = 'point' | 'segment' | 'chain' | 'ellipse';

export type MarkKindRow = {
  word: string;
  key: string;
  shape: MarkShape;
  /** Custom property of the theme that colours the stroke. */
  colour: string;
  /** Dash pattern in screen px; empty for a solid stroke. */
  dash: readonly number[];
  widthScreenPx: number;
  ends: StrokeEnd;
  fewestPoints: number;
  /** Width of a white case under the stroke, screen px, for a colour that the halo alone does not carry. */
  casedScreenPx?: number;
};

/** One row a kind: everything that draws, lists, reads or keys a mark looks here. */
export const markKindTable = {
  origin: {
    word: 'Origin',
    key: 'o',
    shape: 'point',
    colour: '--m-origin',
    dash: [],
    widthScreenPx: 2,
    ends: 'ring',
    fewestPoints: 1,
  },
  'flaw outline': {
    word: 'Flaw outline',
    key: 'f',
    shape: 'ellipse',
    colour: '--m-flaw',
    dash: [],
    widthScreenPx: 2,
    ends: 'squares',
    fewestPoints: 3,
  },
  mirror: {
    word: 'Mirror',
    key: 'm',
    shape: 'chain',
    colour: '--m-mirror',
    dash: [13, 7],
    widthScreenPx: 2,
    ends: 'bars',
    fewestPoints: 2,
  },
  mist: {
    word: 'Mist',
    key: 'i',
    shape: 'chain',
    colour: '--m-mist',
    dash: [0.1, 8.4],
    widthScreenPx: 3.5,
    ends: 'none',
    fewestPoints: 2,
  },
  hackle: {
    word: 'Hackle',
    key: 'h',
    shape: 'segment',
    colour: '--m-hackle',
    dash: [],
    widthScreenPx: 2,
    ends: 'arrow',
    fewestPoints: 2,
  },
  'wallner line': {
    word: 'Wallner line',
    key: 'w',
    shape: 'chain',
    colour: '--m-wallner',
    dash: [9, 4, 1, 4],
    widthScreenPx: 2,
    ends: 'circles',
    fewestPoints: 2,
  },
  'arrest line': {
    word: 'Arrest line',
    key: 'a',
    shape: 'chain',
    colour: '--m-arrest',
    dash: [],
    widthScreenPx: 2.4,
    ends: 'none',
    fewestPoints: 2,
    casedScreenPx: 5.4,
  },
  'compression curl': {
    word: 'Compression curl',
    key: 'c',
    shape: 'chain',
    colour: '--m-curl',
    dash: [4, 3],
    widthScreenPx: 2,
    ends: 'triangle',
    fewestPoints: 2,
  },
  length: {
    word: 'Length',
    key: 'l',
    shape: 'segment',
    colour: '--m-curl',
    dash: [],
    widthScreenPx: 1.6,
    ends: 'bars',
    fewestPoints: 2,
  },
  note: {
    word: 'Note',
    key: 'n',
    shape: 'point',
    colour: '--m-curl',
    dash: [],
    widthScreenPx: 2,
    ends: 'disc',
    fewestPoints: 1,
  },
} as const satisfies Record<string, MarkKindRow>;

export type MarkKind = keyof typeof markKindTable;
export const markKinds = Object.keys(markKindTable) as [MarkKind, ...MarkKind[]];
