import { useState } from 'react';
import { FormProvider, useForm, useWatch } from 'react-hook-form';
import { useQuery } from '@tanstack/react-query';
import type { EstimateView } from '#shared/contracts/estimates.ts';
import type { EstimateLine } from '#shared/vocabulary/estimate-lines.ts';
import { Refusal } from '#src/http/api.ts';
import { Button } from '#src/ui/button.tsx';
import { Note } from '#src/ui/note.tsx';
import { RuleHead } from '#src/ui/rule-head.tsx';
import { SelectField } from '#src/ui/select-field.tsx';
import { TextArea } from '#src/ui/text-area.tsx';
import { TextField } from '#src/ui/text-field.tsx';
import { constantsOf, materialsQuery, measurementsOf, useEstimateActs } from '../../api.ts';
import { lineWord } from '../line-words.ts';
import { SetText } from '../set-text.tsx';
import { draftFrom, emptyDraft, methodsOf, numberInputs, wantedFrom, type EstimateDraft } from './draft.ts';
import { DraftStress } from './draft-preview.tsx';
import { InputEntry } from './input-entry.tsx';
import { previewDraft } from './preview.ts';

type EstimateFormProps = {
  caseNumber: string;
  line: EstimateLine;
  /** The estimate to be made again; none for a new one. */
  again: EstimateView | null;
  materialId: string | null;
  onDone: (made: EstimateView | null) => void;
};

/** A new estimate of one line: its method, its inputs, and what they would give before it is kept. */
export function EstimateForm({ caseNumber, line, again, materialId: caseMaterialId, onDone }: EstimateFormProps) {
  const form = useForm<EstimateDraft>({ defaultValues: again ? draftFrom(again) : emptyDraft(line), mode: 'onBlur' });
  const draft = { ...form.getValues(), ...useWatch({ control: form.control }) } as EstimateDraft; // brand: every field has a default
  const [materialId, setMaterialId] = useState(materialOf(again) ?? caseMaterialId);
  const measurements = useQuery(measurementsOf(caseNumber)).data ?? [];
  const constants = useQuery({ ...constantsOf(materialId ?? ''), enabled: materialId !== null }).data?.constants ?? [];
  const { make } = useEstimateActs(caseNumber);
  const offeredMethods = methodsOf(line);
  const method = offeredMethods.find((each) => each.id === draft.method) ?? offeredMethods[0];
  if (!method) return null;
  const offered = { measurements, constants };
  const preview = previewDraft(method, draft, offered);
  const keep = form.handleSubmit((values) =>
    make.mutateAsync(wantedFrom(method, values, again?.id ?? null)).then(onDone, (fault: unknown) => {
      if (!(fault instanceof Refusal)) return;
      for (const [field, message] of Object.entries(fieldsOf(fault))) {
        const [, name] = /^inputs\.(\w+)$/.exec(field) ?? [];
        if (name) form.setError(`inputs.${name}.from`, { message });
      }
    }),
  );
  return (
    <FormProvider {...form}>
      <form onSubmit={(event) => void keep(event)} className="grid grid-cols-[minmax(0,1fr)] gap-3" noValidate>
        <RuleHead aside={again ? `stands in for estimate ${again.number}` : 'kept once you say so'}>
          {lineWord[line]}, {again ? 'made again' : 'a new estimate'}
        </RuleHead>
        <SelectField
          label="Method"
          autoFocus
          help={<SetText text={`${method.formula.symbols}; ${method.source.text}`} />}
          {...form.register('method')}
        >
          {offeredMethods.map((each) => (
            <option key={each.id} value={each.id}>
              {each.title}
            </option>
          ))}
        </SelectField>
        {line === 'load' ? null : <MaterialField materialId={materialId} onChosen={setMaterialId} />}
        {numberInputs(method).map((input) => (
          <InputEntry
            key={input.name}
            input={input}
            preview={preview.inputs[input.name] ?? { kind: 'empty' }}
            offered={offered}
          />
        ))}
        {preview.mismatch === null ? null : (
          <TextField
            label="Why the radius and the constant may be used together"
            error={preview.mismatch}
            {...form.register('boundaryNote')}
          />
        )}
        <TextArea label="Remark, if any" rows={2} {...form.register('remark')} />
        <DraftStress preview={preview} />
        {make.error ? <RefusedNote fault={make.error} /> : null}
        <div className="acts">
          <Button kind="main" type="submit" disabled={make.isPending}>
            {again ? `Make estimate ${again.number} again` : `Keep the ${line} estimate`}
          </Button>
          <button type="button" className="button is-plain" onClick={() => onDone(null)}>
            Leave without keeping
          </button>
        </div>
      </form>
    </FormProvider>
  );
}

/** The material whose constants the estimate was made with. */
function materialOf(estimate: EstimateView | null): string | null {
  const source = estimate?.inputs.find((input) => input.source.kind === 'material constant')?.source;
  return source?.kind === 'material constant' ? source.materialId : null;
}

function fieldsOf(fault: Refusal): Record<string, string> {
  const { field, fields, message } = fault.body;
  return fields ?? (field === undefined ? {} : { [field]: message });
}

function RefusedNote({ fault }: { fault: Error }) {
  const body = fault instanceof Refusal ? fault.body : null;
  return (
    <Note tone="iron" alert lead="The estimate was not kept.">
      {body?.message ?? 'The server did not answer.'} {body?.stillHolds ?? 'What was typed is kept on the page.'}
    </Note>
  );
}

function MaterialField({ materialId, onChosen }: { materialId: string | null; onChosen: (id: string) => void }) {
  const materials = useQuery(materialsQuery).data ?? [];
  return (
    <SelectField
      label="Material whose constants are used"
      value={materialId ?? ''}
      onChange={(event) => onChosen(event.target.value)}
    >
      <option value="">choose a material</option>
      {materials.map((material) => (
        <option key={material.id} value={material.id}>
          {material.name}
        </option>
      ))}
    </SelectField>
  );
}
