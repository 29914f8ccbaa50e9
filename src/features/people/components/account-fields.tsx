import type { UseFormReturn } from 'react-hook-form';
import type { Invitation, OrganisationView } from '#shared/contracts/people.ts';
import { laboratoryRoles, roles, type Role } from '#shared/vocabulary/roles.ts';
import { CheckField } from '#src/ui/check-field.tsx';
import { FieldError } from '#src/ui/field-error.tsx';
import { SelectField } from '#src/ui/select-field.tsx';
import { TextField } from '#src/ui/text-field.tsx';

const mayDo: Record<Role, string> = {
  analyst: 'opens and works cases; signs as authored or checked',
  engineer: 'lots, test records and constants',
  manager: 'reads all, assigns, holds, approves',
  requester: 'asks, and sees what is released to the own organisation',
  administrator: 'people, mail and the trail; no say in cases',
};

type AccountFieldsProps = { form: UseFormReturn<Invitation>; organisations: readonly OrganisationView[] };

/** Name, address, organisation and roles of an account. Roles of the laboratory are offered to its own people only. */
export function AccountFields({ form, organisations }: AccountFieldsProps) {
  const { register, watch, formState } = form;
  const { errors } = formState;
  const kind = organisations.find(({ id }) => id === watch('organisationId'))?.kind;
  const isReserved = (role: Role) => kind !== 'laboratory' && laboratoryRoles.some((own) => own === role);
  return (
    <div className="mt-3 flex flex-col gap-4">
      <TextField label="Name" autoComplete="off" error={errors.name?.message} {...register('name')} />
      <TextField
        label="Mail address"
        type="email"
        autoComplete="off"
        error={errors.mail?.message}
        {...register('mail')}
      />
      <SelectField label="Organisation" error={errors.organisationId?.message} {...register('organisationId')}>
        <option value="">Choose one</option>
        {organisations.map(({ id, name }) => (
          <option key={id} value={id}>
            {name}
          </option>
        ))}
      </SelectField>
      <fieldset>
        <legend className="field-label">Roles</legend>
        {errors.roles?.message ? <FieldError id="roles-error">{errors.roles.message}</FieldError> : null}
        <div className="mt-1 flex flex-col gap-1">
          {roles.map((role) => (
            <CheckField
              key={role}
              value={role}
              label={
                <>
                  {role} <span className="text-s text-ink-2">{mayDo[role]}</span>
                </>
              }
              disabled={isReserved(role)}
              {...register('roles')}
            />
          ))}
        </div>
        {kind && kind !== 'laboratory' ? (
          <p className="field-help">Analyst, manager and administrator are the laboratory’s own people.</p>
        ) : null}
      </fieldset>
    </div>
  );
}
