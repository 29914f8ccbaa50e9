import { useEffect, useRef, useState, type PointerEvent, type RefObject } from 'react';
import type { Bench } from './bench-store.ts';
import { PointerReader, type PointerSeen } from './pointer.ts';
import type { PointScreenPx } from './view.ts';

const zoomPerWheelPx = 1.0016;
const middleButton = 1;

/** Hands pointer and wheel over an element to a bench. */
export function usePointer(bench: Bench, element: RefObject<HTMLDivElement | null>) {
  const [reader] = useState(() => new PointerReader());
  const spaceHeld = useRef(false);

  useEffect(() => {
    const face = element.current;
    if (!face) return;
    const onWheel = (event: WheelEvent) => {
      event.preventDefault();
      const pages = event.deltaMode === WheelEvent.DOM_DELTA_LINE ? 16 : 1;
      bench.do({ kind: 'zoomed', factor: zoomPerWheelPx ** (-event.deltaY * pages), about: placeIn(face, event) });
    };
    const onKey = (event: KeyboardEvent) => {
      if (event.key !== ' ') return;
      spaceHeld.current = event.type === 'keydown';
      if (event.target === face) event.preventDefault();
    };
    // not passive, so that the page does not scroll with the image
    face.addEventListener('wheel', onWheel, { passive: false });
    window.addEventListener('keydown', onKey);
    window.addEventListener('keyup', onKey);
    return () => {
      face.removeEventListener('wheel', onWheel);
      window.removeEventListener('keydown', onKey);
      window.removeEventListener('keyup', onKey);
    };
  }, [bench, element]);

  const seen = (event: PointerEvent<HTMLDivElement>): PointerSeen => ({
    id: event.pointerId,
    at: placeIn(event.currentTarget, event),
    pulls: event.button === middleButton || spaceHeld.current,
    coarse: event.pointerType === 'touch',
  });
  return {
    onPointerDown: (event: PointerEvent<HTMLDivElement>) => {
      if (event.button > middleButton) return;
      if (event.button === middleButton) event.preventDefault();
      event.currentTarget.setPointerCapture(event.pointerId);
      event.currentTarget.focus({ preventScroll: true });
      bench.do(...reader.down(seen(event), bench.state(), bench.marks()));
    },
    onPointerMove: (event: PointerEvent<HTMLDivElement>) => bench.do(...reader.move(seen(event), bench.state())),
    onPointerUp: (event: PointerEvent<HTMLDivElement>) =>
      bench.do(...reader.up(seen(event), bench.state(), bench.marks())),
    onPointerCancel: (event: PointerEvent<HTMLDivElement>) => bench.do(...reader.cancel(event.pointerId)),
  };
}

function placeIn(element: Element, event: { clientX: number; clientY: number }): PointScreenPx {
  const { left, top } = element.getBoundingClientRect();
  // the stage lies within the border
  return { x: event.clientX - left - element.clientLeft, y: event.clientY - top - element.clientTop };
}
