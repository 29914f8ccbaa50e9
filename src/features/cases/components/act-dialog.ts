import type { CaseView } from '#shared/contracts/cases.ts';
import type { CaseActSent } from '../api.ts';

/** What every dialog of an act in a case is given. */
export type ActDialogProps = {
  readonly view: CaseView;
  /** Why the server refused the last try. */
  readonly error: string | undefined;
  readonly sending: boolean;
  readonly onSend: (sent: CaseActSent) => void;
  readonly onLeave: () => void;
};
