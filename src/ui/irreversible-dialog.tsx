import { useState, type ReactNode } from 'react';
import { Button } from './button.tsx';
import { Dialog } from './dialog.tsx';
import { TextField } from './text-field.tsx';

type IrreversibleDialogProps = {
  open: boolean;
  onOpenChange: (open: boolean) => void;
  /** A question: "Withdraw calibration CAL-06?" */
  title: string;
  /** What it reaches, in numbers. */
  reach: ReactNode;
  /** The number to be typed before the button opens. */
  number: string;
  /** Verb and object: "Withdraw CAL-06". */
  verb: string;
  /** "Leave it in force". */
  leave: string;
  onConfirm: (why: string) => void;
  /** What went wrong in the doing, and what still holds. */
  error?: ReactNode;
};

/** Asks before what can't be undone: names its reach, asks why, and opens on the typed number of the thing. */
export function IrreversibleDialog(props: IrreversibleDialogProps) {
  const { open, onOpenChange, title, reach, error } = props;
  return (
    <Dialog irreversible open={open} onOpenChange={onOpenChange} title={title} description={reach}>
      {error ? (
        <p role="alert" className="mt-3 font-semibold text-iron">
          {error}
        </p>
      ) : null}
      <IrreversibleForm {...props} />
    </Dialog>
  );
}

function IrreversibleForm({ number, verb, leave, onConfirm, onOpenChange }: IrreversibleDialogProps) {
  const [why, setWhy] = useState('');
  const [typed, setTyped] = useState('');
  const isOpen = typed.trim() === number && why.trim() !== '';
  return (
    <form
      onSubmit={(event) => {
        event.preventDefault();
        if (isOpen) onConfirm(why.trim());
      }}
    >
      <TextField label="Why" value={why} onChange={(event) => setWhy(event.target.value)} className="mt-3" />
      <TextField
        mono
        label="Type its number to go on"
        help={`The button opens once it reads ${number} and a reason stands above.`}
        value={typed}
        onChange={(event) => setTyped(event.target.value)}
        className="mt-3"
        autoComplete="off"
      />
      <div className="acts mt-4">
        <Button type="submit" kind={isOpen ? 'iron-filled' : 'iron'} disabled={!isOpen}>
          {verb}
        </Button>
        <Button onClick={() => onOpenChange(false)}>{leave}</Button>
      </div>
    </form>
  );
}
