import { pyramidOf, tilesForView, type Pyramid, type Tile } from '#shared/numeric/imaging/pyramid.ts';
import { seenRectPx, type ImageSize, type StageSize, type View } from './view.ts';

export type LoadTile<Picture> = (tile: Tile, signal: AbortSignal) => Promise<Picture>;
export type HeldTile<Picture> = { readonly tile: Tile; readonly picture: Picture };

// 256 px squares of four bytes: 480 of them are about 125 MB.
const mostHeld = 480;
const mostUnderWay = 8;
// Tiles that failed are asked for again, but not for ever.
const mostTries = 3;

const keyOf = (tile: Tile) => `${tile.level}/${tile.column}/${tile.row}`;

/**
 * Holds the tiles that the view needs: asked for coarse to fine, those no longer needed are given up, and only so many
 * are held. A coarser level stays until the finer one stands over it.
 */
export class TileStore<Picture> {
  readonly pyramid: Pyramid;
  readonly #load: LoadTile<Picture>;
  readonly #onArrived: () => void;
  readonly #letGo: (picture: Picture) => void;
  readonly #held = new Map<string, HeldTile<Picture>>();
  readonly #underWay = new Map<string, AbortController>();
  readonly #failures = new Map<string, number>();
  #wanted: readonly Tile[] = [];
  #closed = false;

  constructor(
    image: ImageSize,
    options: { load: LoadTile<Picture>; onArrived: () => void; letGo?: (picture: Picture) => void },
  ) {
    this.pyramid = pyramidOf(image);
    this.#load = options.load;
    this.#onArrived = options.onArrived;
    this.#letGo = options.letGo ?? (() => undefined);
  }

  /** Says what is seen now. `screenScale`: device px in a screen px. */
  want(view: View, stage: StageSize, screenScale = 1): void {
    const sharp = view.screenPxPerImagePx * screenScale;
    const imageRectPx = seenRectPx(view, stage);
    const finest = tilesForView(this.pyramid, { imageRectPx, screenPxPerImagePx: sharp });
    const coarser = [...coarseLevels(finest.level.level)].flatMap((level) => {
      const { widthPx } = this.pyramid.levels[level];
      return tilesForView(this.pyramid, { imageRectPx, screenPxPerImagePx: widthPx / this.pyramid.widthPx }).tiles;
    });
    this.#wanted = [...coarser, ...nearestFirst(finest.tiles, view)];
    const keys = new Set(this.#wanted.map(keyOf));
    for (const [key, loading] of this.#underWay) if (!keys.has(key)) loading.abort();
    for (const tile of this.#wanted) this.#touch(keyOf(tile));
    this.#loadMore();
  }

  /** What can be drawn, coarse to fine. */
  held(): readonly HeldTile<Picture>[] {
    return [...this.#held.values()].sort((one, other) => one.tile.level - other.tile.level);
  }

  /** Whether all that the view needs has come. */
  isWhole(): boolean {
    return this.#wanted.every((tile) => this.#held.has(keyOf(tile)));
  }

  /** Takes up work again, after a close too. */
  open(): void {
    this.#closed = false;
    this.#loadMore();
  }

  close(): void {
    this.#closed = true;
    for (const loading of this.#underWay.values()) loading.abort();
    for (const { picture } of this.#held.values()) this.#letGo(picture);
    this.#held.clear();
  }

  /** Moves a held tile to the end of those to be let go. */
  #touch(key: string): void {
    const held = this.#held.get(key);
    if (!held) return;
    this.#held.delete(key);
    this.#held.set(key, held);
  }

  #loadMore(): void {
    for (const tile of this.#wanted) {
      if (this.#closed || this.#underWay.size >= mostUnderWay) return;
      const key = keyOf(tile);
      const isGivenUp = (this.#failures.get(key) ?? 0) >= mostTries;
      if (!this.#held.has(key) && !this.#underWay.has(key) && !isGivenUp) void this.#fetch(tile, key);
    }
  }

  async #fetch(tile: Tile, key: string): Promise<void> {
    const loading = new AbortController();
    this.#underWay.set(key, loading);
    try {
      const picture = await this.#load(tile, loading.signal);
      if (this.#closed) this.#letGo(picture);
      else this.#keep(key, { tile, picture });
    } catch {
      // Given up because it is no longer needed, or failed: then asked for again at the next look, up to three times.
      if (!loading.signal.aborted) this.#failures.set(key, (this.#failures.get(key) ?? 0) + 1);
    } finally {
      this.#underWay.delete(key);
      this.#loadMore();
    }
  }

  #keep(key: string, held: HeldTile<Picture>): void {
    this.#held.set(key, held);
    const needed = new Set(this.#wanted.map(keyOf));
    for (const [oldest, { picture }] of this.#held) {
      if (this.#held.size <= mostHeld) break;
      if (needed.has(oldest)) continue;
      this.#held.delete(oldest);
      this.#letGo(picture);
    }
    this.#onArrived();
  }
}

/** The smallest level always, then every second one: enough to see something at once, and little to fetch. */
function* coarseLevels(finest: number): Generator<number> {
  for (let level = 0; level < finest; level += 2) yield level;
}

function nearestFirst(tiles: readonly Tile[], view: View): readonly Tile[] {
  const away = ({ imageRectPx: rect }: Tile) =>
    Math.hypot(rect.x + rect.width / 2 - view.centrePx.x, rect.y + rect.height / 2 - view.centrePx.y);
  return [...tiles].sort((one, other) => away(one) - away(other));
}
