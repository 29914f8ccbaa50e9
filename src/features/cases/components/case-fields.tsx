import type { FieldErrors, UseFormRegisterReturn } from 'react-hook-form';
import { caseKinds, urgencies } from '#shared/vocabulary/case-states.ts';
import { Note } from '#src/ui/note.tsx';
import { SelectField } from '#src/ui/select-field.tsx';
import { TextArea } from '#src/ui/text-area.tsx';
import { TextField } from '#src/ui/text-field.tsx';

type Facts = {
  title: string;
  summary: string;
  kind: (typeof caseKinds)[number];
  urgency: (typeof urgencies)[number];
  materialId: string;
};

type CaseFieldsProps = {
  register: (name: keyof Facts) => UseFormRegisterReturn;
  errors: FieldErrors<Facts>;
  materials: readonly { id: string; name: string }[];
  exposed: boolean;
};

/** The fields that say what broke and how, at opening and afterwards. */
export function CaseFields({ register, errors, materials, exposed }: CaseFieldsProps) {
  return (
    <>
      <TextField
        label="Part, and what happened"
        help="As it will read in the Casebook: “Seal ring, cracked at start-up”."
        error={errors.title?.message}
        {...register('title')}
      />
      <TextArea
        label="What happened"
        help="In one or two sentences."
        error={errors.summary?.message}
        {...register('summary')}
      />
      <div className="grid grid-cols-3 gap-3 narrow:grid-cols-1">
        <SelectField label="Kind" {...register('kind')}>
          {caseKinds.map((kind) => (
            <option key={kind}>{kind}</option>
          ))}
        </SelectField>
        <SelectField label="Material" {...register('materialId')}>
          <option value="">not said yet</option>
          {materials.map(({ id, name }) => (
            <option key={id} value={id}>
              {name}
            </option>
          ))}
        </SelectField>
        <SelectField label="Urgency" {...register('urgency')}>
          {urgencies.map((urgency) => (
            <option key={urgency}>{urgency}</option>
          ))}
        </SelectField>
      </div>
      {exposed ? (
        <Note tone="iron" lead="If someone may be hurt today, telephone.">
          Do not wait for this page.
        </Note>
      ) : null}
    </>
  );
}
