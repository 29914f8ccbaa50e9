import { Refusal } from '../../http/api.ts';
import { Button } from '../../ui/button.tsx';
import { ErrorState } from '../../ui/error-state.tsx';
import { Page } from '../../ui/page.tsx';
import { Spread } from '../../ui/spread.tsx';

type ChapterNotReadProps = {
  /** The chapter's name. */
  chapter: string;
  /** What could not be read: "The estimates". */
  what: string;
  error: Error;
  onAgain: () => void;
};

/** What stands where a chapter of a case could not be read, or is not open to this person. */
export function ChapterNotRead({ chapter, what, error, onAgain }: ChapterNotReadProps) {
  const refusal = error instanceof Refusal ? error.body : null;
  const isRight = refusal?.code === 'not-allowed' || refusal?.code === 'not-found';
  return (
    <Spread shape="single">
      <Page label={chapter}>
        <ErrorState
          what={isRight ? `${what} of this case are not open to you.` : `${what} could not be read.`}
          why={error.message}
          holds={isRight ? 'Ask the laboratory who has this case.' : 'Nothing was lost: what had been kept stands.'}
          reference={refusal?.reference}
          acts={isRight ? null : <Button onClick={onAgain}>Read them again</Button>}
        />
      </Page>
    </Spread>
  );
}
