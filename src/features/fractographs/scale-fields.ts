import type { BarReading, FractographView, ScaleReading } from '#shared/contracts/fractographs.ts';
import { distancePx } from '#shared/numeric/imaging/distance.ts';
import { parseQuantity } from '#shared/numeric/units/parse-quantity.ts';
import { readNumber } from '#shared/numeric/units/read-number.ts';

export type ScaleWay = ScaleReading['way'];

/** The form for a scale as it is typed; which fields count follows from the way. */
export type ScaleFields = {
  readonly way: ScaleWay;
  readonly pixelSizeX: string;
  readonly pixelSizeY: string;
  /** U at k = 2, per cent. */
  readonly uncertaintyPercent: string;
  readonly source: string;
  readonly barLength: string;
  /** U of the bar at k = 2, per cent of its length. */
  readonly barUncertaintyPercent: string;
  readonly calibrationId: string;
};

export type FieldFault = { readonly field: keyof ScaleFields | 'readings'; readonly why: string };

// A bar burned in by an instrument: its steps are those of the image's own pixels.
const usualBarUncertainty = '0.5';
const umPerMm = 1000;
const expandedPercentToRelative = 1 / 200;

export function emptyScaleFields(image: FractographView): ScaleFields {
  const way = image.tagPixelSizeUm === null ? 'burned bar' : 'file tags';
  return {
    ...{ way, pixelSizeX: '', pixelSizeY: '', uncertaintyPercent: '2', source: '' },
    ...{ barLength: '', barUncertaintyPercent: usualBarUncertainty, calibrationId: '' },
  };
}

/** Reads the form into what is sent, or says at which field it can't be. */
export function readScaleFields(
  fields: ScaleFields,
  image: FractographView,
  bars: readonly BarReading[],
): ScaleReading | FieldFault {
  if (fields.way === 'kept calibration') {
    const { calibrationId, way } = fields;
    return calibrationId === ''
      ? { field: 'calibrationId', why: 'Choose one of the laboratory’s calibrations.' }
      : { way, calibrationId };
  }
  if (fields.way === 'burned bar') return readBar(fields, bars);
  const percent = percentOf(fields.uncertaintyPercent);
  if (percent === null)
    return { field: 'uncertaintyPercent', why: 'A pixel size has an uncertainty above 0 %, for example 2.' };
  const relativeUncertainty = percent * expandedPercentToRelative;
  if (fields.way === 'file tags')
    return { way: 'file tags', pixelSizeUm: image.tagPixelSizeUm ?? 0, relativeUncertainty };
  return readTyped(fields, relativeUncertainty);
}

function readTyped(fields: ScaleFields, relativeUncertainty: number): ScaleReading | FieldFault {
  const across = lengthUm(fields.pixelSizeX);
  if (typeof across !== 'number') return { field: 'pixelSizeX', why: across.why };
  const down = fields.pixelSizeY.trim() === '' ? undefined : lengthUm(fields.pixelSizeY);
  if (down !== undefined && typeof down !== 'number') return { field: 'pixelSizeY', why: down.why };
  if (fields.source.trim().length < 3) return { field: 'source', why: 'Say where the pixel size is from.' };
  const typed = [fields.pixelSizeX.trim(), fields.pixelSizeY.trim()].filter(Boolean).join(' × ');
  const sizes = { pixelSizeXUm: across, pixelSizeYUm: down };
  return { way: 'typed', ...sizes, relativeUncertainty, source: fields.source, typed };
}

function readBar(fields: ScaleFields, readings: readonly BarReading[]): ScaleReading | FieldFault {
  const barLengthUm = lengthUm(fields.barLength);
  if (typeof barLengthUm !== 'number')
    return {
      field: 'barLength',
      why:
        fields.barLength.trim() === '0'
          ? 'A scale bar has a length above 0 µm. Read it off the image, for example 500.'
          : barLengthUm.why,
    };
  const percent = percentOf(fields.barUncertaintyPercent);
  if (percent === null)
    return { field: 'barUncertaintyPercent', why: 'Say how well the bar is known, in %, for example 0.5.' };
  if (readings.length < 2) return { field: 'readings', why: 'Draw along the bar twice, so that its spread is known.' };
  const barStandardUncertaintyUm = barLengthUm * percent * expandedPercentToRelative;
  return {
    way: 'burned bar',
    readings: [...readings],
    barLengthUm,
    barStandardUncertaintyUm,
    typed: withUnit(fields.barLength),
  };
}

/** A length above 0 in µm; a bare number is taken for µm. */
function lengthUm(text: string): number | { why: string } {
  const read = parseQuantity(text, { kind: 'length', openUnit: false, defaultUnit: 'µm' });
  if (read.kind === 'refused') return { why: read.reason };
  return read.value > 0 ? read.value * umPerMm : { why: 'A size is above 0 µm.' };
}

function withUnit(text: string): string {
  return /[a-zµμ]/i.test(text) ? text.trim() : `${text.trim()} µm`;
}

function percentOf(text: string): number | null {
  const read = readNumber(text.replace('%', '').trim());
  return read.kind === 'read' && read.number > 0 ? read.number : null;
}

/** Length of each reading, px, for showing their spread while they are drawn. */
export function lengthsOf(readings: readonly BarReading[]): number[] {
  return readings.map(({ from, to }) => distancePx(from, to));
}
