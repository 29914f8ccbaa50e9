import { describe, expect, it } from 'vitest';
import type { Tile } from '#shared/numeric/imaging/pyramid.ts';
import { TileStore } from './tile-store.ts';
import { fitView, zoomedAbout } from './view.ts';

const image = { widthPx: 8192, heightPx: 8192 };
const stage = { widthScreenPx: 800, heightScreenPx: 800 };
const settle = () => new Promise((done) => setTimeout(done, 0));

function aStore() {
  const asked: { tile: Tile; signal: AbortSignal; arrive: () => void }[] = [];
  const store = new TileStore<string>(image, {
    onArrived: () => undefined,
    load: (tile, signal) =>
      new Promise((done, fail) => {
        signal.addEventListener('abort', () => fail(new Error('given up')));
        asked.push({ tile, signal, arrive: () => done('picture') });
      }),
  });
  return { store, asked };
}

describe('the tiles of a view', () => {
  it('asks for the smallest level first and for no tile beside the view', async () => {
    const { store, asked } = aStore();
    const close = zoomedAbout(fitView(image, stage), stage, image, { x: 400, y: 400 }, 8);
    store.want(close, stage);
    for (let round = 0; round < 20; round += 1) {
      asked.forEach(({ arrive }) => arrive());
      await settle();
    }
    expect(asked[0].tile.level).toBe(0);
    expect(store.isWhole()).toBe(true);
    expect(asked.length).toBeLessThan(60);
  });

  it('gives up tiles that the view has left', async () => {
    const { store, asked } = aStore();
    const at = (x: number) => zoomedAbout(fitView(image, stage), stage, image, { x, y: 10 }, 10);
    store.want(at(10), stage);
    await settle();
    store.want(at(790), stage);
    await settle();
    expect(asked.some(({ signal, tile }) => signal.aborted && tile.level > 0)).toBe(true);
    expect(asked.some(({ signal, tile }) => signal.aborted && tile.level === 0)).toBe(false);
  });

  it('draws coarse to fine, so that the finer stands over the coarser', async () => {
    const { store, asked } = aStore();
    store.want(fitView(image, stage), stage);
    for (let round = 0; round < 10; round += 1) {
      asked.forEach(({ arrive }) => arrive());
      await settle();
    }
    const levels = store.held().map(({ tile }) => tile.level);
    expect(levels).toEqual([...levels].sort((a, b) => a - b));
  });
});
