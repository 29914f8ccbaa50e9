import { Button } from '../ui/button.tsx';
import { Dialog } from '../ui/dialog.tsx';
import { Kbd } from '../ui/kbd.tsx';

const groups: readonly { where: string; keys: readonly (readonly [keys: string, does: string])[] }[] = [
  {
    where: 'Anywhere',
    keys: [
      ['/', 'find'],
      ['?', 'this list'],
      ['G C', 'Casebook'],
      ['G M', 'Materials'],
      ['Esc', 'back out one step'],
    ],
  },
  {
    where: 'Case and tables',
    keys: [
      ['1 to 7', 'chapters of the case'],
      ['↑ ↓', 'row by row'],
      ['Enter', 'open the row'],
      ['Home End', 'first and last row'],
    ],
  },
  {
    where: 'Bench',
    keys: [
      ['O F M I H', 'origin, flaw outline, mirror, mist, hackle'],
      ['W A C L N', 'Wallner, arrest, curl, length, note'],
      ['↑ ↓ ← →', 'reticle by 1 px, with Shift by 10'],
      ['Enter', 'set a point'],
      ['Backspace', 'take the last point back'],
      ['+ - 0', 'closer, farther, fit'],
      ['J K', 'next and previous figure'],
      ['B T V', 'mating face, together, invert'],
      ['[ ] { }', 'brightness, contrast'],
    ],
  },
  {
    where: 'Findings',
    keys: [
      ['Ctrl K', 'bind a value'],
      ['Ctrl B', 'bold'],
      ['Ctrl I', 'italic'],
    ],
  },
];

type KeyListDialogProps = { open: boolean; onOpenChange: (open: boolean) => void };

/** The list of keys, by where they work. */
export function KeyListDialog({ open, onOpenChange }: KeyListDialogProps) {
  return (
    <Dialog
      wide
      open={open}
      onOpenChange={onOpenChange}
      title="Keys"
      aside="single letters are off while you type"
      acts={<Button onClick={() => onOpenChange(false)}>Leave the list</Button>}
    >
      <div className="columns-2 gap-8 narrow:columns-1">
        {groups.map((group) => (
          <section key={group.where} className="mb-4 break-inside-avoid">
            <h4 className="mb-1 text-[17px]">{group.where}</h4>
            <dl className="grid grid-cols-[118px_1fr] gap-x-3">
              {group.keys.map(([keys, does]) => (
                <div key={keys} className="col-span-2 grid grid-cols-subgrid border-b border-hairline py-1">
                  <dt className="flex flex-wrap items-start gap-1 pt-px">
                    {keys.split(' ').map((key) => (key === 'to' ? key : <Kbd key={key}>{key}</Kbd>))}
                  </dt>
                  <dd>{does}</dd>
                </div>
              ))}
            </dl>
          </section>
        ))}
      </div>
    </Dialog>
  );
}
