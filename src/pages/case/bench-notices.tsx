import type { MarkVersionView } from '#shared/contracts/marks.ts';
import type { LiveMarks, LiveState } from '#src/features/fractographs/bench/live-marks.ts';
import { MarkClash } from '#src/features/marks/components/mark-clash.tsx';
import type { ReadFrom } from '#src/features/marks/listed-mark.ts';
import { Button } from '#src/ui/button.tsx';
import { Kept } from '#src/ui/kept.tsx';
import { Note } from '#src/ui/note.tsx';

type BenchNoticesProps = {
  sending: LiveState;
  live: LiveMarks;
  from: ReadFrom;
  /** An earlier version that is drawn instead of the one in force. */
  viewed: { name: string; version: MarkVersionView } | null;
  onViewNow: () => void;
};

/** What has to be said before one goes on: a refusal, a clash, an earlier version on the image. */
export function BenchNotices({ sending, live, from, viewed, onViewNow }: BenchNoticesProps) {
  const { refused, conflict, outOfReach, waiting } = sending;
  return (
    <>
      {refused ? (
        <Note
          tone="iron"
          alert
          lead={refused.message}
          acts={
            <Button small onClick={() => live.dismissRefusal()}>
              Go on
            </Button>
          }
        >
          {refused.stillHolds}
        </Note>
      ) : null}
      {outOfReach ? (
        <Note
          tone="ochre"
          lead="The laboratory’s server does not answer."
          acts={
            <Button small onClick={live.tryNow}>
              Try again now
            </Button>
          }
        >
          {waiting.length === 1 ? 'One act waits' : `${waiting.length} acts wait`} on this page and will be sent when it
          does.
        </Note>
      ) : null}
      {viewed ? (
        <Note
          lead={`${viewed.name} is shown as it stood at version ${viewed.version.version}.`}
          acts={
            <Button small onClick={onViewNow}>
              Show {viewed.name} as it is now
            </Button>
          }
        >
          By {viewed.version.madeBy.name}.
        </Note>
      ) : null}
      <MarkClash clash={conflict} from={from} onSettle={(which) => live.settle(which)} />
    </>
  );
}

/** "Kept 14:07"; while a mark was just taken off, the way to have it back. */
export function KeptLine({ sending, live }: { sending: LiveState; live: LiveMarks }) {
  const { waiting, keptAt, justRemoved } = sending;
  if (justRemoved) {
    const name = justRemoved.number === null ? 'The mark' : `m${justRemoved.number}`;
    return (
      <span data-undo>
        <Kept undo={() => live.restore(justRemoved.markId)}>{name} taken off</Kept>
      </span>
    );
  }
  if (waiting.length > 0) return <Kept>Keeping…</Kept>;
  if (!keptAt) return null;
  const at = new Date(keptAt);
  return <Kept>Kept {at.toTimeString().slice(0, 5)}</Kept>;
}
