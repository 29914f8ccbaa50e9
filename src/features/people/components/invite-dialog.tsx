import { zodResolver } from '@hookform/resolvers/zod';
import { useForm } from 'react-hook-form';
import { Invitation, type OrganisationView } from '#shared/contracts/people.ts';
import { Button } from '#src/ui/button.tsx';
import { Dialog } from '#src/ui/dialog.tsx';
import { FieldError } from '#src/ui/field-error.tsx';
import { usePeopleActs } from '../api.ts';
import { AccountFields } from './account-fields.tsx';
import { showRefusal } from './refused-fields.ts';

type InviteDialogProps = {
  open: boolean;
  onOpenChange: (open: boolean) => void;
  organisations: readonly OrganisationView[];
};

/** Invites a person by mail. */
export function InviteDialog({ open, onOpenChange, organisations }: InviteDialogProps) {
  return (
    <Dialog
      open={open}
      onOpenChange={onOpenChange}
      title="Invite someone"
      description="A mail goes to the address with a link that holds seven days and works once."
    >
      <InviteForm organisations={organisations} onDone={() => onOpenChange(false)} />
    </Dialog>
  );
}

function InviteForm({ organisations, onDone }: { organisations: readonly OrganisationView[]; onDone: () => void }) {
  const { invite } = usePeopleActs();
  const form = useForm<Invitation>({
    resolver: zodResolver(Invitation),
    defaultValues: { name: '', mail: '', organisationId: '', roles: [] },
  });
  const submit = form.handleSubmit(async (entry) => {
    try {
      await invite.mutateAsync(entry);
      onDone();
    } catch (failure) {
      showRefusal(form.setError, ['name', 'mail', 'organisationId', 'roles'], failure);
    }
  });
  const { root } = form.formState.errors;
  return (
    <form onSubmit={(event) => void submit(event)} noValidate>
      <AccountFields form={form} organisations={organisations} />
      {root?.message ? <FieldError id="invite-error">{root.message}</FieldError> : null}
      <div className="acts mt-4">
        <Button type="submit" kind="main" disabled={invite.isPending}>
          Send the invitation
        </Button>
        <Button onClick={onDone}>Leave it</Button>
      </div>
    </form>
  );
}
