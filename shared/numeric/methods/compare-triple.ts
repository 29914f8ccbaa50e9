import type { AgreementPattern } from '../comparison/agreement-pattern.ts';
import { compareTriple as compare } from '../comparison/compare-triple.ts';
import { stressAndUncertainty } from './compare-inputs.ts';
import { numberGiven } from './given.ts';
import type { Caution, GivenInputs, Method, Outputs } from './method.ts';

/** "load-low": the line that stands apart, and to which side; else the kind of the pattern. */
function patternCode(pattern: AgreementPattern): string {
  return pattern.kind === 'outlier' ? `${pattern.line}-${pattern.side}` : pattern.kind;
}

function run(given: GivenInputs): Outputs {
  const line = (name: string, uncertainty: string) => ({
    line: name,
    stressMPa: numberGiven(given, `${name}Stress`),
    uMPa: numberGiven(given, uncertainty),
  });
  const { zetas, chiSquared, pattern, pooled } = compare([
    line('load', 'uLoad'),
    line('mirror', 'uMirror'),
    line('flaw', 'uFlaw'),
  ]);
  return {
    zetaLoadMirror: zetas[0],
    zetaLoadFlaw: zetas[1],
    zetaMirrorFlaw: zetas[2],
    chi2: chiSquared,
    pattern: patternCode(pattern),
    ...(pooled && { pooledStress: pooled.stressMPa, uPooled: pooled.standardUncertaintyMPa }),
  };
}

function cautions(outputs: Outputs): Caution[] {
  if (typeof outputs.pooledStress === 'number') return [];
  const sentence =
    'The three spread more than their uncertainties allow (χ² over its 95 % limit): no common value is given.';
  return [{ code: 'no-common-stress', weight: 'warning', sentence }];
}

export const compareTriple: Method = {
  id: 'compare.triple',
  version: 1,
  line: 'supporting',
  title: 'Three stresses against one another',
  inputs: [
    ...stressAndUncertainty({
      stress: { name: 'loadStress', label: 'Stress from the load', symbol: 'σ₁', argument: 'loadStress' },
      uncertainty: { name: 'uLoad', symbol: 'u₁', argument: 'uLoad' },
    }),
    ...stressAndUncertainty({
      stress: { name: 'mirrorStress', label: 'Stress from the mirror', symbol: 'σ₂', argument: 'mirrorStress' },
      uncertainty: { name: 'uMirror', symbol: 'u₂', argument: 'uMirror' },
    }),
    ...stressAndUncertainty({
      stress: { name: 'flawStress', label: 'Stress from the flaw', symbol: 'σ₃', argument: 'flawStress' },
      uncertainty: { name: 'uFlaw', symbol: 'u₃', argument: 'uFlaw' },
    }),
  ],
  outputs: [
    { name: 'zetaLoadMirror', label: 'Load against mirror', symbol: 'ζ₁₂', unit: '1' },
    { name: 'zetaLoadFlaw', label: 'Load against flaw', symbol: 'ζ₁₃', unit: '1' },
    { name: 'zetaMirrorFlaw', label: 'Mirror against flaw', symbol: 'ζ₂₃', unit: '1' },
    { name: 'chi2', label: 'Spread about the common stress', symbol: 'χ²', unit: '1' },
    { name: 'pattern', label: 'Pattern', symbol: '', unit: null },
    { name: 'pooledStress', label: 'Common stress', symbol: 'σ̄', unit: 'MPa' },
    { name: 'uPooled', label: 'Standard uncertainty of the common stress', symbol: 'u(σ̄)', unit: 'MPa' },
  ],
  formula: {
    symbols: 'σ̄ = Σ(σ/u²) / Σ(1/u²), χ² = Σ(σ − σ̄)²/u²',
    template: () =>
      'weighted mean of {loadStress} ± {uLoad}, {mirrorStress} ± {uMirror} and {flawStress} ± {uFlaw} (u)',
  },
  source: { text: 'Weighted mean and χ² on two degrees of freedom; pattern from which pairs agree', tag: 'practice' },
  run,
  cautions: (_given, outputs) => cautions(outputs),
};
