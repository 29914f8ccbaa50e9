import { useOutletContext } from 'react-router-dom';
import type { CaseView } from '#shared/contracts/cases.ts';
import type { Answer, CaseAct } from '#shared/rules/may.ts';

export type CaseContext = {
  readonly case: CaseView;
  /** Every act with whether the person may do it now, and the reason if not. The server still decides. */
  readonly acts: Readonly<Record<CaseAct, Answer>>;
};

/** The case a chapter belongs to, from the leaf that draws its head. */
export function useCase(): CaseContext {
  return useOutletContext<CaseContext>();
}
