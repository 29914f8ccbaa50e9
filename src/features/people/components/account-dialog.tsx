import { zodResolver } from '@hookform/resolvers/zod';
import { useState } from 'react';
import { useForm } from 'react-hook-form';
import { AccountView, Invitation, type OrganisationView } from '#shared/contracts/people.ts';
import { Refusal } from '#src/http/api.ts';
import { Button } from '#src/ui/button.tsx';
import { Dialog } from '#src/ui/dialog.tsx';
import { FieldError } from '#src/ui/field-error.tsx';
import { usePeopleActs } from '../api.ts';
import { AccountFields } from './account-fields.tsx';
import { BothAccounts } from './both-accounts.tsx';
import { CloseAccount } from './close-account.tsx';
import { showRefusal } from './refused-fields.ts';

type AccountDialogProps = {
  account: AccountView | null;
  onClose: () => void;
  organisations: readonly OrganisationView[];
};

/** Changes one account, closes it or opens it again. */
export function AccountDialog({ account, onClose, organisations }: AccountDialogProps) {
  return (
    <Dialog
      open={account !== null}
      onOpenChange={(open) => (open ? undefined : onClose())}
      title={account ? account.name : ''}
      aside={account?.state}
    >
      {account ? <AccountForm account={account} organisations={organisations} onDone={onClose} /> : null}
    </Dialog>
  );
}

type AccountFormProps = { account: AccountView; organisations: readonly OrganisationView[]; onDone: () => void };

function AccountForm({ account, organisations, onDone }: AccountFormProps) {
  const { change } = usePeopleActs();
  const [standing, setStanding] = useState(account);
  const [newer, setNewer] = useState<AccountView | null>(null);
  const form = useForm<Invitation>({ resolver: zodResolver(Invitation), defaultValues: fieldsOf(account) });
  const submit = form.handleSubmit(async (entry) => {
    try {
      await change.mutateAsync({ ...entry, id: standing.id, version: standing.version });
      onDone();
    } catch (failure) {
      const current = failure instanceof Refusal ? AccountView.safeParse(failure.body.current) : null;
      if (current?.success) return setNewer(current.data);
      showRefusal(form.setError, ['name', 'mail', 'organisationId', 'roles'], failure);
    }
  });
  const settle = (taken: AccountView, mine: boolean) => {
    setStanding(taken);
    setNewer(null);
    if (!mine) form.reset(fieldsOf(taken));
  };
  const { root } = form.formState.errors;
  return (
    <form onSubmit={(event) => void submit(event)} noValidate>
      {newer ? (
        <BothAccounts
          theirs={newer}
          yours={form.getValues()}
          organisations={organisations}
          onKeepMine={() => settle(newer, true)}
          onTakeTheirs={() => settle(newer, false)}
        />
      ) : null}
      <AccountFields form={form} organisations={organisations} />
      {root?.message ? <FieldError id="account-error">{root.message}</FieldError> : null}
      <div className="acts mt-4">
        <Button type="submit" kind="main" disabled={change.isPending || newer !== null}>
          Keep the changes
        </Button>
        <Button onClick={onDone}>Leave it</Button>
      </div>
      <CloseAccount account={standing} onDone={onDone} />
    </form>
  );
}

function fieldsOf({ name, mail, organisationId, roles }: AccountView): Invitation {
  return { name, mail, organisationId, roles };
}
