import { zodResolver } from '@hookform/resolvers/zod';
import { useForm, useWatch } from 'react-hook-form';
import { ConstantTyped, ConstantView } from '#shared/contracts/materials.ts';
import { readConstant } from '#shared/rules/read-constant.ts';
import { constantKindTable, sourceStandings, type ConstantKind } from '#shared/vocabulary/constant-kinds.ts';
import { formatConstant } from '#shared/wording/constant.ts';
import { asSentence } from '#shared/wording/number-words.ts';
import { Refusal } from '#src/http/api.ts';
import { BothVersions } from '#src/ui/both-versions.tsx';
import { Button } from '#src/ui/button.tsx';
import { FieldError } from '#src/ui/field-error.tsx';
import { SelectField } from '#src/ui/select-field.tsx';
import { TextField } from '#src/ui/text-field.tsx';
import { UnitWord } from '#src/ui/quantity.tsx';
import { useRecordConstant } from '../api.ts';
import { Reach } from './reach.tsx';

type ConstantFormProps = {
  materialId: string;
  kind: ConstantKind;
  inForce: ConstantView | null;
  today: string;
  onLeave: () => void;
};

const exampleOf = { 'MPa√m': '3.5 MPa m½', GPa: '372 GPa', '1': '0.23' } as const;

/** Takes down a new record of a constant; what hangs on the one in force is shown before it is put in its place. */
export function ConstantForm({ materialId, kind, inForce, today, onLeave }: ConstantFormProps) {
  const record = useRecordConstant(materialId);
  const form = useForm<ConstantTyped>({
    resolver: zodResolver(ConstantTyped),
    defaultValues: {
      ...{ kind, value: '', plusMinus: '', plusMinusIs: 'U', source: '', sourceStanding: 'own test' },
      ...{ condition: inForce?.condition ?? null, validFrom: today, reason: null, replaces: inForce?.id ?? null },
    },
  });
  const errors = form.formState.errors;
  const refused = (field: keyof ConstantTyped) =>
    errors[field]?.message ??
    (record.error instanceof Refusal && record.error.body.field === field ? record.error.body.message : undefined);
  const [value, plusMinus, plusMinusIs] = useWatch({
    control: form.control,
    name: ['value', 'plusMinus', 'plusMinusIs'],
  });
  const read = readConstant({ kind, value, plusMinus, plusMinusIs });
  const keep = (typed: ConstantTyped) => record.mutate(typed, { onSuccess: onLeave });
  const body = record.error instanceof Refusal ? record.error.body : null;
  const theirs = ConstantView.safeParse(body?.current).data;
  const number = (inForce?.recordNumber ?? 0) + 1;
  return (
    <form onSubmit={(event) => void form.handleSubmit(keep)(event)} className="mt-4 grid gap-3">
      <h4>
        Record {number} of {constantKindTable[kind].word}
      </h4>
      <div className="grid grid-cols-[1fr_130px_150px] gap-3 narrow:grid-cols-1">
        <TextField
          label="Value with its unit"
          help={
            read.kind === 'read' ? (
              <>
                reads <UnitWord unit={formatConstant({ ...read, kind })} />
              </>
            ) : (
              `such as ${exampleOf[constantKindTable[kind].unit]}`
            )
          }
          error={refused('value')}
          autoComplete="off"
          {...form.register('value')}
        />
        <TextField label="±" error={refused('plusMinus')} autoComplete="off" {...form.register('plusMinus')} />
        <SelectField label="The ± is" {...form.register('plusMinusIs')}>
          <option value="U">U (k = 2)</option>
          <option value="u">standard u</option>
        </SelectField>
      </div>
      <div className="grid grid-cols-[1fr_200px] gap-3 narrow:grid-cols-1">
        <TextField label="Source" error={refused('source')} {...form.register('source')} />
        <SelectField label="Which is" {...form.register('sourceStanding')}>
          {sourceStandings.map((standing) => (
            <option key={standing}>{standing}</option>
          ))}
        </SelectField>
      </div>
      <div className="grid grid-cols-[1fr_200px] gap-3 narrow:grid-cols-1">
        <TextField
          label="How it was found"
          help="Method and surroundings: “surface crack in flexure, dry”."
          {...form.register('condition', { setValueAs: (typed: string | null) => typed?.trim() || null })}
        />
        <TextField label="In force from" type="date" error={refused('validFrom')} {...form.register('validFrom')} />
      </div>
      {inForce ? (
        <>
          <TextField
            label={`Why it takes the place of record ${inForce.recordNumber}, ${formatConstant(inForce)}`}
            error={refused('reason')}
            {...form.register('reason', { setValueAs: (typed: string | null) => typed?.trim() || null })}
          />
          <section aria-label="Reach">
            <Reach inForce={inForce} />
          </section>
        </>
      ) : null}
      {body && !body.field && !theirs ? <FieldError id="constant-error">{body.message}</FieldError> : null}
      <div className="acts">
        <Button type="submit" kind="main" disabled={record.isPending}>
          Put record {number} in force
        </Button>
        <Button onClick={onLeave}>Leave it as it is</Button>
      </div>
      {theirs && read.kind === 'read' ? (
        <BothVersions
          title={`${asSentence(constantKindTable[kind].word)} was recorded anew while you wrote`}
          rows={[
            { label: 'Value', theirs: formatConstant(theirs), mine: formatConstant({ ...read, kind }), differs: true },
            { label: 'Source', theirs: theirs.source, mine: form.getValues('source'), differs: true },
          ]}
          onKeepMine={() => keep({ ...form.getValues(), replaces: theirs.id })}
          onTakeTheirs={onLeave}
        />
      ) : null}
    </form>
  );
}
