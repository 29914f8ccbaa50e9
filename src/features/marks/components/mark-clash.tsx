import type { MarkView } from '#shared/contracts/marks.ts';
import { Button } from '../../../ui/button.tsx';
import { Dialog } from '../../../ui/dialog.tsx';
import { Table } from '../../../ui/table.tsx';
import { Th } from '../../../ui/th.tsx';
import { fieldsOf } from '../geometry-fields.ts';
import { markName, readingWords, seenWords, type ListedMark, type ReadFrom } from '../listed-mark.ts';

type MarkClashProps = {
  clash: { readonly mine: ListedMark; readonly theirs: MarkView } | null;
  from: ReadFrom;
  onSettle: (which: 'mine' | 'theirs') => void;
};

/** Two people changed one mark at the same time: both versions, bold where they differ, and one is chosen. */
export function MarkClash({ clash, from, onSettle }: MarkClashProps) {
  if (!clash) return null;
  const { mine, theirs } = clash;
  const name = markName(theirs);
  const other = theirs.madeBy.name;
  const theirsListed = { ...theirs, waiting: false };
  return (
    <Dialog
      open
      onOpenChange={(open) => (open ? undefined : onSettle('theirs'))}
      wide
      title={`${name} was changed by two people`}
      description={`${other} changed ${name} while you did. Nothing was lost: whichever you choose, the other stays among its versions.`}
      acts={
        <>
          <Button kind="main" onClick={() => onSettle('mine')}>
            Keep your {name}
          </Button>
          <Button onClick={() => onSettle('theirs')}>
            Let {other}’s {name} stand
          </Button>
        </>
      }
    >
      <Table caption={`Both versions of ${name}`} className="mt-3">
        <thead>
          <tr>
            <Th hidden>What</Th>
            <Th>Yours</Th>
            <Th>{other}’s</Th>
          </tr>
        </thead>
        <tbody>
          <Row word="As seen" mine={stateWords(mine)} theirs={stateWords(theirsListed)} />
          <Row word="Reading" mine={readingWords(mine, from)} theirs={readingWords(theirsListed, from)} />
          <Row word="Place" mine={placeWords(mine)} theirs={placeWords(theirsListed)} />
          <Row word="Note" mine={mine.note || 'none'} theirs={theirs.note || 'none'} />
        </tbody>
      </Table>
    </Dialog>
  );
}

const stateWords = (mark: ListedMark) => (mark.removed ? 'taken off' : seenWords(mark));

const placeWords = (mark: ListedMark) =>
  fieldsOf(mark.geometry)
    .map(({ word, value, unit }) => `${word} ${Math.round(value)} ${unit}`)
    .join('; ');

function Row({ word, mine, theirs }: { word: string; mine: string; theirs: string }) {
  const weight = mine === theirs ? '' : 'font-semibold';
  return (
    <tr>
      <th scope="row">{word}</th>
      <td className={weight}>{mine}</td>
      <td className={weight}>{theirs}</td>
    </tr>
  );
}
