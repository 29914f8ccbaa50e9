import type { ReviewView } from '#shared/contracts/closure.ts';
import { Button } from '#src/ui/button.tsx';
import { RuleHead } from '#src/ui/rule-head.tsx';
import type { ReviewActs } from '../api.ts';
import { RefusalNote } from './refusal-note.tsx';

/** What sending does, and the button that does it. */
export function SendToReview({ review, acts }: { review: ReviewView; acts: ReviewActs }) {
  const { send } = review.acts;
  const { sendToReview } = acts;
  return (
    <section aria-label="Send to review">
      <RuleHead>Send to review</RuleHead>
      <p className="mt-2 max-w-[66ch] font-serif text-prose">
        A version of the findings is kept as it stands, and the managers are told. Nothing in the case changes while it
        is in review; a manager signs and closes it, or sends it back with reasons.
      </p>
      <div className="mt-4 flex flex-col gap-3">
        <RefusalNote error={sendToReview.error} />
        <div className="acts">
          <Button
            kind="main"
            disabled={sendToReview.isPending}
            closedBecause={send.reason ?? undefined}
            onClick={() => sendToReview.mutate()}
          >
            Send {review.number} to review
          </Button>
        </div>
      </div>
    </section>
  );
}
