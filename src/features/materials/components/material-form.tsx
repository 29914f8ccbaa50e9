import { zodResolver } from '@hookform/resolvers/zod';
import { useForm } from 'react-hook-form';
import { MaterialEntered } from '#shared/contracts/materials.ts';
import { materialFamilies } from '#shared/vocabulary/constant-kinds.ts';
import { Button } from '#src/ui/button.tsx';
import { FieldError } from '#src/ui/field-error.tsx';
import { SelectField } from '#src/ui/select-field.tsx';
import { TextField } from '#src/ui/text-field.tsx';
import { UnitField } from '#src/ui/unit-field.tsx';
import { useEnterMaterial } from '../api.ts';

const textOrNone = { setValueAs: (typed: string | null) => typed?.trim() || null };
const numberOrNone = {
  setValueAs: (typed: string | number | null) => (typed === null || typed === '' ? null : Number(typed)),
};

/** Enters a material; its constants are recorded afterwards, each with its source. */
export function MaterialForm({ onDone }: { onDone: (id: string | null) => void }) {
  const enter = useEnterMaterial();
  const form = useForm<MaterialEntered>({
    resolver: zodResolver(MaterialEntered),
    defaultValues: { name: '', family: 'alumina', route: null, grainSizeUm: null, note: null },
  });
  const { errors } = form.formState;
  const keep = (entered: MaterialEntered) => enter.mutate(entered, { onSuccess: (made) => onDone(made?.id ?? null) });
  return (
    <form onSubmit={(event) => void form.handleSubmit(keep)(event)} className="grid max-w-[640px] gap-3 py-4">
      <TextField label="Name" error={errors.name?.message} {...form.register('name')} />
      <div className="grid grid-cols-2 gap-3 narrow:grid-cols-1">
        <SelectField label="Family" {...form.register('family')}>
          {materialFamilies.map((family) => (
            <option key={family}>{family}</option>
          ))}
        </SelectField>
        <UnitField
          label="Grain size"
          unit="µm"
          error={errors.grainSizeUm ? 'Type a grain size above 0 µm, or leave it open.' : undefined}
          entry={form.register('grainSizeUm', numberOrNone)}
        />
      </div>
      <TextField label="Route" help="Powder, forming, firing, in short." {...form.register('route', textOrNone)} />
      {enter.error ? <FieldError id="material-error">{enter.error.message}</FieldError> : null}
      <div className="acts">
        <Button type="submit" kind="main" disabled={enter.isPending}>
          Enter the material
        </Button>
        <Button onClick={() => onDone(null)}>Leave without entering</Button>
      </div>
    </form>
  );
}
