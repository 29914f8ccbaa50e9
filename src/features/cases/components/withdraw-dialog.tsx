import { counted } from '#shared/wording/number-words.ts';
import { IrreversibleDialog } from '#src/ui/irreversible-dialog.tsx';
import type { ActDialogProps } from './act-dialog.ts';

/** Asks before a case is withdrawn for good. */
export function WithdrawDialog({ view, error, onSend, onLeave }: ActDialogProps) {
  const { fractographs, estimates } = view.counts;
  return (
    <IrreversibleDialog
      open
      onOpenChange={onLeave}
      title={`Withdraw ${view.number}?`}
      reach={`It ends without an answer, with ${counted(fractographs, 'fractograph')} and ${counted(estimates, 'estimate')} kept as they are. A withdrawal can’t be undone; a new case can be opened.`}
      number={view.number}
      verb={`Withdraw ${view.number}`}
      leave="Leave it open"
      error={error}
      onConfirm={(reason) =>
        onSend({ method: 'POST', path: '/withdrawal', body: { reason, versionSeen: view.version } })
      }
    />
  );
}
