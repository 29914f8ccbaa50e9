import { inputParts, type MeasuredInput } from '#shared/wording/input-quantity.ts';
import { Quantity } from '#src/ui/quantity.tsx';

/** An input's value with ± U and unit; lengths under 1 mm in µm. */
export function InputQuantity({ input, stale }: { input: MeasuredInput; stale?: boolean }) {
  return <Quantity {...inputParts(input)} stale={stale} />;
}
