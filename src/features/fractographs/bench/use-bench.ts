import { useEffect, useState } from 'react';
import type { ScaleView } from '#shared/contracts/fractographs.ts';
import { benchState, type ShownMark } from './bench-state.ts';
import { Bench } from './bench-store.ts';
import type { Ask } from './moves.ts';
import { matingPlace, matingView, type FaceFacts } from './together.ts';
import type { ImageSize } from './view.ts';

/** One face's bench, told of the marks it stands among and whom to ask. */
export function useBench(
  image: ImageSize,
  marks: readonly ShownMark[],
  options: { turnedOver?: boolean; fixed: boolean; onAsk: (ask: Ask) => void },
): Bench {
  const { turnedOver, fixed, onAsk } = options;
  const [bench] = useState(() => new Bench(benchState(image, { turnedOver, fixed })));
  useEffect(() => bench.see(marks), [bench, marks]);
  useEffect(() => bench.answerWith(onAsk), [bench, onAsk]);
  return bench;
}

type Side = { bench: Bench; scale: ScaleView | null };

/** While `on`, view and reticle of the two faces move together. */
export function useTogether(first: Side, mate: Side, on: boolean): void {
  const [{ bench: one, scale: oneScale }, { bench: other, scale: otherScale }] = [first, mate];
  useEffect(() => {
    if (!on) return;
    let following = false;
    const follow = (from: Side, to: Side) => () => {
      if (following) return;
      following = true;
      const [leads, follows] = [factsOf(from), factsOf(to)];
      to.bench.do(
        { kind: 'view followed', view: matingView(leads, follows) },
        { kind: 'pointed', at: matingPlace(leads.state.reticle, leads, follows) },
      );
      following = false;
    };
    const [a, b] = [
      { bench: one, scale: oneScale },
      { bench: other, scale: otherScale },
    ];
    follow(a, b)();
    const leaveOne = one.subscribe(follow(a, b));
    const leaveOther = other.subscribe(follow(b, a));
    return () => {
      leaveOne();
      leaveOther();
    };
  }, [one, other, oneScale, otherScale, on]);
}

function factsOf({ bench, scale }: Side): FaceFacts {
  return { state: bench.state(), marks: bench.marks(), scale };
}
