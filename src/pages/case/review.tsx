import { useQuery } from '@tanstack/react-query';
import { useParams } from 'react-router-dom';
import { reviewOf, useReviewActs } from '#src/features/closure/api.ts';
import { ReviewSpread } from '#src/features/closure/components/review-spread.tsx';
import { usePerson } from '#src/http/session.ts';
import { LoadingState } from '#src/ui/loading-state.tsx';
import { Page } from '#src/ui/page.tsx';
import { RuleHead } from '#src/ui/rule-head.tsx';
import { Spread } from '#src/ui/spread.tsx';
import { ChapterNotRead } from './chapter-not-read.tsx';

/** Chapter vii: what stands in the way, who signed, and the seal. */
export function Component() {
  const { number = '' } = useParams();
  const person = usePerson();
  const review = useQuery(reviewOf(number));
  const acts = useReviewActs(number);
  if (review.isPending) return <Reading />;
  if (review.isError)
    return (
      <ChapterNotRead
        chapter="Review"
        what="The review and signatures"
        error={review.error}
        onAgain={() => void review.refetch()}
      />
    );
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
