import { z } from 'zod';
import { parseQuantity } from '#shared/numeric/units/parse-quantity.ts';
import { readNumber } from '#shared/numeric/units/read-number.ts';

const umPerMm = 1000;

/** A pixel size as typed; a bare number is µm. */
const sizeUm = z.string().transform((text, context) => {
  const read = parseQuantity(text, { kind: 'length', openUnit: false, defaultUnit: 'µm' });
  if (read.kind === 'read' && read.value > 0) return read.value * umPerMm;
  context.addIssue({ code: 'custom', message: read.kind === 'read' ? 'A pixel size is above 0 µm.' : read.reason });
  return z.NEVER;
});

const percent = (needed: boolean) =>
  z.string().transform((text, context) => {
    if (!needed && text.trim() === '') return null;
    const read = readNumber(text.replace('%', '').trim());
    if (read.kind === 'read') return read.number;
    context.addIssue({ code: 'custom', message: 'This is a number of per cent, for example 0.5.' });
    return z.NEVER;
  });

/** The form of a calibration as it is typed, read into what is sent. */
export const CalibrationTyped = z.object({
  setting: z.string().trim().min(1, 'Say which objective or magnification.'),
  pixelSizeXUm: sizeUm,
  expandedUncertaintyPercent: percent(true).pipe(z.number().positive('A calibration has an uncertainty above 0 %.')),
  source: z.string().trim().min(3, 'Name the reference: graticule, certificate.'),
  asFoundErrorPercent: percent(false),
  validFrom: z.iso.date('Say from which day.'),
  reason: z.string().trim(),
});
export type CalibrationFields = z.input<typeof CalibrationTyped>;
