import { zodResolver } from '@hookform/resolvers/zod';
import { useState } from 'react';
import { useForm } from 'react-hook-form';
import { OrganisationEntry, type OrganisationView } from '#shared/contracts/people.ts';
import { Button } from '#src/ui/button.tsx';
import { Dialog } from '#src/ui/dialog.tsx';
import { FieldError } from '#src/ui/field-error.tsx';
import { SelectField } from '#src/ui/select-field.tsx';
import { Table } from '#src/ui/table.tsx';
import { TextField } from '#src/ui/text-field.tsx';
import { Th } from '#src/ui/th.tsx';
import { usePeopleActs } from '../api.ts';
import { showRefusal } from './refused-fields.ts';

/** The organisations entered, to be renamed, and a new one to be entered. */
export function OrganisationsList({ organisations }: { organisations: readonly OrganisationView[] }) {
  const [edited, setEdited] = useState<OrganisationView | 'new' | null>(null);
  return (
    <>
      <Table caption="Organisations">
        <thead>
          <tr>
            <Th>Organisation</Th>
            <Th>Kind</Th>
            <Th hidden>Acts</Th>
          </tr>
        </thead>
        <tbody>
          {organisations.map((organisation) => (
            <tr key={organisation.id}>
              <td>{organisation.name}</td>
              <td className="text-ink-2">{organisation.kind}</td>
              <td className="num">
                <Button kind="plain" small onClick={() => setEdited(organisation)}>
                  Rename
                </Button>
              </td>
            </tr>
          ))}
        </tbody>
      </Table>
      <div className="acts mt-3">
        <Button onClick={() => setEdited('new')}>Enter an organisation</Button>
      </div>
      <Dialog
        open={edited !== null}
        onOpenChange={(open) => (open ? undefined : setEdited(null))}
        title={edited === 'new' ? 'Enter an organisation' : 'Rename the organisation'}
      >
        {edited ? <OrganisationForm edited={edited} onDone={() => setEdited(null)} /> : null}
      </Dialog>
    </>
  );
}

function OrganisationForm({ edited, onDone }: { edited: OrganisationView | 'new'; onDone: () => void }) {
  const { enterOrganisation, renameOrganisation } = usePeopleActs();
  const isNew = edited === 'new';
  const { register, handleSubmit, setError, formState } = useForm<OrganisationEntry>({
    resolver: zodResolver(OrganisationEntry),
    defaultValues: isNew ? { name: '', kind: 'maker' } : { name: edited.name, kind: edited.kind },
  });
  const submit = handleSubmit(async (entry) => {
    try {
      if (isNew) await enterOrganisation.mutateAsync(entry);
      else await renameOrganisation.mutateAsync({ id: edited.id, name: entry.name, version: edited.version });
      onDone();
    } catch (failure) {
      showRefusal(setError, ['name', 'kind'], failure);
    }
  });
  const { errors } = formState;
  return (
    <form onSubmit={(event) => void submit(event)} noValidate className="flex flex-col gap-4">
      <TextField label="Name" autoComplete="off" error={errors.name?.message} {...register('name')} />
      {isNew ? (
        <SelectField
          label="Kind"
          help="It stays: rights hang on it. A maker’s engineers keep its own lots; outside firms only ask."
          {...register('kind')}
        >
          <option value="maker">maker</option>
          <option value="outside">outside</option>
        </SelectField>
      ) : null}
      {errors.root?.message ? <FieldError id="organisation-error">{errors.root.message}</FieldError> : null}
      <div className="acts">
        <Button type="submit" kind="main" disabled={formState.isSubmitting}>
          {isNew ? 'Enter it' : 'Keep the name'}
        </Button>
        <Button onClick={onDone}>Leave it</Button>
      </div>
    </form>
  );
}
