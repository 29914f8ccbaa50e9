import { useState, type ReactNode } from 'react';
import type { ReviewView } from '#shared/contracts/closure.ts';
import type { Role } from '#shared/vocabulary/roles.ts';
import type { SignatureMeaning } from '#shared/vocabulary/signatures.ts';
import { caseActTable } from '#shared/rules/may.ts';
import { Button } from '#src/ui/button.tsx';
import { TextArea } from '#src/ui/text-area.tsx';
import type { ReviewActs } from '../api.ts';
import { RefusalNote } from './refusal-note.tsx';
import { meaningsFor, SignForm } from './sign-form.tsx';

type SignOrSendBackProps = { review: ReviewView; acts: ReviewActs; roles: readonly Role[] };

/** The two ways out of a review: a signature, or back with reasons; with why, where this person may do neither. */
export function SignOrSendBack({ review, acts, roles }: SignOrSendBackProps) {
  const [isSendingBack, setSendingBack] = useState(false);
  const meanings = meaningsFor(review);
  const mayAsk = review.acts.sendBack.allowed && !isSendingBack;
  const beside = mayAsk ? <Button onClick={() => setSendingBack(true)}>Send back with a reason</Button> : null;
  return (
    <>
      {meanings.length > 0 ? (
        <SignForm key={meanings.join()} review={review} act={acts.sign} meanings={meanings} beside={beside} />
      ) : (
        <ClosedSigning review={review} roles={roles} beside={beside} />
      )}
      {isSendingBack ? <SendBack acts={acts} onLeave={() => setSendingBack(false)} /> : null}
    </>
  );
}

const ofRoles = (meaning: SignatureMeaning, roles: readonly Role[]) => {
  const may: readonly Role[] = caseActTable[`sign as ${meaning}`].roles;
  return roles.some((role) => may.includes(role));
};

type ClosedSigningProps = { review: ReviewView; roles: readonly Role[]; beside: ReactNode };

function ClosedSigning({ review, roles, beside }: ClosedSigningProps) {
  const near = (['approved', 'authored', 'checked'] as const).filter((meaning) => ofRoles(meaning, roles));
  const reasons = near.map((meaning) => review.acts.sign[meaning].reason ?? '');
  return (
    <div className="acts mt-4 items-start">
      <Button
        kind="main"
        closedBecause={reasons.length === 0 ? 'An analyst or a manager signs.' : <Reasons reasons={reasons} />}
      >
        {near.includes('approved') ? `Sign and close ${review.number}` : 'Sign what stands here'}
      </Button>
      {beside}
    </div>
  );
}

function Reasons({ reasons }: { reasons: readonly string[] }) {
  return reasons.map((reason) => (
    <span key={reason} className="block">
      {reason}
    </span>
  ));
}

function SendBack({ acts: { sendBack }, onLeave }: { acts: ReviewActs; onLeave: () => void }) {
  const [reasons, setReasons] = useState('');
  return (
    <form
      noValidate
      className="mt-5 flex flex-col gap-3 border-t border-hairline pt-4"
      onSubmit={(event) => {
        event.preventDefault();
        if (reasons.trim() !== '') sendBack.mutate(reasons.trim());
      }}
    >
      <TextArea
        label="Why it goes back"
        help="The reasons stay with the round, and the case goes back to drafting."
        value={reasons}
        onChange={(event) => setReasons(event.target.value)}
      />
      <RefusalNote error={sendBack.error} />
      <div className="acts">
        <Button
          type="submit"
          disabled={sendBack.isPending}
          closedBecause={reasons.trim() === '' ? 'Opens once a reason stands above.' : undefined}
        >
          Send the case back
        </Button>
        <Button kind="plain" onClick={onLeave}>
          Leave it in review
        </Button>
      </div>
    </form>
  );
}
