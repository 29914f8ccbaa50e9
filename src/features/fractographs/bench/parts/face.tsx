import { useEffect, useRef, useSyncExternalStore, type ReactNode, type RefObject } from 'react';
import type Konva from 'konva';
import { Stage } from 'react-konva';
import type { ReadingScale } from '#shared/rules/mark-readings.ts';
import { originOf, type ShownMark } from '../bench-state.ts';
import type { Bench } from '../bench-store.ts';
import { greyAt } from '../grey-at.ts';
import { DrawingLayer } from '../layers/drawing-layer.tsx';
import { MarkLayer } from '../layers/mark-layer.tsx';
import { TileLayer } from '../layers/tile-layer.tsx';
import { readoutWords } from '../readout.ts';
import { usePointer } from '../use-pointer.ts';
import { useTiles } from '../use-tiles.ts';
import { Ruler } from './ruler.tsx';
import { ScaleBar } from './scale-bar.tsx';

const rulerScreenPx = 28;

type FaceProps = {
  bench: Bench;
  marks: readonly ShownMark[];
  scale: ReadingScale | null;
  /** Address under which the tiles stand. */
  tiles: string;
  /** What the face is, for a screen reader: "Fig. 2, Fragment F1". */
  name: string;
  /** In the corner: the fragment and how close one is. */
  tag: ReactNode;
  tagSide: 'left' | 'right';
  focusRef?: RefObject<HTMLDivElement | null>;
};

/** One face: the image, its marks, the reticle and its words, the scale bar and the ruler along its foot. */
export function Face({ bench, marks, scale, tiles, name, tag, tagSide, focusRef }: FaceProps) {
  const state = useSyncExternalStore(bench.subscribe, bench.state);
  const own = useRef<HTMLDivElement>(null);
  const element = focusRef ?? own;
  const { store, arrivals } = useTiles(tiles, state);
  const pointer = usePointer(bench, element);
  useStageSize(bench, element);
  const words = readoutWords({
    reticle: state.reticle,
    origin: originOf(marks),
    scale,
    grey: greyAt(store, state.reticle),
  });
  return (
    <section className="bench-face" aria-label={name}>
      <div
        {...pointer}
        ref={element}
        role="application"
        tabIndex={0}
        aria-label={`${name}: arrows aim, Enter sets a point`}
        data-face={tagSide === 'left' ? 'first' : 'mate'}
        data-whole={store.isWhole()}
        className="on-image relative min-h-0 flex-1 touch-none overflow-hidden border border-m-halo bg-m-halo focus-visible:-outline-offset-3"
        style={{ cursor: state.tool ? 'crosshair' : 'default' }}
      >
        <div className="absolute inset-0">
          <Stage
            ref={keepForTests}
            width={state.stage.widthScreenPx}
            height={state.stage.heightScreenPx}
            listening={false}
          >
            <TileLayer state={state} store={store} arrivals={arrivals} />
            <MarkLayer state={state} marks={marks} scale={scale} />
            <DrawingLayer state={state} />
          </Stage>
        </div>
        <span
          className={`pointer-events-none absolute top-[14px] rounded-[2px] bg-plate/85 px-[9px] py-[3px] text-s text-on-plate ${tagSide === 'left' ? 'left-4' : 'right-4'}`}
        >
          {tag}
        </span>
        <div className="pointer-events-none absolute bottom-2 left-3 flex flex-col items-start gap-1">
          <ScaleBar view={state.view} scale={scale} />
          <output className="rounded-[2px] bg-plate/80 px-1 text-s text-on-plate" aria-live="polite">
            {words}
          </output>
        </div>
      </div>
      <div className="overflow-hidden bg-plate" style={{ height: rulerScreenPx }}>
        <Ruler state={state} marks={marks} scale={scale} />
      </div>
    </section>
  );
}

/** Tells the bench how large its stage is, as it changes. */
function useStageSize(bench: Bench, element: RefObject<HTMLDivElement | null>): void {
  useEffect(() => {
    if (!element.current) return;
    const observer = new ResizeObserver(([entry]) => {
      const { width, height } = entry.contentRect;
      if (width > 0 && height > 0)
        bench.do({ kind: 'stage sized', stage: { widthScreenPx: width, heightScreenPx: height } });
    });
    observer.observe(element.current);
    return () => observer.disconnect();
  }, [bench, element]);
}

declare global {
  interface Window {
    /** In test builds alone: the stages, so that tests find what is drawn. */
    hacklebookStages?: Konva.Stage[];
  }
}

function keepForTests(stage: Konva.Stage | null): void {
  if (import.meta.env.MODE !== 'test' || !stage) return;
  window.hacklebookStages = [...(window.hacklebookStages ?? []), stage];
}
