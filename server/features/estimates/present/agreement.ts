import type { AgreementView } from '#shared/contracts/estimates.ts';
import type { Agreement } from '#shared/rules/agreement.ts';
import { patternInWords, verdictInWords } from '#shared/wording/verdict.ts';
import { presentStress } from './stress.ts';

/** The verdict over the lines in force, with the numbers behind its word. */
export function presentAgreement(agreement: Agreement): AgreementView {
  const { ruleVersion, verdict, weakly, pairs, chiSquared, pooled } = agreement;
  return {
    ruleVersion,
    verdict,
    weakly,
    words: verdictInWords(agreement),
    pattern: patternInWords(agreement),
    pairs: pairs.map((pair) => ({
      lines: [...pair.lines],
      en: pair.en,
      zeta: pair.zeta,
      verdict: pair.verdict,
      sharedInputs: [...pair.sharedInputs],
    })),
    chiSquared,
    pooled: pooled ? presentStress(pooled.stressMPa, pooled.standardUncertaintyMPa) : null,
  };
}
