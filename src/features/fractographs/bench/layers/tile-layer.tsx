import type Konva from 'konva';
import { useEffect, useRef } from 'react';
import { Layer, Shape } from 'react-konva';
import type { BenchState } from '../bench-state.ts';
import type { TileStore } from '../tile-store.ts';
import { toScreen } from '../view.ts';

// From here on single pixels are looked at, and smoothing would invent what is between them.
const unsmoothedFrom = 4;

type TileLayerProps = {
  state: BenchState;
  store: TileStore<ImageBitmap>;
  /** Counts up as tiles arrive. */
  arrivals: number;
};

/** The image: every tile that is here, coarse to fine. Light changes the canvas, never the tiles. */
export function TileLayer({ state, store, arrivals }: TileLayerProps) {
  const layer = useRef<Konva.Layer>(null);
  const { brightness, contrast, inverted } = state.light;
  useEffect(() => {
    const canvas = layer.current?.getNativeCanvasElement();
    if (!canvas) return;
    canvas.style.filter = `brightness(${1 + brightness / 100}) contrast(${contrast})${inverted ? ' invert(1)' : ''}`;
  }, [brightness, contrast, inverted]);
  return (
    <Layer ref={layer} listening={false}>
      <Shape
        listening={false}
        perfectDrawEnabled={false}
        arrivals={arrivals}
        sceneFunc={(context) => drawTiles(context, state, store)}
      />
    </Layer>
  );
}

function drawTiles(context: Konva.Context, state: BenchState, store: TileStore<ImageBitmap>): void {
  const { view, stage } = state;
  context.save();
  if (view.turnedOver) {
    context.translate(stage.widthScreenPx, 0);
    context.scale(-1, 1);
  }
  context.imageSmoothingEnabled = view.screenPxPerImagePx < unsmoothedFrom;
  const straight = { ...view, turnedOver: false };
  for (const { tile, picture } of store.held()) {
    const { x, y, width, height } = tile.imageRectPx;
    const from = toScreen(straight, stage, { x, y });
    const to = toScreen(straight, stage, { x: x + width, y: y + height });
    if (to.x < 0 || to.y < 0 || from.x > stage.widthScreenPx || from.y > stage.heightScreenPx) continue;
    // whole screen px, so that neighbours meet without a seam
    const [left, top] = [Math.round(from.x), Math.round(from.y)];
    context.drawImage(picture, left, top, Math.round(to.x) - left, Math.round(to.y) - top);
  }
  context.restore();
}
