import type { MarkDrawn, MarkGeometry, PointPx } from '#shared/contracts/marks.ts';
import { markKindTable } from '#shared/vocabulary/mark-kinds.ts';
import { originOf, plainLight, type BenchState, type Light, type ShownMark, type Tool } from './bench-state.ts';
import type { DrawAs } from './kinds/kind.ts';
import { kindTable } from './kinds/kind-table.ts';
import { movedBy, outlineOf, withHandle } from './kinds/shapes/shape-acts.ts';
import { lengthOf, minus } from './kinds/shapes/shape.ts';
import {
  fitView,
  onImage,
  panned,
  toImage,
  toScreen,
  zoomedAbout,
  type PointScreenPx,
  type StageSize,
} from './view.ts';

/** What hand or key asks of the bench. Places are image px unless they say screen. */
export type Move =
  | { readonly kind: 'stage sized'; readonly stage: StageSize }
  | { readonly kind: 'zoomed'; readonly factor: number; readonly about?: PointScreenPx }
  | { readonly kind: 'fitted' }
  | { readonly kind: 'pulled'; readonly by: PointScreenPx }
  | { readonly kind: 'view followed'; readonly view: BenchState['view'] }
  | { readonly kind: 'tool picked'; readonly tool: Exclude<Tool, null> }
  | { readonly kind: 'chosen'; readonly as: Partial<DrawAs> }
  | { readonly kind: 'left' }
  | { readonly kind: 'pointed'; readonly at: PointPx }
  | { readonly kind: 'aimed'; readonly by: PointScreenPx }
  | { readonly kind: 'set' }
  | { readonly kind: 'taken back' }
  | { readonly kind: 'selected'; readonly markId: string | null }
  | { readonly kind: 'gripped'; readonly markId: string; readonly handle: number | null; readonly at: PointPx }
  | { readonly kind: 'let go' }
  | { readonly kind: 'shown'; readonly markId: string; readonly shown: boolean }
  | { readonly kind: 'lit'; readonly light: Partial<Light> }
  | { readonly kind: 'light taken back' };

/** What a move asks of others: to keep what was drawn or moved. */
export type Ask =
  | { readonly kind: 'draw'; readonly mark: MarkDrawn }
  | { readonly kind: 'move'; readonly markId: string; readonly geometry: MarkGeometry }
  | { readonly kind: 'bar read'; readonly from: PointPx; readonly to: PointPx };

export type Step = { readonly state: BenchState; readonly ask: Ask | null };

// A point set again this near to the last ends the mark; near to the first, it closes the outline.
const samePlaceScreenPx = 4;

/** One move of the bench. The same state, move and marks always give the same step. */
export function step(state: BenchState, move: Move, marks: readonly ShownMark[]): Step {
  switch (move.kind) {
    case 'set':
      return setPoint(state, marks);
    case 'gripped':
      return only(gripped(state, move, marks));
    case 'pointed':
      return only(pointed(state, move.at));
    case 'let go':
      return letGo(state);
    default:
      return only(changed(state, move));
  }
}

const only = (state: BenchState): Step => ({ state, ask: null });

type PlainMove = Exclude<Move, { kind: 'set' | 'gripped' | 'pointed' | 'let go' }>;

function changed(state: BenchState, move: PlainMove): BenchState {
  switch (move.kind) {
    case 'stage sized':
      return sized(state, move.stage);
    case 'zoomed':
      return {
        ...state,
        fitted: false,
        view: zoomedAbout(state.view, state.stage, state.image, move.about ?? reticleOnStage(state), move.factor),
      };
    case 'fitted':
      return { ...state, fitted: true, view: fitView(state.image, state.stage, state.view.turnedOver) };
    case 'pulled':
      return { ...state, fitted: false, view: panned(state.view, state.image, move.by) };
    case 'view followed':
      return { ...state, fitted: false, view: move.view };
    case 'tool picked':
      return picked(state, move.tool);
    case 'chosen':
      return { ...state, as: { ...state.as, ...move.as } };
    case 'left':
      return left(state);
    case 'aimed':
      return aimed(state, move.by);
    case 'taken back':
      return { ...state, points: state.points.slice(0, -1) };
    case 'selected':
      return { ...state, selectedId: move.markId, grip: null };
    case 'shown':
      return { ...state, hiddenIds: withOrWithout(state.hiddenIds, move.markId, !move.shown) };
    case 'lit':
      return { ...state, light: withinReach({ ...state.light, ...move.light }) };
    case 'light taken back':
      return { ...state, light: plainLight };
  }
}

