import type { FieldPath, FieldValues, UseFormReturn } from 'react-hook-form';
import { Refusal } from '#src/http/api.ts';

/**
 * Puts what the server said of single fields under them.
 * @returns false where the refusal speaks of no field of this form, and so belongs above its buttons
 */
export function showAtFields<Values extends FieldValues>(
  form: UseFormReturn<Values>,
  names: readonly FieldPath<Values>[],
  error: Error | null,
): boolean {
  if (!(error instanceof Refusal)) return false;
  const { field, fields, message } = error.body;
  const said = { ...(field ? { [field]: message } : {}), ...fields };
  const spokenOf = names.filter((name) => said[name] !== undefined);
  for (const name of spokenOf) form.setError(name, { message: said[name] });
  return spokenOf.length > 0;
}

/** The row as it stands now, where the server refused a change begun from an older one. */
export function staleRowOf(error: Error | null): unknown {
  return error instanceof Refusal && error.body.code === 'stale-version' ? error.body.current : undefined;
}
