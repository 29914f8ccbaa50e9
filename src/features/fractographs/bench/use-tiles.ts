import { useEffect, useState } from 'react';
import type { Tile } from '#shared/numeric/imaging/pyramid.ts';
import type { BenchState } from './bench-state.ts';
import { TileStore } from './tile-store.ts';

async function loadTile(address: string, signal: AbortSignal): Promise<ImageBitmap> {
  const response = await fetch(address, { signal });
  if (!response.ok) throw new Error(`no tile: ${response.status}`);
  return createImageBitmap(await response.blob());
}

/** The tiles of one image, asked for as the view moves. `base` is the address its tiles stand under. */
export function useTiles(base: string, state: BenchState) {
  const [arrivals, setArrivals] = useState(0);
  const [store] = useState(
    () =>
      new TileStore<ImageBitmap>(state.image, {
        load: ({ level, column, row }: Tile, signal) => loadTile(`${base}/${level}/${column}_${row}`, signal),
        onArrived: () => setArrivals((count) => count + 1),
        letGo: (picture) => picture.close(),
      }),
  );
  const { view, stage } = state;
  useEffect(() => store.want(view, stage, window.devicePixelRatio), [store, view, stage]);
  useEffect(() => {
    store.open();
    return () => store.close();
  }, [store]);
  return { store, arrivals };
}