function sized(state: BenchState, stage: StageSize): BenchState {
  return { ...state, stage, view: state.fitted ? fitView(state.image, stage, state.view.turnedOver) : state.view };
}

/** Coming closer without a pointer holds the reticle where it is, if it is seen, else the middle of the stage. */
function reticleOnStage({ view, stage, reticle }: BenchState): PointScreenPx {
  const at = toScreen(view, stage, reticle);
  const isSeen = at.x >= 0 && at.y >= 0 && at.x <= stage.widthScreenPx && at.y <= stage.heightScreenPx;
  return isSeen ? at : { x: stage.widthScreenPx / 2, y: stage.heightScreenPx / 2 };
}

/** The same key again turns to what the kind distinguishes next. Picking another drops what was half drawn. */
function picked(state: BenchState, tool: Exclude<Tool, null>): BenchState {
  if (tool !== state.tool) return { ...state, tool, points: [], selectedId: null };
  const again = tool === 'scale bar' ? undefined : kindTable[tool].again;
  return again ? { ...state, as: { ...state.as, ...again(state.as) } } : state;
}

/** Esc backs out one step: points set, then the tool, then the selection. */
function left(state: BenchState): BenchState {
  if (state.grip) return { ...state, grip: null };
  if (state.points.length > 0) return { ...state, points: [] };
  if (state.tool) return { ...state, tool: null };
  return { ...state, selectedId: null };
}

/** Moves the reticle by screen px and brings the image along when it would leave the stage. */
function aimed(state: BenchState, by: PointScreenPx): BenchState {
  const at = toScreen(state.view, state.stage, state.reticle);
  const reticle = clamped(toImage(state.view, state.stage, { x: at.x + by.x, y: at.y + by.y }), state);
  const now = toScreen(state.view, state.stage, reticle);
  const { widthScreenPx, heightScreenPx } = state.stage;
  const off = { x: overrun(now.x, widthScreenPx), y: overrun(now.y, heightScreenPx) };
  if (off.x === 0 && off.y === 0) return { ...state, reticle };
  const view = onImage(panned(state.view, state.image, { x: -off.x, y: -off.y }), state.image);
  return { ...state, reticle, view, fitted: false };
}

const overrun = (at: number, size: number) => (at < 0 ? at : at > size ? at - size : 0);

function clamped(point: PointPx, { image }: BenchState): PointPx {
  return { x: Math.min(Math.max(point.x, 0), image.widthPx), y: Math.min(Math.max(point.y, 0), image.heightPx) };
}

function pointed(state: BenchState, at: PointPx): BenchState {
  const reticle = clamped(at, state);
  if (!state.grip) return { ...state, reticle };
  const { grip } = state;
  const now =
    grip.handle === null
      ? movedBy(grip.before, minus(reticle, grip.from))
      : withHandle(grip.before, grip.handle, reticle);
  // what would leave the image stays where it last lay on it
  return { ...state, reticle, grip: liesOnImage(now, state) ? { ...grip, now } : grip };
}

function liesOnImage(geometry: MarkGeometry, { image }: BenchState): boolean {
  const points = geometry.shape === 'ellipse' ? [geometry.centre, ...geometry.points] : outlineOrPoints(geometry);
  return points.every(({ x, y }) => x >= 0 && y >= 0 && x <= image.widthPx && y <= image.heightPx);
}

const outlineOrPoints = (geometry: MarkGeometry) =>
  geometry.shape === 'chain' ? geometry.points : outlineOf(geometry);

