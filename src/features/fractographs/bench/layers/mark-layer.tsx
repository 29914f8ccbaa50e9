import { Layer } from 'react-konva';
import type { ReadingScale } from '#shared/rules/mark-readings.ts';
import { originOf, type BenchState, type ShownMark } from '../bench-state.ts';
import { labelPlaceOf } from '../kinds/shapes/shape-acts.ts';
import { labelWords } from '../mark-paint.ts';
import { toScreen } from '../view.ts';
import { MarkShape } from './mark-shape.tsx';

type MarkLayerProps = { state: BenchState; marks: readonly ShownMark[]; scale: ReadingScale | null };

/** Every mark that stands and is shown; the selected one lies on top. A mark being pulled is drawn where it is now. */
export function MarkLayer({ state, marks, scale }: MarkLayerProps) {
  const shown = marks
    .filter((mark) => !mark.removed && !state.hiddenIds.includes(mark.id))
    .map((mark) => (state.grip?.markId === mark.id ? { ...mark, geometry: state.grip.now } : mark))
    .sort((one, other) => Number(one.id === state.selectedId) - Number(other.id === state.selectedId));
  const origin = originOf(marks);
  const crowded = crowdedIds(state, shown);
  return (
    <Layer listening={false}>
      {shown.map((mark) => (
        <MarkShape
          key={mark.id}
          mark={mark}
          state={state}
          isSelected={mark.id === state.selectedId}
          label={labelWords(mark, { scale, origin }, crowded.has(mark.id) && mark.id !== state.selectedId)}
        />
      ))}
    </Layer>
  );
}

const tooNearScreenPx = { x: 110, y: 18 };

/** Marks whose label would run into that of another. */
function crowdedIds(state: BenchState, marks: readonly ShownMark[]): ReadonlySet<string> {
  const places = marks.map((mark) => ({
    id: mark.id,
    at: toScreen(state.view, state.stage, labelPlaceOf(mark.geometry).at),
  }));
  const isCrowded = (id: string, at: { x: number; y: number }) =>
    places.some(
      (other) =>
        other.id !== id &&
        Math.abs(other.at.x - at.x) < tooNearScreenPx.x &&
        Math.abs(other.at.y - at.y) < tooNearScreenPx.y,
    );
  return new Set(places.filter(({ id, at }) => isCrowded(id, at)).map(({ id }) => id));
}
