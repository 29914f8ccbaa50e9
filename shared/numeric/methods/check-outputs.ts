import type { MethodOutput } from './method.ts';

/** The outputs that several checks and factors share. */
export const checkOutputs = {
  secondMoment: { name: 'secondMoment', label: 'Second moment', symbol: 'I', unit: 'mm⁴' },
  stressFactor: { name: 'stressFactor', label: 'True stress over that of the sharp section', symbol: 'f', unit: '1' },
  strain: { name: 'strain', label: 'Strain of the outer fibre', symbol: 'ε', unit: '1' },
  strainRate: { name: 'strainRate', label: 'Strain rate of the outer fibre', symbol: 'ε̇', unit: '1/s' },
  specimenSlope: { name: 'specimenSlope', label: 'Load over deflection of the bar', symbol: 'k', unit: 'N/mm' },
  modulus: { name: 'modulus', label: 'Elastic modulus', symbol: 'E', unit: 'GPa' },
  relativeStressError: {
    name: 'relativeStressError',
    label: 'True stress against the nominal one',
    symbol: 'Δσ/σ',
    unit: '1',
  },
  momentRatio: { name: 'momentRatio', label: 'Moment ratio', symbol: 'm', unit: '1' },
} satisfies Record<string, MethodOutput>;
