import { FractographDescription, type FractographView } from '#shared/contracts/fractographs.ts';
import { parseQuantity } from '#shared/numeric/units/parse-quantity.ts';
import { readNumber } from '#shared/numeric/units/read-number.ts';

export const describeFieldNames = [
  'caption',
  'fragmentId',
  'face',
  'view',
  'standing',
  'instrumentId',
  'objective',
  'fieldWidth',
  'tilt',
  'illumination',
  'detector',
  'coating',
  'takenBy',
  'takenOn',
] as const;

export type DescribeFields = Record<(typeof describeFieldNames)[number], string>;

/** What is known, as it stands in the fields of the form; an empty field is something not told. */
export function fieldsOf(figure: FractographView): DescribeFields {
  const text = (value: string | number | null) => (value === null ? '' : String(value));
  return {
    caption: figure.caption,
    fragmentId: text(figure.fragment?.id ?? null),
    face: text(figure.face),
    view: text(figure.view),
    standing: figure.standing,
    instrumentId: text(figure.instrument?.id ?? null),
    objective: text(figure.objective),
    fieldWidth: figure.fieldWidthMm === null ? '' : `${figure.fieldWidthMm} mm`,
    tilt: text(figure.tiltDeg),
    illumination: text(figure.illumination),
    detector: text(figure.detector),
    coating: text(figure.coating),
    takenBy: text(figure.takenBy),
    takenOn: text(figure.takenOn),
  };
}

/** Reads the fields of the form into what is sent. @returns the description, or the field that can't be read with the reason */
export function readDescription(
  typed: DescribeFields,
): FractographDescription | { field: keyof DescribeFields; why: string } {
  const orNull = (value: string) => (value.trim() === '' ? null : value.trim());
  const width = orNull(typed.fieldWidth);
  const read = width === null ? null : parseQuantity(width, { kind: 'length', openUnit: false });
  if (read?.kind === 'refused') return { field: 'fieldWidth', why: read.reason };
  const tilt = orNull(typed.tilt.replace('°', ''));
  const degrees = tilt === null ? null : readNumber(tilt);
  if (degrees && degrees.kind !== 'read')
    return { field: 'tilt', why: 'A tilt is a number of degrees, for example 30.' };
  const described = FractographDescription.safeParse({
    ...{ caption: typed.caption, standing: typed.standing, fragmentId: orNull(typed.fragmentId) },
    ...{ face: orNull(typed.face), view: orNull(typed.view), instrumentId: orNull(typed.instrumentId) },
    ...{
      objective: orNull(typed.objective),
      illumination: orNull(typed.illumination),
      detector: orNull(typed.detector),
    },
    ...{ coating: orNull(typed.coating), takenBy: orNull(typed.takenBy), takenOn: orNull(typed.takenOn) },
    fieldWidthMm: read ? read.value : null,
    tiltDeg: degrees ? degrees.number : null,
  });
  if (described.success) return described.data;
  const [issue] = described.error.issues;
  const renamed: Record<string, keyof DescribeFields> = { fieldWidthMm: 'fieldWidth', tiltDeg: 'tilt' };
  const field = String(issue.path[0]);
  return {
    field: renamed[field] ?? describeFieldNames.find((name) => name === field) ?? 'caption',
    why: issue.message,
  };
}
