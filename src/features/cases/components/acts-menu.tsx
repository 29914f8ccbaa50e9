import { CaretDownIcon } from '@phosphor-icons/react/dist/csr/CaretDown';
import { useState } from 'react';
import type { CaseView } from '#shared/contracts/cases.ts';
import { movesByHand } from '#shared/rules/case-transitions.ts';
import type { CaseAct } from '#shared/rules/may.ts';
import { Refusal } from '#src/http/api.ts';
import { usePerson } from '#src/http/session.ts';
import { Button } from '#src/ui/button.tsx';
import { MenuEntry, MenuRule } from '#src/ui/menu-entry.tsx';
import { Menu } from '#src/ui/menu.tsx';
import { belongsToRole, type ActsInCase } from '../acts-in-case.ts';
import { useCaseAct, type CaseActSent } from '../api.ts';
import { GiveDialog } from './give-dialog.tsx';
import { HoldDialog } from './hold-dialog.tsx';
import { RestrictDialog } from './restrict-dialog.tsx';
import { WithdrawDialog } from './withdraw-dialog.tsx';

type Asking = 'hold' | 'give' | 'restrict' | 'withdraw' | null;

/** The one menu of what may be done with a case. What is not allowed now says why; what is never one's own is left out. */
export function ActsMenu({ view, acts }: { view: CaseView; acts: ActsInCase }) {
  const person = usePerson();
  const act = useCaseAct(view.number);
  const [asking, setAsking] = useState<Asking>(null);
  const close = () => {
    act.reset();
    setAsking(null);
  };
  const sendAct = (sent: CaseActSent) => act.mutate(sent, { onSuccess: () => setAsking(null) });
  const versionSeen = view.version;
  const entry = (name: CaseAct, words: string, onChosen: () => void, iron = false) => {
    if (!belongsToRole(person, name)) return null;
    const answer = acts[name];
    return (
      <MenuEntry key={words} onChosen={onChosen} iron={iron && answer.allowed} disabled={!answer.allowed}>
        <span>
          {words}
          {answer.allowed ? null : <span className="block text-s text-ink-2">{answer.reason}</span>}
        </span>
      </MenuEntry>
    );
  };
  const error = act.error instanceof Refusal ? act.error.body.message : act.error?.message;
  const dialog = { view, error, onLeave: close, onSend: sendAct, sending: act.isPending };
  return (
    <>
      {error && asking === null ? (
        <span role="alert" className="font-semibold text-iron">
          {error}
        </span>
      ) : null}
      <Menu
        align="end"
        opener={
          <Button small>
            Acts <CaretDownIcon size={12} aria-hidden />
          </Button>
        }
      >
        {movesByHand(view.state).map(({ to, words }) =>
          entry('move', words, () => sendAct({ method: 'POST', path: '/moves', body: { to, versionSeen } })),
        )}
        {view.assignedTo?.id === person.id
          ? null
          : entry('take', 'Take this case', () => sendAct({ method: 'POST', path: '/taken', body: { versionSeen } }))}
        {entry('assign', 'Give it to someone', () => setAsking('give'))}
        {view.hold
          ? entry('resume', 'Take it off hold', () =>
              sendAct({ method: 'DELETE', path: '/hold', body: { versionSeen } }),
            )
          : entry('hold', 'Put it on hold', () => setAsking('hold'))}
        {entry('restrict', 'Restrict who sees it', () => setAsking('restrict'))}
        <MenuRule />
        {entry('withdraw', 'Withdraw it', () => setAsking('withdraw'), true)}
      </Menu>
      {asking === 'hold' ? <HoldDialog {...dialog} /> : null}
      {asking === 'give' ? <GiveDialog {...dialog} /> : null}
      {asking === 'restrict' ? <RestrictDialog {...dialog} /> : null}
      {asking === 'withdraw' ? <WithdrawDialog {...dialog} /> : null}
    </>
  );
}
