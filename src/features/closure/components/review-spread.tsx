import type { ReviewView } from '#shared/contracts/closure.ts';
import type { Role } from '#shared/vocabulary/roles.ts';
import { formatDay } from '#shared/wording/dates.ts';
import { formatInstantIn } from '#shared/wording/instant-in-zone.ts';
import { Page } from '#src/ui/page.tsx';
import { RuleHead } from '#src/ui/rule-head.tsx';
import { Spread } from '#src/ui/spread.tsx';
import type { ReviewActs } from '../api.ts';
import { CheckAgain } from './check-again.tsx';
import { ReadinessList } from './readiness-list.tsx';
import { RoundsList } from './rounds-list.tsx';
import { SealedParts } from './sealed-parts.tsx';
import { SealHead } from './seal-head.tsx';
import { SendToReview } from './send-to-review.tsx';
import { SignaturesTable } from './signatures-table.tsx';
import { SignOrSendBack } from './sign-or-send-back.tsx';

type ReviewSpreadProps = { review: ReviewView; acts: ReviewActs; roles: readonly Role[] };

/** The chapter as the case has come: toward review, in review, or closed and sealed. */
export function ReviewSpread(props: ReviewSpreadProps) {
  if (props.review.closure) return <Closed {...props} closure={props.review.closure} />;
  return props.review.state === 'in review' ? <InReview {...props} /> : <TowardReview {...props} />;
}

function TowardReview({ review, acts }: ReviewSpreadProps) {
  return (
    <Spread>
      <Page label="Toward review" folio={{ chapter: 'vii', words: 'Toward review', side: 'left' }}>
        <ReadinessList review={review} acts={acts} title="Toward review" />
      </Page>
      <Page label="Review" folio={{ chapter: 'vii', words: 'Review', side: 'right' }}>
        <SendToReview review={review} acts={acts} />
        {review.signatures.length === 0 ? null : (
          <section aria-label="Signatures" className="mt-5">
            <RuleHead small>Signatures of earlier rounds</RuleHead>
            <SignaturesTable review={review} />
          </section>
        )}
        <RoundsList review={review} />
      </Page>
    </Spread>
  );
}

function InReview({ review, acts, roles }: ReviewSpreadProps) {
  const round = review.rounds.at(0)?.round ?? 1;
  return (
    <Spread>
      <Page label="What will be sealed" folio={{ chapter: 'vii', words: 'What will be sealed', side: 'left' }}>
        <RuleHead aside="as it stands now">What will be sealed</RuleHead>
        <SealedParts parts={review.parts} caption="What will be sealed" />
        <div className="mt-6">
          <ReadinessList review={review} acts={acts} title="Before it is signed" />
        </div>
      </Page>
      <Page label="Signatures" folio={{ chapter: 'vii', words: 'Signatures', side: 'right' }}>
        <RuleHead aside={`round ${round}`}>Signatures</RuleHead>
        <SignaturesTable review={review} />
        <SignOrSendBack review={review} acts={acts} roles={roles} />
        <RoundsList review={review} />
      </Page>
    </Spread>
  );
}

function Closed({ review, closure }: ReviewSpreadProps & { closure: NonNullable<ReviewView['closure']> }) {
  return (
    <Spread>
      <Page label="What is sealed" folio={{ chapter: 'vii', words: 'What is sealed', side: 'left' }}>
        <RuleHead aside={`closure of ${formatDay(closure.closedAt)}`}>What is sealed</RuleHead>
        <SealedParts parts={review.parts} caption="What is sealed" />
        <CheckAgain number={review.number} zone={review.zone} />
      </Page>
      <Page label="Seal and signatures" folio={{ chapter: 'vii', words: 'Seal and signatures', side: 'right' }}>
        <SealHead closure={closure} />
        <RuleHead small>Signatures</RuleHead>
        <SignaturesTable review={review} />
        <p className="mt-4">
          <b>
            Closed by {closure.closedBy.name}, {formatInstantIn(closure.closedAt, review.zone)}.
          </b>{' '}
          Nothing here can be changed; it changes only by amendment.
        </p>
        <RoundsList review={review} />
      </Page>
    </Spread>
  );
}
