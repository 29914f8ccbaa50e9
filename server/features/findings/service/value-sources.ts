import type { BoundQuantity, BoundValueView } from '#shared/contracts/findings.ts';
import type { EstimateView } from '#shared/contracts/estimates.ts';
import { constantKindTable } from '#shared/vocabulary/constant-kinds.ts';
import type { MeasuredQuantity } from '#shared/vocabulary/measured-quantities.ts';
import type { ValueOfSource } from '#shared/wording/bound-value.ts';
import type { ConstantOfCase } from '../queries/bound-values.ts';

/** What a source says of itself in a sentence, and where it leads. */
export type SourceSaid = Pick<BoundValueView, 'words' | 'sourceWords' | 'href'> & { readonly value: ValueOfSource };

const upperFirst = (words: string) => words.charAt(0).toUpperCase() + words.slice(1);

/** @returns null where the estimate has no such value, as a mirror has none on the tensile face */
export function estimateSaid(caseNumber: string, estimate: EstimateView, quantity: BoundQuantity): SourceSaid | null {
  const value = quantity === 'outer-fibre stress' ? onTensileFace(estimate) : estimate.origin;
  if (value === null) return null;
  const place = quantity === 'outer-fibre stress' ? 'Stress on the tensile face' : 'Stress at the origin';
  return {
    value,
    words: `${place}, ${estimate.line} line`,
    sourceWords: `estimate ${estimate.number}, ${estimate.method.title}, by ${estimate.madeBy.name}`,
    href: `/cases/${caseNumber}/estimates`,
  };
}

function onTensileFace({ outputs }: EstimateView): ValueOfSource | null {
  const found = outputs.find(({ name }) => name === 'outerFibreStress');
  if (!found || found.standardUncertainty === null) return null;
  return { value: found.value, standardUncertainty: found.standardUncertainty, unit: found.unit };
}

export type LengthSaid = {
  readonly quantity: MeasuredQuantity;
  readonly valueMm: number;
  readonly standardUncertaintyMm: number;
  readonly markNumber: number;
  readonly fractographId: string;
  readonly figureNumber: number;
};

export function lengthSaid(caseNumber: string, length: LengthSaid): SourceSaid {
  return {
    value: { value: length.valueMm, standardUncertainty: length.standardUncertaintyMm, unit: 'mm' },
    words: upperFirst(length.quantity),
    sourceWords: `mark m${length.markNumber}, Fig. ${length.figureNumber}`,
    href: `/cases/${caseNumber}/fractographs/${length.fractographId}`,
  };
}

export function constantSaid(constant: ConstantOfCase): SourceSaid {
  const { word, unit } = constantKindTable[constant.kind];
  return {
    value: { value: constant.value, standardUncertainty: constant.standardUncertainty, unit },
    words: upperFirst(word),
    sourceWords: `${constant.materialName}, record ${constant.recordNumber}: ${constant.source}`,
    href: `/materials/${constant.materialId}`,
  };
}
