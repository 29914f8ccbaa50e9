import { describe, expect, it } from 'vitest';
import { benchState, type BenchState, type ShownMark } from './bench-state.ts';
import { step, type Ask, type Move } from './moves.ts';

const image = { widthPx: 1000, heightPx: 800 };
const id = '01890000-0000-7000-8000-000000000001';

function doing(moves: readonly Move[], from: BenchState = benchState(image), marks: readonly ShownMark[] = []) {
  const asks: Ask[] = [];
  const state = moves.reduce((now, move) => {
    const { state: next, ask } = step(now, move, marks);
    if (ask) asks.push(ask);
    return next;
  }, from);
  return { state, asks };
}

const setAt = (x: number, y: number): Move[] => [{ kind: 'pointed', at: { x, y } }, { kind: 'set' }];

function aMark(mark: Partial<ShownMark> & Pick<ShownMark, 'kind' | 'geometry'>): ShownMark {
  return {
    id,
    number: 1,
    fractographId: id as ShownMark['fractographId'], // brand: a test's own id
    versionId: id,
    version: 1,
    removed: false,
    certainty: 'certain',
    boundary: null,
    originCode: null,
    note: '',
    madeBy: { id, name: 'Ana Lyst' },
    madeAt: '2026-03-09T10:00:00.000Z',
    waiting: false,
    ...mark,
  };
}

describe('drawing on the bench', () => {
  it('keeps an origin at its first point', () => {
    const { asks } = doing([{ kind: 'tool picked', tool: 'origin' }, ...setAt(400, 300)]);
    expect(asks).toEqual([
      {
        kind: 'draw',
        mark: {
          kind: 'origin',
          geometry: { shape: 'point', at: { x: 400, y: 300 } },
          certainty: 'certain',
          boundary: null,
          originCode: '?',
          note: '',
        },
      },
    ]);
  });

  it('ends a mirror when its last point is set a second time, read from the origin', () => {
    const origin = aMark({ kind: 'origin', geometry: { shape: 'point', at: { x: 500, y: 700 } } });
    const moves: Move[] = [
      { kind: 'tool picked', tool: 'mirror' },
      ...setAt(300, 700),
      ...setAt(500, 500),
      ...setAt(700, 700),
      { kind: 'set' },
    ];
    const { asks, state } = doing(moves, benchState(image), [origin]);
    expect(asks).toMatchObject([
      { mark: { kind: 'mirror', boundary: 'outer', geometry: { centre: { x: 500, y: 700 }, points: { length: 3 } } } },
    ]);
    expect(state.points).toEqual([]);
    expect(state.tool).toBe('mirror');
  });

  it('turns to the next boundary when M is pressed again', () => {
    const pick: Move = { kind: 'tool picked', tool: 'mirror' };
    expect(doing([pick]).state.as.boundary).toBe('outer');
    expect(doing([pick, pick]).state.as.boundary).toBe('branching');
    expect(doing([pick, pick, pick, pick]).state.as.boundary).toBe('inner');
  });

  it('takes the last point back, and Esc drops the points before it drops the tool', () => {
    const begun = doing([{ kind: 'tool picked', tool: 'mist' }, ...setAt(10, 10), ...setAt(50, 50)]).state;
    expect(doing([{ kind: 'taken back' }], begun).state.points).toEqual([{ x: 10, y: 10 }]);
    const left = doing([{ kind: 'left' }], begun).state;
    expect([left.points.length, left.tool]).toEqual([0, 'mist']);
    expect(doing([{ kind: 'left' }], left).state.tool).toBeNull();
  });

  it('reads an open outline as half an ellipse standing on the surface', () => {
    const on = (degrees: number) => {
      const angle = (degrees * Math.PI) / 180;
      return setAt(500 + 80 * Math.cos(angle), 700 - 60 * Math.sin(angle));
    };
    const { asks } = doing([
      { kind: 'tool picked', tool: 'flaw outline' },
      ...[180, 135, 90, 45, 0].flatMap(on),
      { kind: 'set' },
    ]);
    expect(asks).toHaveLength(1);
    const geometry = asks[0].kind === 'draw' ? asks[0].mark.geometry : null;
    expect(geometry).toMatchObject({ flawShape: 'half-ellipse', place: 'surface' });
    if (geometry?.shape !== 'ellipse') throw new Error('not an ellipse');
    expect(geometry.halfAxisAlongPx).toBeCloseTo(80, 6);
    expect(geometry.halfAxisDepthPx).toBeCloseTo(60, 6);
    expect(geometry.turnDeg).toBeCloseTo(0, 6);
  });

  it('reads a closed outline as an ellipse inside', () => {
    const around = [0, 60, 120, 180, 240, 300].flatMap((degrees) => {
      const angle = (degrees * Math.PI) / 180;
      return setAt(500 + 90 * Math.cos(angle), 400 + 40 * Math.sin(angle));
    });
    const { asks } = doing([{ kind: 'tool picked', tool: 'flaw outline' }, ...around, { kind: 'set' }]);
    const geometry = asks[0]?.kind === 'draw' ? asks[0].mark.geometry : null;
    if (geometry?.shape !== 'ellipse') throw new Error('not an ellipse');
    expect(geometry.flawShape).toBe('ellipse');
    expect(geometry.halfAxisAlongPx).toBeGreaterThan(85);
    expect(geometry.halfAxisDepthPx).toBeGreaterThan(34);
  });

  it('reads a scale bar by its two ends and keeps no mark', () => {
    const { asks } = doing([{ kind: 'tool picked', tool: 'scale bar' }, ...setAt(100, 700), ...setAt(400, 700)]);
    expect(asks).toEqual([{ kind: 'bar read', from: { x: 100, y: 700 }, to: { x: 400, y: 700 } }]);
  });
});

