import { useQuery } from '@tanstack/react-query';
import { useParams } from 'react-router-dom';
import { reviewOf, useReviewActs } from '#src/features/closure/api.ts';
import { ReviewSpread } from '#src/features/closure/components/review-spread.tsx';
import { Refusal } from '#src/http/api.ts';
import { usePerson } from '#src/http/session.ts';
import { Button } from '#src/ui/button.tsx';
import { ErrorState } from '#src/ui/error-state.tsx';
import { LoadingState } from '#src/ui/loading-state.tsx';
import { Page } from '#src/ui/page.tsx';
import { RuleHead } from '#src/ui/rule-head.tsx';
import { Spread } from '#src/ui/spread.tsx';

/** Chapter vii: what stands in the way, who signed, and the seal. */
export function Component() {
  const { number = '' } = useParams();
  const person = usePerson();
  const review = useQuery(reviewOf(number));
  const acts = useReviewActs(number);
  if (review.isPending) return <Reading />;
  if (review.isError) return <NotRead error={review.error} onAgain={() => void review.refetch()} />;
  return <ReviewSpread review={review.data} acts={acts} roles={person.roles} />;
}

function Reading() {
  return (
    <Spread>
      <Page label="Review">
        <LoadingState words="Reading the review…">
          <RuleHead>Review</RuleHead>
        </LoadingState>
      </Page>
      <Page label="Signatures">
        <RuleHead>Signatures</RuleHead>
      </Page>
    </Spread>
  );
}

function NotRead({ error, onAgain }: { error: Error; onAgain: () => void }) {
  const refusal = error instanceof Refusal ? error.body : null;
  const isRight = refusal?.code === 'not-allowed' || refusal?.code === 'not-found';
  return (
    <Spread shape="single">
      <Page label="Review">
        <ErrorState
          what={isRight ? 'The review of this case is not open to you.' : 'The review could not be read.'}
          why={error.message}
          holds={isRight ? 'Ask the laboratory who has this case.' : 'Nothing was lost: what had been kept stands.'}
          reference={refusal?.reference}
          acts={isRight ? null : <Button onClick={onAgain}>Read it again</Button>}
        />
      </Page>
    </Spread>
  );
}
