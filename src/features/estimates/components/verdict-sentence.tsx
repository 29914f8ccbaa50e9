import type { AgreementView } from '#shared/contracts/estimates.ts';
import { VerdictGlyph, verdictColour } from '#src/ui/glyphs/verdict-glyph.tsx';

const edge = {
  agree: 'border-celadon',
  doubtful: 'border-ochre',
  disagree: 'border-iron',
  'too few': 'border-rule',
} as const;

/** The verdict as glyph, word and the numbers behind it. */
export function VerdictSentence({ agreement }: { agreement: AgreementView }) {
  const { verdict, weakly, words, pattern, pooled, ruleVersion } = agreement;
  const word = weakly ? `${verdict}, weakly` : verdict;
  return (
    <div className={`my-2 flex gap-5 border-y py-[10px] ${edge[verdict]}`} aria-label="Verdict" role="group">
      <span className="flex-none pt-1">
        <VerdictGlyph verdict={verdict} size={34} />
      </span>
      <p className="font-serif text-[17px]/[1.45]">
        <b className={verdictColour[verdict]}>{word.charAt(0).toUpperCase() + word.slice(1)}.</b> {words}{' '}
        {pattern === '' ? null : `${pattern} `}
        {pooled ? (
          <>
            Together <span className="whitespace-nowrap">{pooled.text}</span>,{' '}
          </>
        ) : null}
        <span className="text-ink-2">
          {pooled ? 'by' : 'By'} rule {ruleVersion}, <var>k</var> = 2.
        </span>
      </p>
    </div>
  );
}
