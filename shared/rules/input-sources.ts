import type { ConstantKind } from '../vocabulary/constant-kinds.ts';
import type { MeasuredQuantity } from '../vocabulary/measured-quantities.ts';
import type { MirrorBoundary } from '../vocabulary/mirror-boundaries.ts';

/** What a method's input may be taken from besides being typed. */
export type InputSources = {
  readonly quantities: readonly MeasuredQuantity[];
  readonly constants: readonly ConstantKind[];
};

const sources: Readonly<Record<string, InputSources>> = {
  R: { quantities: ['mirror radius', 'length'], constants: [] },
  c: { quantities: ['flaw half-axis, depth', 'flaw half-axis, along', 'length'], constants: [] },
  y: { quantities: ['depth of origin', 'length'], constants: [] },
  KIc: { quantities: [], constants: ['toughness'] },
  A: {
    quantities: [],
    constants: ['mirror constant, inner', 'mirror constant, outer', 'mirror constant, branching'],
  },
};
const onlyTyped: InputSources = { quantities: [], constants: [] };

/** What the input of that name may be taken from; nothing for one that is only typed. */
export function sourcesOfInput(name: string): InputSources {
  return sources[name] ?? onlyTyped;
}

/** The mirror boundary a constant belongs to, or nothing for one that is no mirror constant. */
export function boundaryOfConstant(kind: ConstantKind): MirrorBoundary | null {
  if (kind === 'mirror constant, inner') return 'inner';
  if (kind === 'mirror constant, outer') return 'outer';
  if (kind === 'mirror constant, branching') return 'branching';
  return null;
}
