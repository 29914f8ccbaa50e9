import { useQuery } from '@tanstack/react-query';
import type { MarkVersionView } from '#shared/contracts/marks.ts';
import { formatInstant } from '#shared/wording/dates.ts';
import { Button } from '../../../ui/button.tsx';
import { Dialog } from '../../../ui/dialog.tsx';
import { ErrorState } from '../../../ui/error-state.tsx';
import { LoadingState } from '../../../ui/loading-state.tsx';
import { Table } from '../../../ui/table.tsx';
import { Th } from '../../../ui/th.tsx';
import { markVersionsOf } from '../api.ts';
import { markName, readingWords, seenWords, type ListedMark, type ReadFrom } from '../listed-mark.ts';

type MarkVersionsProps = {
  number: string;
  mark: ListedMark | null;
  from: ReadFrom;
  onClose: () => void;
  /** Draws the mark on the image as it stood. */
  onView: (version: MarkVersionView) => void;
};

/** Every state a mark has had: nothing is erased, and each can be looked at on the image. */
export function MarkVersions({ number, mark, from, onClose, onView }: MarkVersionsProps) {
  return (
    <Dialog
      open={mark !== null}
      onOpenChange={(open) => (open ? undefined : onClose())}
      wide
      title={mark ? `${markName(mark)} as it stood` : ''}
      acts={<Button onClick={onClose}>Close the versions</Button>}
    >
      {mark ? <Versions number={number} mark={mark} from={from} onView={onView} /> : null}
    </Dialog>
  );
}

function Versions({ number, mark, from, onView }: Omit<MarkVersionsProps, 'onClose' | 'mark'> & { mark: ListedMark }) {
  const versions = useQuery(markVersionsOf(number, mark.fractographId, mark.id));
  if (versions.isPending) return <LoadingState words="Reading the versions…" />;
  if (versions.isError) return <ErrorState what="The versions could not be read." why={versions.error.message} />;
  return (
    <Table caption={`Versions of ${markName(mark)}`}>
      <thead>
        <tr>
          <Th numeric>Version</Th>
          <Th>As seen</Th>
          <Th>Reading on the scale in force</Th>
          <Th>By</Th>
          <Th>When</Th>
          <Th hidden>On the image</Th>
        </tr>
      </thead>
      <tbody>
        {versions.data.map((version) => (
          <tr key={version.versionId}>
            <td className="num">{version.version}</td>
            <td>{version.removed ? 'taken off' : seenWords(version)}</td>
            <td className="whitespace-nowrap">{readingWords({ ...mark, ...version }, from)}</td>
            <td>{version.madeBy.name}</td>
            <td className="text-ink-2">{formatInstant(version.madeAt)}</td>
            <td>
              <Button small kind="plain" onClick={() => onView(version)}>
                Show version {version.version}
              </Button>
            </td>
          </tr>
        ))}
      </tbody>
    </Table>
  );
}
