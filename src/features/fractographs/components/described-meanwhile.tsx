import type { FractographView } from '#shared/contracts/fractographs.ts';
import { Button } from '#src/ui/button.tsx';
import { Note } from '#src/ui/note.tsx';
import { Table } from '#src/ui/table.tsx';
import { Th } from '#src/ui/th.tsx';
import { describeFieldNames, fieldsOf, type DescribeFields } from '../describe-fields.ts';

type DescribedMeanwhileProps = {
  theirs: FractographView;
  mine: DescribeFields;
  onKeepMine: () => void;
  onTakeTheirs: () => void;
  onTakeSome: () => void;
};

const wordOf: Record<keyof DescribeFields, string> = {
  caption: 'Caption',
  fragmentId: 'Piece',
  face: 'Face',
  view: 'View',
  standing: 'Standing',
  instrumentId: 'Instrument',
  objective: 'Objective',
  fieldWidth: 'Field width',
  tilt: 'Tilt',
  illumination: 'Light',
  detector: 'Detector',
  coating: 'Coating',
  takenBy: 'Taken by',
  takenOn: 'Taken on',
};

/** Someone described the image while one wrote: both versions side by side, bold where they differ. */
export function DescribedMeanwhile(props: DescribedMeanwhileProps) {
  const { theirs, mine, onKeepMine, onTakeTheirs, onTakeSome } = props;
  const kept = fieldsOf(theirs);
  const shown = (name: keyof DescribeFields, value: string, isTheirs: boolean): string => {
    if (name === 'fragmentId' && isTheirs) return theirs.fragment?.code ?? 'not told';
    if (name === 'instrumentId' && isTheirs) return theirs.instrument?.name ?? 'not told';
    if (name === 'fragmentId' || name === 'instrumentId')
      return value === kept[name] ? shown(name, value, true) : 'as chosen';
    return value === '' ? 'not told' : value;
  };
  return (
    <section role="alertdialog" aria-label="Both versions" className="mt-6">
      <Note tone="ochre" lead={`Fig. ${theirs.figureNumber} was described by someone else while you wrote.`}>
        Nothing was written over; both versions stand here until you choose.
      </Note>
      <Table caption="Both versions" className="mt-3">
        <thead>
          <tr>
            <Th hidden>What</Th>
            <Th>Theirs, kept</Th>
            <Th>Yours, not kept yet</Th>
          </tr>
        </thead>
        <tbody>
          {describeFieldNames
            .filter((name) => kept[name] !== '' || mine[name] !== '')
            .map((name) => {
              const isSame = kept[name] === mine[name];
              const [left, right] = [shown(name, kept[name], true), shown(name, mine[name], false)];
              return (
                <tr key={name}>
                  <th scope="row">{wordOf[name]}</th>
                  <td>{isSame ? left : <b>{left}</b>}</td>
                  <td>{isSame ? right : <b>{right}</b>}</td>
                </tr>
              );
            })}
        </tbody>
      </Table>
      <div className="acts mt-3">
        <Button kind="main" onClick={onKeepMine}>
          Keep mine as the newer version
        </Button>
        <Button onClick={onTakeTheirs}>Take theirs</Button>
        <Button kind="plain" onClick={onTakeSome}>
          Take some of each
        </Button>
      </div>
    </section>
  );
}
