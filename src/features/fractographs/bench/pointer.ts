import type { BenchState, ShownMark } from './bench-state.ts';
import { distanceToMarkPx, handlesOf } from './kinds/shapes/shape-acts.ts';
import { lengthOf, minus } from './kinds/shapes/shape.ts';
import type { Move } from './moves.ts';
import { toImage, type PointScreenPx } from './view.ts';

// Pointer, finger or two of them, read into moves. What it remembers is only where they went down.

export type PointerSeen = {
  readonly id: number;
  readonly at: PointScreenPx;
  /** The hand is forced: middle button, or the space bar is held. */
  readonly pulls: boolean;
  readonly coarse: boolean;
};

// Less than this from where it went down is a click by an unsteady hand.
const clickScreenPx = 4;
const reachScreenPx = 9;
const coarseReachScreenPx = 22;

type Down = { at: PointScreenPx; now: PointScreenPx; does: 'click' | 'pull' | 'grip'; moved: boolean };

/** Follows the pointers on one stage. */
export class PointerReader {
  readonly #down = new Map<number, Down>();

  down(pointer: PointerSeen, state: BenchState, marks: readonly ShownMark[]): Move[] {
    const grip =
      pointer.pulls || state.fixed || state.tool || this.#down.size > 0 ? null : gripAt(pointer, state, marks);
    this.#down.set(pointer.id, {
      at: pointer.at,
      now: pointer.at,
      does: pointer.pulls ? 'pull' : grip ? 'grip' : 'click',
      moved: false,
    });
    if (this.#down.size === 2)
      for (const each of this.#down.values()) Object.assign(each, { does: 'pull', moved: true });
    const at = toImage(state.view, state.stage, pointer.at);
    return grip ? [{ kind: 'pointed', at }, grip] : [];
  }

  move(pointer: PointerSeen, state: BenchState): Move[] {
    const down = this.#down.get(pointer.id);
    const at = toImage(state.view, state.stage, pointer.at);
    if (!down) return [{ kind: 'pointed', at }];
    if (this.#down.size === 2) return this.#pinched(pointer);
    const by = { x: pointer.at.x - down.now.x, y: pointer.at.y - down.now.y };
    if (!down.moved && lengthOf(minus(pointer.at, down.at)) < clickScreenPx) return [];
    const first = !down.moved;
    down.moved = true;
    down.now = pointer.at;
    if (down.does === 'grip') return [{ kind: 'pointed', at }];
    down.does = 'pull';
    return [{ kind: 'pulled', by: first ? minus(pointer.at, down.at) : by }];
  }

  up(pointer: PointerSeen, state: BenchState, marks: readonly ShownMark[]): Move[] {
    const down = this.#down.get(pointer.id);
    this.#down.delete(pointer.id);
    if (!down) return [];
    if (down.does === 'grip') return [{ kind: 'let go' }];
    if (down.does === 'pull' || down.moved) return [];
    const at = toImage(state.view, state.stage, pointer.at);
    if (state.tool) return [{ kind: 'pointed', at }, { kind: 'set' }];
    return [
      { kind: 'pointed', at },
      { kind: 'selected', markId: markAt(pointer, state, marks)?.id ?? null },
    ];
  }

  /** The pointer was taken away: nothing that was begun is done. */
  cancel(id: number): Move[] {
    const down = this.#down.get(id);
    this.#down.delete(id);
    return down?.does === 'grip' ? [{ kind: 'left' }] : [];
  }

  #pinched(pointer: PointerSeen): Move[] {
    const [one, two] = [...this.#down.values()];
    const before = { apart: lengthOf(minus(one.now, two.now)), middle: middleOf(one.now, two.now) };
    const down = this.#down.get(pointer.id);
    if (down) down.now = pointer.at;
    const after = { apart: lengthOf(minus(one.now, two.now)), middle: middleOf(one.now, two.now) };
    if (before.apart === 0 || after.apart === 0) return [];
    return [
      { kind: 'pulled', by: minus(after.middle, before.middle) },
      { kind: 'zoomed', factor: after.apart / before.apart, about: after.middle },
    ];
  }
}

const middleOf = (one: PointScreenPx, two: PointScreenPx) => ({ x: (one.x + two.x) / 2, y: (one.y + two.y) / 2 });

function reachPx(pointer: PointerSeen, state: BenchState): number {
  return (pointer.coarse ? coarseReachScreenPx : reachScreenPx) / state.view.screenPxPerImagePx;
}

/** The shown mark nearest to the pointer, within reach. */
function markAt(pointer: PointerSeen, state: BenchState, marks: readonly ShownMark[]): ShownMark | null {
  const place = toImage(state.view, state.stage, pointer.at);
  const near = marks
    .filter((mark) => !mark.removed && !state.hiddenIds.includes(mark.id))
    .map((mark) => ({ mark, distance: distanceToMarkPx(mark.geometry, place) }))
    .filter(({ distance }) => distance <= reachPx(pointer, state))
    .sort((one, other) => one.distance - other.distance);
  return near[0]?.mark ?? null;
}

/** A handle of the selected mark, or its line to move the whole. Other marks are selected first. */
function gripAt(pointer: PointerSeen, state: BenchState, marks: readonly ShownMark[]): Move | null {
  const mark = marks.find(({ id, removed }) => id === state.selectedId && !removed);
  if (!mark) return null;
  const at = toImage(state.view, state.stage, pointer.at);
  const reach = reachPx(pointer, state);
  const distances = handlesOf(mark.geometry).map((handle) => lengthOf(minus(handle, at)));
  const nearest = Math.min(...distances);
  if (nearest <= reach) return { kind: 'gripped', markId: mark.id, handle: distances.indexOf(nearest), at };
  return distanceToMarkPx(mark.geometry, at) <= reach ? { kind: 'gripped', markId: mark.id, handle: null, at } : null;
}
