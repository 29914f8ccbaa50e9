import type { NumberInput } from './method.ts';

const length = { kind: 'number', unit: 'mm', unitKind: 'length', openUnit: true, uncertainty: 'expected' } as const;

/** The inputs that the bar methods share, each described once. */
export const barInputs = {
  load: {
    kind: 'number',
    name: 'load',
    label: 'Load at fracture',
    symbol: 'F',
    unit: 'N',
    unitKind: 'force',
    argument: 'loadN',
    limits: '0 or more; the total on all loading rollers',
    openUnit: true,
    uncertainty: 'expected',
  },
  outerSpan: {
    ...length,
    name: 'outerSpan',
    label: 'Outer span',
    symbol: 'L',
    argument: 'outerSpanMm',
    limits: 'more than 0; the supporting rollers apart',
  },
  innerSpan: {
    ...length,
    name: 'innerSpan',
    label: 'Inner span',
    symbol: 'l',
    argument: 'innerSpanMm',
    limits: '0 or more and less than the outer span; the loading rollers apart',
  },
  width: {
    ...length,
    name: 'width',
    label: 'Width',
    symbol: 'b',
    argument: 'widthMm',
    limits: 'more than 0; the section across the load',
  },
  depth: {
    ...length,
    name: 'depth',
    label: 'Depth',
    symbol: 'd',
    argument: 'depthMm',
    limits: 'more than 0; the section along the load',
  },
  x: {
    ...length,
    name: 'x',
    label: 'Origin from mid-span',
    symbol: 'x',
    argument: 'xMm',
    limits: 'at most half the outer span either way; signed, along the bar',
  },
  y: {
    ...length,
    name: 'y',
    label: 'Origin below the tensile face',
    symbol: 'y',
    argument: 'yMm',
    limits: '0 to the depth; from the face that was in tension',
  },
} satisfies Record<string, NumberInput>;
