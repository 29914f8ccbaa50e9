import { flawPlaces, flawShapes, lengthMeasures, type MarkGeometry, type MarkView } from '#shared/contracts/marks.ts';
import { certainties } from '#shared/vocabulary/certainties.ts';
import type { MarkKind } from '#shared/vocabulary/mark-kinds.ts';
import { mirrorBoundaries } from '#shared/vocabulary/mirror-boundaries.ts';
import { originCodes, originCodeTable, type OriginCode } from '#shared/vocabulary/origin-codes.ts';
import { SmallChoice } from './small-choice.tsx';

export type Choices = Pick<MarkView, 'certainty' | 'boundary' | 'originCode'>;

const same = <Word extends string>(words: readonly Word[]) => words.map((word) => [word, word] as const);
const boundaryOptions = mirrorBoundaries.map(
  (each) => [each, each === 'not stated' ? each : `${each} boundary`] as const,
);
const codeOptions: readonly (readonly [OriginCode, string])[] = originCodes.map(
  (code) => [code, `${originCodeTable[code].word} ${code}`] as const,
);

type MarkChoicesProps = {
  kind: MarkKind;
  choices: Choices;
  onChoose: (change: Partial<Choices>) => void;
  disabled?: boolean;
};

/** How a mark is taken: its certainty, and what its kind distinguishes. */
export function MarkChoices({ kind, choices, onChoose, disabled }: MarkChoicesProps) {
  return (
    <>
      {kind === 'origin' ? (
        <SmallChoice
          name="Origin code"
          value={choices.originCode ?? '?'}
          options={codeOptions}
          onChoose={(originCode) => onChoose({ originCode })}
          disabled={disabled}
        />
      ) : null}
      {kind === 'mirror' ? (
        <SmallChoice
          name="Boundary"
          value={choices.boundary ?? 'not stated'}
          options={boundaryOptions}
          onChoose={(boundary) => onChoose({ boundary })}
          disabled={disabled}
        />
      ) : null}
      <SmallChoice
        name="Certainty"
        value={choices.certainty}
        options={same(certainties)}
        onChoose={(certainty) => onChoose({ certainty })}
        disabled={disabled}
      />
    </>
  );
}

type GeometryChoicesProps = {
  geometry: MarkGeometry;
  onChoose: (geometry: MarkGeometry) => void;
  disabled?: boolean;
  isLength: boolean;
};

/** What a geometry says beside its numbers: shape and place of a flaw, what a length measures. */
export function GeometryChoices({ geometry, onChoose, disabled, isLength }: GeometryChoicesProps) {
  if (geometry.shape === 'ellipse') {
    return (
      <>
        <SmallChoice
          name="Shape of the flaw"
          value={geometry.flawShape}
          options={same(flawShapes)}
          onChoose={(flawShape) => onChoose({ ...geometry, flawShape })}
          disabled={disabled}
        />
        <SmallChoice
          name="Place of the flaw"
          value={geometry.place}
          options={same(flawPlaces)}
          onChoose={(place) => onChoose({ ...geometry, place })}
          disabled={disabled}
        />
      </>
    );
  }
  if (geometry.shape !== 'segment' || !isLength) return null;
  return (
    <SmallChoice
      name="What the length measures"
      value={geometry.measures ?? 'length'}
      options={same(lengthMeasures)}
      onChoose={(measures) => onChoose({ ...geometry, measures })}
      disabled={disabled}
    />
  );
}