function gripped(state: BenchState, move: Extract<Move, { kind: 'gripped' }>, marks: readonly ShownMark[]): BenchState {
  const mark = marks.find(({ id }) => id === move.markId);
  if (!mark) return state;
  const { markId, handle, at } = move;
  return { ...state, grip: { markId, handle, from: clamped(at, state), before: mark.geometry, now: mark.geometry } };
}

function letGo(state: BenchState): Step {
  const { grip } = state;
  if (!grip) return only(state);
  const ask: Ask | null = grip.now === grip.before ? null : { kind: 'move', markId: grip.markId, geometry: grip.now };
  return { state: { ...state, grip: null }, ask };
}

/** Sets a point at the reticle. The point that completes a mark asks for it to be kept; the tool stays in hand. */
function setPoint(state: BenchState, marks: readonly ShownMark[]): Step {
  const { tool, reticle } = state;
  if (!tool) return only(state);
  const nearScreenPx = (point: PointPx) => lengthOf(minus(point, reticle)) * state.view.screenPxPerImagePx;
  const last = state.points.at(-1);
  const isEnd = last !== undefined && nearScreenPx(last) < samePlaceScreenPx;
  const closes = state.points.length > 2 && nearScreenPx(state.points[0]) < samePlaceScreenPx && !isEnd;
  const points = isEnd || closes ? state.points : [...state.points, reticle];
  if (tool === 'scale bar') return barPoint(state, points);
  const { finishesAt } = kindTable[tool];
  const isWhole = finishesAt === null ? isEnd || closes : points.length >= finishesAt && !isEnd;
  if (!isWhole) return only({ ...state, points });
  return drawnFrom({ ...state, points }, tool, { closes, marks });
}

function barPoint(state: BenchState, points: readonly PointPx[]): Step {
  const [from, to] = points;
  if (!from || !to) return only({ ...state, points });
  return { state: { ...state, points: [] }, ask: { kind: 'bar read', from, to } };
}

function drawnFrom(
  state: BenchState,
  kind: keyof typeof kindTable,
  { closes, marks }: { closes: boolean; marks: readonly ShownMark[] },
): Step {
  const { points, as } = state;
  const origin = originOf(marks);
  const drawing = kindTable[kind];
  const geometry = drawing.geometryFrom({
    points,
    closed: closes || turnsRound(points),
    origin: origin?.geometry.shape === 'point' ? origin.geometry.at : null,
    as,
  });
  if (!geometry || points.length < markKindTable[kind].fewestPoints) return only(state);
  const mark: MarkDrawn = { kind, geometry, certainty: as.certainty, note: '', ...drawing.carries(as) };
  return { state: { ...state, points: [] }, ask: { kind: 'draw', mark } };
}

// An outline that runs more than three quarters of the way round its middle is closed, whether or not its ends meet.
const closedTurnDeg = 270;

function turnsRound(points: readonly PointPx[]): boolean {
  if (points.length < 4) return false;
  const middle = {
    x: points.reduce((sum, { x }) => sum + x, 0) / points.length,
    y: points.reduce((sum, { y }) => sum + y, 0) / points.length,
  };
  const angles = points.map(({ x, y }) => Math.atan2(y - middle.y, x - middle.x));
  const turned = angles.slice(1).reduce((sum, angle, index) => sum + turnBetween(angles[index], angle), 0);
  return (Math.abs(turned) * 180) / Math.PI > closedTurnDeg;
}

function turnBetween(from: number, to: number): number {
  const turn = to - from;
  return turn > Math.PI ? turn - 2 * Math.PI : turn < -Math.PI ? turn + 2 * Math.PI : turn;
}

function withOrWithout(list: readonly string[], id: string, isIn: boolean): readonly string[] {
  const others = list.filter((each) => each !== id);
  return isIn ? [...others, id] : others;
}

function withinReach(light: Light): Light {
  return {
    ...light,
    brightness: Math.min(100, Math.max(-100, Math.round(light.brightness))),
    contrast: Math.min(4, Math.max(0.2, Math.round(light.contrast * 10) / 10)),
  };
}
