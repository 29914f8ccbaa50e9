import type { ReactNode } from 'react';
import { Button } from './button.tsx';
import { Dialog } from './dialog.tsx';
import { Table } from './table.tsx';

export type VersionRow = { label: string; theirs: ReactNode; mine: ReactNode; differs: boolean };

type BothVersionsProps = {
  /** "The case HB-2026-0004 was changed while you wrote". */
  title: string;
  rows: readonly VersionRow[];
  onKeepMine: () => void;
  onTakeTheirs: () => void;
};

/** A save that came too late: both versions side by side, bold only where they differ, and two ways out. */
export function BothVersions({ title, rows, onKeepMine, onTakeTheirs }: BothVersionsProps) {
  return (
    <Dialog
      wide
      open
      onOpenChange={(open) => (open ? undefined : onTakeTheirs())}
      title={title}
      description="Someone else kept a version meanwhile; yours began from the one before it. Both stay in the trail."
      acts={
        <>
          <Button kind="main" onClick={onKeepMine}>
            Keep mine as the newer version
          </Button>
          <Button onClick={onTakeTheirs}>Take theirs</Button>
        </>
      }
    >
      <Table caption="Both versions" className="mt-3">
        <thead>
          <tr>
            <th />
            <th scope="col">Theirs, kept</th>
            <th scope="col">Yours, not kept yet</th>
          </tr>
        </thead>
        <tbody>
          {rows.map(({ label, theirs, mine, differs }) => (
            <tr key={label}>
              <th scope="row" className="!text-[14.5px] !font-normal !text-ink-2">
                {label}
              </th>
              <td className="w-[38%] py-1">{differs ? <b>{theirs}</b> : theirs}</td>
              <td className="w-[38%] py-1">{differs ? <b>{mine}</b> : mine}</td>
            </tr>
          ))}
        </tbody>
      </Table>
    </Dialog>
  );
}
