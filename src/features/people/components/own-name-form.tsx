import { zodResolver } from '@hookform/resolvers/zod';
import { useForm } from 'react-hook-form';
import { OwnName, type OwnView } from '#shared/contracts/people.ts';
import { Button } from '#src/ui/button.tsx';
import { Kept } from '#src/ui/kept.tsx';
import { TextField } from '#src/ui/text-field.tsx';
import { useOwnActs } from '../api.ts';

/** One's own name; the mail address and the roles are the administrator's to change. */
export function OwnNameForm({ own }: { own: OwnView }) {
  const { rename } = useOwnActs();
  const { register, handleSubmit, formState } = useForm<OwnName>({
    resolver: zodResolver(OwnName),
    values: { name: own.name, version: own.version },
  });
  const submit = handleSubmit((name) => rename.mutate(name));
  return (
    <form onSubmit={(event) => void submit(event)} noValidate className="mt-3 mb-7 flex flex-col gap-4">
      <TextField
        label="Name"
        autoComplete="name"
        error={formState.errors.name?.message ?? rename.error?.message}
        help="As it stands beside what you do from now on. What you signed keeps the name you signed with."
        {...register('name')}
      />
      <TextField label="Mail address" value={own.mail} readOnly help="An administrator of the laboratory changes it." />
      <div className="acts">
        <Button type="submit" disabled={rename.isPending || !formState.isDirty}>
          Keep the name
        </Button>
        {rename.isSuccess ? <Kept>Kept</Kept> : null}
      </div>
    </form>
  );
}
