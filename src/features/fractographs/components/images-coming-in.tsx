import { Button } from '#src/ui/button.tsx';
import { Note } from '#src/ui/note.tsx';
import { ProgressLine } from '#src/ui/progress-line.tsx';
import { RuleHead } from '#src/ui/rule-head.tsx';
import type { Arrival, Arrivals } from '../arrivals.ts';
import { sizeInWords, timeLeftInWords } from '../size-in-words.ts';

type ImagesComingInProps = { list: readonly Arrival[]; arrivals: Arrivals };

/** Files on their way in, each with its own line; one that fails loses none of the others. */
export function ImagesComingIn({ list, arrivals }: ImagesComingInProps) {
  const failed = list.filter(({ state }) => state === 'failed');
  const isOpen = list.some(({ state }) => state === 'waiting' || state === 'coming in');
  // What has come in stands among the figures; its line goes once nothing is on its way any more.
  const shown = isOpen ? list : failed;
  if (shown.length === 0) return null;
  return (
    <section aria-label="Images coming in" className="mb-7">
      <RuleHead small aside={summaryOf(list)}>
        Images coming in
      </RuleHead>
      <div className="mt-3 flex flex-col gap-3">
        {shown.map((arrival) => (
          <ArrivalLine key={arrival.id} arrival={arrival} />
        ))}
        {failed.map((arrival) => (
          <FailedFile key={arrival.id} arrival={arrival} arrivals={arrivals} others={list.length - 1} />
        ))}
        {isOpen ? <p className="text-s text-ink-2">Leave this page if you like: they go on arriving.</p> : null}
      </div>
    </section>
  );
}

function ArrivalLine({ arrival }: { arrival: Arrival }) {
  const { file, state, sentBytes, figure } = arrival;
  const words = {
    waiting: 'waits for its turn',
    'coming in': `${sizeInWords(sentBytes)} of ${sizeInWords(file.size)}, ${percentOf(arrival)} %`,
    here: figure ? `here, Fig. ${figure.figureNumber}` : 'here',
    failed: `stopped at ${sizeInWords(sentBytes)} of ${sizeInWords(file.size)}`,
  } as const;
  return (
    <ProgressLine
      label={file.name}
      share={state === 'here' ? 1 : sentBytes / Math.max(1, file.size)}
      amount={sizeInWords(file.size)}
      help={words[state]}
      failed={state === 'failed'}
    />
  );
}

type FailedFileProps = { arrival: Arrival; arrivals: Arrivals; others: number };

function FailedFile({ arrival, arrivals, others }: FailedFileProps) {
  return (
    <Note
      tone="iron"
      alert
      lead={`${arrival.file.name} did not come in.`}
      acts={
        <>
          <Button small onClick={() => arrivals.again(arrival.id)}>
            Bring it in again
          </Button>
          <Button small kind="plain" onClick={() => arrivals.leaveOut(arrival.id)}>
            Leave this one out
          </Button>
        </>
      }
    >
      {arrival.failure} {others > 0 ? 'Nothing else was lost: the other images go their own way.' : null}
    </Note>
  );
}

function percentOf({ sentBytes, file }: Arrival): number {
  return Math.floor((100 * sentBytes) / Math.max(1, file.size));
}

function summaryOf(list: readonly Arrival[]): string {
  const sum = (values: readonly number[]) => values.reduce((total, value) => total + value, 0);
  const here = list.filter(({ state }) => state === 'here').length;
  const total = sum(list.map(({ file }) => file.size));
  const sent = sum(list.map(({ sentBytes }) => sentBytes));
  const words = `${here} of ${list.length} here, ${sizeInWords(sent)} of ${sizeInWords(total)}`;
  const left = timeLeftInWords(secondsLeft(list));
  return left === '' ? words : `${words}, ${left}`;
}

/** From the pace of what is on its way now. */
function secondsLeft(list: readonly Arrival[]): number {
  const now = performance.now();
  const moving = list.filter(({ state }) => state === 'coming in');
  const pace = moving.reduce((total, { sentBytes, begunAt }) => {
    const seconds = begunAt === null ? 0 : (now - begunAt) / 1000;
    return seconds > 0.5 ? total + sentBytes / seconds : total;
  }, 0);
  const open = list.filter(({ state }) => state === 'coming in' || state === 'waiting');
  const bytesLeft = open.reduce((total, { file, sentBytes }) => total + file.size - sentBytes, 0);
  return pace > 0 ? bytesLeft / pace : Infinity;
}
