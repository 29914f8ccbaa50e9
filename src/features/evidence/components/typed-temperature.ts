import { z } from 'zod';
import { PartDetails } from '#shared/contracts/evidence.ts';
import { readNumber } from '#shared/numeric/units/read-number.ts';

const TypedTemperature = z
  .string()
  .transform((text, context) => {
    if (text.trim() === '') return null;
    const read = readNumber(text);
    if (read.kind === 'read') return read.number;
    context.addIssue({ code: 'custom', message: `“${text}” is not a temperature that can be read; type it in °C.` });
    return z.NEVER;
  })
  .pipe(PartDetails.shape.temperatureC);

/** What a part's form holds: the contract, with the temperature as it is typed. */
export const PartTyped = PartDetails.extend({ temperatureC: TypedTemperature });
export type PartTyped = z.input<typeof PartTyped>;
