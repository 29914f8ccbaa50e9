import { barInputs } from './bar-inputs.ts';
import type { NumberInput } from './method.ts';
import { plateInputs } from './plate-inputs.ts';
import { withoutUncertainty } from './without-uncertainty.ts';

const length = withoutUncertainty({ ...barInputs.depth, limits: 'more than 0' });
const ratio = withoutUncertainty(plateInputs.poisson);

/** The inputs of checks, factors and readings on bent bars; none carries an uncertainty. */
export const checkInputs = {
  load: withoutUncertainty(barInputs.load),
  outerSpan: withoutUncertainty(barInputs.outerSpan),
  innerSpan: withoutUncertainty(barInputs.innerSpan),
  width: withoutUncertainty(barInputs.width),
  depth: withoutUncertainty(barInputs.depth),
  x: withoutUncertainty(barInputs.x),
  poisson: ratio,
  chamferLeg: {
    ...length,
    name: 'chamferLeg',
    label: 'Chamfer leg',
    symbol: 'c',
    argument: 'chamferLegMm',
    limits: '0 to half the smaller side; along the side, not across the chamfer',
  },
  edgeRadius: {
    ...length,
    name: 'edgeRadius',
    label: 'Edge radius',
    symbol: 'r',
    argument: 'edgeRadiusMm',
    limits: '0 to half the smaller side',
  },
  deflection: {
    ...length,
    name: 'deflection',
    label: 'Deflection',
    symbol: 'δ',
    argument: 'deflectionMm',
    limits: '0 to a tenth of the span; of the bar, without that of machine and fixture',
  },
  crossheadRate: {
    ...length,
    name: 'crossheadRate',
    label: 'Crosshead rate',
    symbol: 's',
    unit: 'mm/min',
    unitKind: 'speed',
    argument: 'crossheadMmPerMin',
  },
  slope: {
    ...length,
    name: 'slope',
    label: 'Load over deflection',
    symbol: 'k',
    unit: 'N/mm',
    unitKind: 'stiffness',
    argument: 'slopeNPerMm',
  },
  machineCompliance: {
    ...length,
    name: 'machineCompliance',
    label: 'Compliance of machine and fixture',
    symbol: 'C',
    unit: 'mm/N',
    unitKind: 'compliance',
    argument: 'machineMmPerN',
    limits: '0 or more; 0 where the deflection was read on the bar',
    default: 0,
  },
  gaugeStrain: {
    ...ratio,
    name: 'gaugeStrain',
    label: 'Strain of the gauge',
    symbol: 'ε',
    argument: 'gaugeStrain',
    limits: 'more than 0',
  },
  gaugeLength: { ...length, name: 'gaugeLength', label: 'Gauge length', symbol: 'g', argument: 'gaugeLengthMm' },
  offset: {
    ...length,
    name: 'offset',
    label: 'Middle of the gauge from mid-span',
    symbol: 'x',
    argument: 'offsetMm',
    limits: 'signed; the whole gauge between the rollers',
  },
  modulus: {
    ...length,
    name: 'modulus',
    label: 'Elastic modulus',
    symbol: 'E',
    unit: 'GPa',
    unitKind: 'modulus',
    argument: 'modulusGPa',
  },
  frictionCoefficient: {
    ...ratio,
    name: 'frictionCoefficient',
    label: 'Friction coefficient',
    symbol: 'μ',
    argument: 'frictionCoefficient',
    limits: '0 or more; between bar and bearing',
  },
} satisfies Record<string, NumberInput>;
