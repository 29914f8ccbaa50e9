import type { FieldValues, Path, UseFormSetError } from 'react-hook-form';
import { Refusal } from '#src/http/api.ts';

/** Puts a refusal on the field it names; what names none goes to the form's root. */
export function showRefusal<Values extends FieldValues>(
  setError: UseFormSetError<Values>,
  fields: readonly Path<Values>[],
  failure: unknown,
): void {
  const message = failure instanceof Error ? failure.message : 'It was not kept; try again.';
  const named = failure instanceof Refusal ? fields.find((field) => field === failure.body.field) : undefined;
  setError(named ?? 'root', { message });
}