describe('aiming by the arrows', () => {
  it('moves the reticle by a px of screen at any closeness', () => {
    const close = doing([{ kind: 'zoomed', factor: 8 }]).state;
    const { state } = doing([{ kind: 'aimed', by: { x: 10, y: 0 } }], close);
    expect(state.reticle.x - close.reticle.x).toBeCloseTo(10 / close.view.screenPxPerImagePx, 9);
  });

  it('stays on the image', () => {
    const { state } = doing([{ kind: 'aimed', by: { x: -1e5, y: 1e5 } }]);
    expect(state.reticle).toEqual({ x: 0, y: 800 });
  });
});

describe('moving a mark', () => {
  const mirror = aMark({
    kind: 'hackle',
    geometry: { shape: 'segment', from: { x: 10, y: 10 }, to: { x: 90, y: 10 } },
  });

  it('asks once, when it is let go, with coordinates in image px', () => {
    const moves: Move[] = [
      { kind: 'gripped', markId: id, handle: 1, at: { x: 90, y: 10 } },
      { kind: 'pointed', at: { x: 100, y: 30 } },
      { kind: 'pointed', at: { x: 120, y: 40 } },
      { kind: 'let go' },
    ];
    const { asks } = doing(moves, benchState(image), [mirror]);
    expect(asks).toEqual([
      { kind: 'move', markId: id, geometry: { shape: 'segment', from: { x: 10, y: 10 }, to: { x: 120, y: 40 } } },
    ]);
  });

  it('never leaves the image', () => {
    const moves: Move[] = [
      { kind: 'gripped', markId: id, handle: null, at: { x: 50, y: 10 } },
      { kind: 'pointed', at: { x: 0, y: 10 } },
      { kind: 'let go' },
    ];
    expect(doing(moves, benchState(image), [mirror]).asks).toEqual([]);
  });

  it('asks nothing when it was only touched', () => {
    const moves: Move[] = [{ kind: 'gripped', markId: id, handle: 0, at: { x: 10, y: 10 } }, { kind: 'let go' }];
    expect(doing(moves, benchState(image), [mirror]).asks).toEqual([]);
  });
});
