import type { ReactNode } from 'react';
import { Button } from '#src/ui/button.tsx';
import { Note } from '#src/ui/note.tsx';
import { Table } from '#src/ui/table.tsx';
import { Th } from '#src/ui/th.tsx';

export type VersionLine = { readonly word: string; readonly theirs: string | null; readonly mine: string | null };

type BothVersionsProps = {
  /** What was changed meanwhile: "F2". */
  what: ReactNode;
  lines: readonly VersionLine[];
  onKeepMine: () => void;
  onTakeTheirs: () => void;
  onTakeSome: () => void;
};

/** Someone kept a change while one wrote: both versions side by side, bold where they differ. */
export function BothVersions({ what, lines, onKeepMine, onTakeTheirs, onTakeSome }: BothVersionsProps) {
  return (
    <div className="mt-5" role="alertdialog" aria-label="Both versions">
      <Note tone="ochre" lead={<>{what} was changed while you wrote.</>}>
        Nothing was written over; both versions stand here until you choose.
      </Note>
      <div className="mt-3">
        <Table caption="Both versions">
          <thead>
            <tr>
              <Th hidden>What</Th>
              <Th>Theirs, kept</Th>
              <Th>Yours, not kept yet</Th>
            </tr>
          </thead>
          <tbody>
            {lines.map(({ word, theirs, mine }) => {
              const isSame = (theirs ?? '') === (mine ?? '');
              return (
                <tr key={word}>
                  <th scope="row">{word}</th>
                  <td>{isSame ? saidOf(theirs) : <b>{saidOf(theirs)}</b>}</td>
                  <td>{isSame ? saidOf(mine) : <b>{saidOf(mine)}</b>}</td>
                </tr>
              );
            })}
          </tbody>
        </Table>
      </div>
      <div className="acts mt-3">
        <Button kind="main" onClick={onKeepMine}>
          Keep mine as the newer version
        </Button>
        <Button onClick={onTakeTheirs}>Take theirs</Button>
        <Button kind="plain" onClick={onTakeSome}>
          Take some of each
        </Button>
      </div>
    </div>
  );
}

function saidOf(text: string | null): string {
  return text === null || text === '' ? 'not said' : text;
}
